import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { PageHeading } from '@/components/ui/page-heading';
import { systemClock } from '@/lib/clock';
import { paths } from '@/lib/paths';
import { readEntrySheet } from '@/lib/samples/read-entry-sheet';
import { pagePlant } from '../../page-plant';
import { PointLinks } from './point-links';
import { SampleForm } from './sample-form';

export const metadata: Metadata = { title: 'Enter a sample' };

export default async function NewSamplePage({
  params,
  searchParams,
}: {
  params: Promise<{ org: string; plant: string }>;
  searchParams: Promise<{ point?: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'sample.write');
  const sheet = await readEntrySheet(actor, plant, (await searchParams).point, systemClock);
  if (sheet === null) notFound();
  const organisationSlug = actor.organisation.slug;
  return (
    <>
      <PageHeading title="Enter a sample">
        {plant.name}, in the order of your sheet. Enter moves down, Ctrl and Enter saves.
      </PageHeading>
      <PointLinks
        points={sheet.points.map(({ slug, name }) => ({
          name,
          href: paths.newSample(organisationSlug, plant.slug, slug),
          isCurrent: slug === sheet.pointSlug,
        }))}
      />
      <SampleForm
        key={sheet.pointSlug}
        organisationSlug={organisationSlug}
        plantSlug={plant.slug}
        timeZone={plant.timeZone}
        sheet={sheet}
      />
    </>
  );
}
