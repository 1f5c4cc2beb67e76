import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { PageHeading } from '@/components/ui/page-heading';
import { systemClock } from '@/lib/clock';
import { formatDayTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import { readPlanDesk } from '@/lib/plans/read-plan-desk';
import { orNotFound } from '@/app/or-not-found';
import { pagePlant } from '../../page-plant';
import { PlanDesk } from './plan-desk';

export const metadata: Metadata = { title: 'Plan a dose' };

export default async function NewPlanPage({
  params,
  searchParams,
}: {
  params: Promise<{ org: string; plant: string }>;
  searchParams: Promise<{ sample?: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'plan.write');
  const organisationSlug = actor.organisation.slug;
  const { sample: sampleId } = await searchParams;
  if (sampleId === undefined) redirect(paths.samples(organisationSlug, plant.slug));
  const desk = await orNotFound(readPlanDesk(actor, plant, sampleId, systemClock));
  return (
    <>
      <PageHeading title="Plan a dose">
        From the{' '}
        <Link href={paths.sample(organisationSlug, plant.slug, desk.sample.id)}>
          {desk.sample.pointName.toLowerCase()} sample
        </Link>{' '}
        of {formatDayTime(desk.sample.takenAt, plant.timeZone)}. The water stays closed to the air
        in this step.
      </PageHeading>
      <PlanDesk organisationSlug={organisationSlug} plantSlug={plant.slug} desk={desk} />
    </>
  );
}
