import type { Metadata } from 'next';
import Link from 'next/link';
import { DoseCautions } from '@/components/ledger/dose-cautions';
import { Ledger } from '@/components/ledger/ledger';
import { Formula } from '@/components/ui/formula';
import { Notice } from '@/components/ui/notice';
import { PageHeading } from '@/components/ui/page-heading';
import { ENGINE_VERSION } from '@/lib/engine';
import { formatDayTime } from '@/lib/format';
import { paths } from '@/lib/paths';
import { reworkPlan } from '@/lib/plans/frozen';
import { doseWords, targetWords } from '@/lib/plans/plan-words';
import { getPlan } from '@/lib/plans/read-plans';
import { orNotFound } from '@/app/or-not-found';
import { pagePlant } from '../../page-plant';

export const metadata: Metadata = { title: 'Plan' };

export default async function PlanPage({
  params,
}: {
  params: Promise<{ org: string; plant: string; plan: string }>;
}) {
  const { actor, plant } = await pagePlant(params, 'plan.read');
  const plan = await orNotFound(getPlan(actor, plant, (await params).plan));
  const [dose] = plan.doses;
  const worked = dose === undefined ? null : reworkPlan(plan.analysis, dose);
  const words = plan.doses.map(doseWords).join(', ');
  return (
    <>
      <PageHeading title={<Formula>{words}</Formula>}>
        <Formula>{`For ${targetWords(plan.targetQuantity, plan.targetValue)}. Saved by ${plan.createdBy} on ${formatDayTime(plan.createdAt, plant.timeZone)}; still a ${plan.status}, not a setting.`}</Formula>
      </PageHeading>
      <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-6 lg:grid-cols-[minmax(0,1fr)_20rem]">
        <div className="grid grid-cols-[minmax(0,1fr)] content-start gap-6">
          {worked === null ? (
            <Notice tone="act" title="No ledger" role="alert">
              Today’s engine cannot work this plan again from its frozen analysis.
            </Notice>
          ) : (
            <Ledger title={`of ${words}`} {...worked} />
          )}
          <DoseCautions reagents={plan.doses.map(({ reagent }) => reagent)} />
        </div>
        <aside aria-label="About this plan" className="margin-rule self-start pl-5">
          <h2 className="text-xl">About this plan</h2>
          <dl className="ruled mt-2">
            <Fact name="Sample">
              <Link href={paths.sample(actor.organisation.slug, plant.slug, plan.sampleId)}>
                {plan.pointName}, {formatDayTime(plan.takenAt, plant.timeZone)}
              </Link>
            </Fact>
            <Fact name="Why">{plan.reason === '' ? 'no reason was written' : plan.reason}</Fact>
            <Fact name="Engine">
              version {plan.engineVersion}
              {plan.engineVersion === ENGINE_VERSION
                ? ''
                : `; shown with version ${ENGINE_VERSION}`}
            </Fact>
            <Fact name="Constants">
              <span className="figure text-sm">{plan.constantsHash}</span>
            </Fact>
          </dl>
        </aside>
      </div>
    </>
  );
}

function Fact({ name, children }: { name: string; children: React.ReactNode }) {
  return (
    <div className="py-1.5">
      <dt className="text-sm text-ink-soft">{name}</dt>
      <dd className="break-words">{children}</dd>
    </div>
  );
}
