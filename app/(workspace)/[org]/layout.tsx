import type { ReactNode } from 'react';
import { Masthead, type MastheadLink } from '@/components/shell/masthead';
import { PlantTabs } from '@/components/shell/plant-tabs';
import { pageActor } from '@/lib/auth/actor';
import { roleMay, type Permission } from '@/lib/auth/permissions';
import { paths } from '@/lib/paths';
import { readOrganisationsOf } from '@/lib/people/read-home-of';
import { readPlants } from '@/lib/plants/read-plants';

const LINKS: readonly { label: string; href: (org: string) => string; needs: Permission }[] = [
  { label: 'People', href: paths.people, needs: 'member.read' },
  { label: 'Tokens', href: paths.tokens, needs: 'token.read' },
  { label: 'Audit', href: (org) => paths.audit(org), needs: 'audit.read' },
];

export default async function WorkspaceLayout({
  children,
  params,
}: {
  children: ReactNode;
  params: Promise<{ org: string }>;
}) {
  const { org } = await params;
  const actor = await pageActor(org, 'plant.read');
  const plants = await readPlants(actor);
  const organisations = await readOrganisationsOf(actor.personId);
  const links: MastheadLink[] = LINKS.filter(({ needs }) => roleMay(actor.role, needs)).map(
    ({ label, href }) => ({ label, href: href(org) }),
  );
  return (
    <>
      <a
        href="#page"
        className="absolute -top-20 left-4 z-10 bg-verdigris px-4 py-2 text-verdigris-on focus:top-2"
      >
        Skip to the page
      </a>
      <Masthead
        organisation={actor.organisation}
        personName={actor.personName}
        role={actor.role}
        others={organisations.filter(({ id }) => id !== actor.organisation.id)}
        links={links}
      />
      <PlantTabs
        organisationSlug={actor.organisation.slug}
        plants={plants.map(({ slug, name }) => ({ slug, name }))}
      />
      <div id="page" className="min-h-[80vh] border-t border-rule-strong bg-chalk-sheet">
        {children}
      </div>
    </>
  );
}
