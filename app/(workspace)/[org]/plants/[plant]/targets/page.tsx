import type { Metadata } from 'next';
import { PageHeading } from '@/components/ui/page-heading';
import { roleMay } from '@/lib/auth/permissions';
import { readSheet } from '@/lib/plants/read-sheet';
import { describeAt, isSeriesKey } from '@/lib/samples/describe';
import { pagePlant } from '../page-plant';
import { TargetRow } from './target-row';

export const metadata: Metadata = { title: 'Targets' };

export default async function TargetsPage({
  params,
}: {
  params: Promise<{ org: string; plant: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'plant.read');
  const { points, targets } = await readSheet(actor, plant.slug);
  const mayChange = roleMay(actor.role, 'target.write');
  const withTargets = points.filter(({ id }) => targets.some(({ pointId }) => pointId === id));
  return (
    <>
      <PageHeading title="Targets">
        What the water of {plant.name} is to keep to, point by point.{' '}
        {mayChange
          ? 'A change names its reason and stands in the audit trail; it replaces no permit and no local code.'
          : 'Your role reads them; a consultant or manager changes them.'}
      </PageHeading>
      {withTargets.length === 0 ? (
        <p className="border-y border-rule py-8 text-ink-soft">No point has a target yet.</p>
      ) : null}
      {withTargets.map((point) => (
        <section key={point.id} aria-labelledby={point.slug} className="mb-8">
          <h2 id={point.slug} className="text-xl">
            {point.name}
          </h2>
          <ul className="mt-2 border-y border-rule-strong">
            {targets
              .filter(({ pointId }) => pointId === point.id)
              .map((target) => {
                const canonical = isSeriesKey(target.quantity)
                  ? describeAt(target.quantity, undefined)
                  : { label: target.quantity, unit: '' };
                return (
                  <TargetRow
                    key={`${target.id} ${target.version}`}
                    organisationSlug={actor.organisation.slug}
                    plantSlug={plant.slug}
                    target={target}
                    label={canonical.label}
                    unit={canonical.unit === canonical.label ? '' : canonical.unit}
                    mayChange={mayChange}
                  />
                );
              })}
          </ul>
        </section>
      ))}
    </>
  );
}
