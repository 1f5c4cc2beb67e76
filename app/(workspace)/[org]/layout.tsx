import type { ReactNode } from 'react';
import { Masthead } from '@/components/shell/masthead';
import { PlantTabs } from '@/components/shell/plant-tabs';
import { pageActor } from '@/lib/auth/actor';
import { roleMay } from '@/lib/auth/permissions';
import { readPlants } from '@/lib/plants/read-plants';

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
        mayReadAudit={roleMay(actor.role, 'audit.read')}
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
