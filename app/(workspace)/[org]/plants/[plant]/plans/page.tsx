import type { Metadata } from 'next';
import Link from 'next/link';
import { Figure } from '@/components/ui/figure';
import { Formula } from '@/components/ui/formula';
import { PageHeading } from '@/components/ui/page-heading';
import { formatDayTime, formatNumber } from '@/lib/format';
import { paths } from '@/lib/paths';
import { readPlans } from '@/lib/plans/read-plans';
import { doseWords, targetWords } from '@/lib/plans/plan-words';
import { pagePlant } from '../page-plant';

export const metadata: Metadata = { title: 'Plans' };

export default async function PlansPage({
  params,
}: {
  params: Promise<{ org: string; plant: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'plan.read');
  const plans = await readPlans(actor, plant);
  const organisationSlug = actor.organisation.slug;
  return (
    <>
      <PageHeading title="Plans">
        {plans.length === 0
          ? 'No plan has been saved for these works yet.'
          : 'What was worked out, from which sample, by whom. Newest first.'}
      </PageHeading>
      {plans.length === 0 ? (
        <p>
          A plan starts from a sample: open one under{' '}
          <Link href={paths.samples(organisationSlug, plant.slug)}>Samples</Link> and choose “Plan a
          dose from this water”.
        </p>
      ) : (
        <ul className="ruled border-y border-rule-strong">
          {plans.map((plan) => (
            <li
              key={plan.id}
              className="grid items-baseline gap-x-6 py-3 sm:grid-cols-[11rem_1fr_auto]"
            >
              <p className="text-sm text-ink-soft">
                {formatDayTime(plan.createdAt, plant.timeZone)}
                <br />
                {plan.createdBy}
              </p>
              <p>
                <Link
                  href={paths.plan(organisationSlug, plant.slug, plan.id)}
                  className="font-semibold"
                >
                  <Formula>{plan.doses.map(doseWords).join(', ')}</Formula>
                </Link>
                <br />
                <span className="text-ink-soft">
                  <Formula>{`for ${targetWords(plan.targetQuantity, plan.targetValue)}, from the ${plan.pointName.toLowerCase()} sample of ${formatDayTime(plan.takenAt, plant.timeZone)}`}</Formula>
                </span>
              </p>
              <p className="text-sm text-ink-soft">
                {plan.status}
                {plan.predicted.equilibrium.pH === null ? null : (
                  <>
                    , predicts pH{' '}
                    <Figure className="text-ink">
                      {formatNumber(plan.predicted.equilibrium.pH, 2)}
                    </Figure>
                  </>
                )}
              </p>
            </li>
          ))}
        </ul>
      )}
    </>
  );
}
