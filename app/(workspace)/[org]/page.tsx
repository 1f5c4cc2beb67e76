import { redirect } from 'next/navigation';
import { pageActor } from '@/lib/auth/actor';
import { paths } from '@/lib/paths';
import { readPlants } from '@/lib/plants/read-plants';
import { PageHeading } from '@/components/ui/page-heading';

/** An organisation opens on its first works; without one it says what is missing. */
export default async function OrganisationPage({ params }: { params: Promise<{ org: string }> }) {
  const { org } = await params;
  const actor = await pageActor(org, 'plant.read');
  const [first] = await readPlants(actor);
  if (first !== undefined) redirect(paths.today(org, first.slug));
  return (
    <main className="mx-auto max-w-page px-4 py-8 sm:px-8">
      <PageHeading title="No works yet">
        {actor.organisation.name} has no plant in Marlwick so far.
      </PageHeading>
    </main>
  );
}
