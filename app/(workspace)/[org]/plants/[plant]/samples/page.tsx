import type { Metadata } from 'next';
import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import { PageHeading } from '@/components/ui/page-heading';
import { roleMay } from '@/lib/auth/permissions';
import { paths } from '@/lib/paths';
import { listSamples } from '@/lib/samples/list-samples';
import { pagePlant } from '../page-plant';
import { PageLinks } from './page-links';
import { PointFilter } from './point-filter';
import { SamplesTable } from './samples-table';

export const metadata: Metadata = { title: 'Samples' };

export default async function SamplesPage({
  params,
  searchParams,
}: {
  params: Promise<{ org: string; plant: string }>;
  searchParams: Promise<{ point?: string; page?: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'sample.read');
  const { point: wanted, page } = await searchParams;
  const table = await listSamples(actor, plant, { point: wanted, page: pageNumber(page) });
  const { point, points, total } = table;
  const slugs = { organisationSlug: actor.organisation.slug, plantSlug: plant.slug };
  return (
    <>
      <PageHeading
        title="Samples"
        actions={
          roleMay(actor.role, 'sample.write') ? (
            <Link
              href={paths.newSample(slugs.organisationSlug, plant.slug, point?.slug)}
              className={buttonClass('main')}
            >
              Enter a sample
            </Link>
          ) : null
        }
      >
        {point === undefined ? 'Every point' : point.name}, newest first; {total} in all.
      </PageHeading>
      <PointFilter points={points} current={point?.slug} {...slugs} />
      {table.rows.length === 0 ? (
        <p className="border-y border-rule py-8 text-ink-soft">
          {total === 0
            ? 'Nothing has been sampled here yet.'
            : 'There is no such page of samples; the newest are on the first.'}
        </p>
      ) : (
        <SamplesTable table={table} showPoint={point === undefined} {...slugs} />
      )}
      <PageLinks page={table.page} pages={table.pages} point={point?.slug} {...slugs} />
    </>
  );
}

const pageNumber = (text: string | undefined): number =>
  text !== undefined && /^[1-9]\d{0,5}$/.test(text) ? Number(text) : 1;
