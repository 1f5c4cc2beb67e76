import type { Metadata } from 'next';
import { PageHeading } from '@/components/ui/page-heading';
import { systemClock } from '@/lib/clock';
import { readTrendChoices } from '@/lib/trends/read-trend-choices';
import { pagePlant } from '../page-plant';
import { TrendsView } from './trends-view';

export const metadata: Metadata = { title: 'Trends' };

export default async function TrendsPage({
  params,
}: {
  params: Promise<{ org: string; plant: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'trend.read');
  const choices = await readTrendChoices(actor, plant, systemClock);
  return (
    <>
      <PageHeading title="Trends">
        {plant.name}, one panel a quantity over the same days. Times are the plant’s own,{' '}
        {plant.timeZone}.
      </PageHeading>
      {choices.points.length === 0 ? (
        <p>These works have no sampling point yet.</p>
      ) : (
        <TrendsView
          organisationSlug={actor.organisation.slug}
          plantSlug={plant.slug}
          timeZone={plant.timeZone}
          choices={choices}
        />
      )}
    </>
  );
}
