import type { Metadata } from 'next';
import Link from 'next/link';
import { PlantLine } from '@/components/plant-line/plant-line';
import { buttonClass } from '@/components/ui/button';
import { PageHeading } from '@/components/ui/page-heading';
import { systemClock } from '@/lib/clock';
import { formatNumber, formatWeekday } from '@/lib/format';
import { roleMay } from '@/lib/auth/permissions';
import { paths } from '@/lib/paths';
import { readToday } from '@/lib/today/read-today';
import { DueList } from './due-list';
import { InBrief } from './in-brief';
import { OutOfTarget } from './out-of-target';
import { pagePlant } from './page-plant';
import { ShiftNotes } from './shift-notes';

export const metadata: Metadata = { title: 'Today' };

export default async function TodayPage({
  params,
}: {
  params: Promise<{ org: string; plant: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'plant.read');
  const today = await readToday(actor, plant, systemClock);
  const slugs = { organisationSlug: actor.organisation.slug, plantSlug: plant.slug };
  const maySample = roleMay(actor.role, 'sample.write');
  return (
    <>
      <PageHeading
        title={plant.name}
        actions={
          maySample ? (
            <Link
              href={paths.newSample(slugs.organisationSlug, plant.slug)}
              className={buttonClass('main')}
            >
              Enter a sample
            </Link>
          ) : null
        }
      >
        {formatWeekday(today.now, plant.timeZone)}. {plant.sourceSummary},{' '}
        {formatNumber(plant.designFlowMlPerD, 0)} ML/d design flow.
      </PageHeading>
      <InBrief today={today} />
      <PlantLine
        steps={today.steps}
        {...slugs}
        timeZone={plant.timeZone}
        now={today.now}
        maySample={maySample}
      />
      <div className="mt-8 grid gap-x-10 gap-y-8 border-t border-rule-strong pt-6 lg:grid-cols-3">
        <OutOfTarget today={today} {...slugs} />
        <DueList today={today} {...slugs} timeZone={plant.timeZone} maySample={maySample} />
        <ShiftNotes notes={today.notes} timeZone={plant.timeZone} />
      </div>
    </>
  );
}
