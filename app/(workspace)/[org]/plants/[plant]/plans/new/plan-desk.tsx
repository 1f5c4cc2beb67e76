'use client';

import { useMemo, useState } from 'react';
import { DoseCautions } from '@/components/ledger/dose-cautions';
import { Ledger } from '@/components/ledger/ledger';
import { Notice } from '@/components/ui/notice';
import { REAGENTS } from '@/lib/engine';
import { formatFormula, formatNumber } from '@/lib/format';
import type { PlanDeskData } from '@/lib/plans/plan-desk';
import { solveSample } from '@/lib/samples/solve-sample';
import { DoseControl } from './dose-control';
import { firstChoice, planFrom, type PlanChoice } from './plan-choice';
import { SavePlan } from './save-plan-form';
import { SuggestionLine } from './suggestion-line';
import { TargetControl } from './target-control';

/** One reagent, one target: the dose that meets it, the slider to depart from it, and the ledger of what happens. */
export function PlanDesk({
  organisationSlug,
  plantSlug,
  desk,
}: {
  organisationSlug: string;
  plantSlug: string;
  desk: PlanDeskData;
}) {
  const solution = useMemo(() => solveSample(desk.measured), [desk.measured]);
  const [choice, setChoice] = useState<PlanChoice>(() =>
    firstChoice(desk, solution.ok ? solution.water : null),
  );
  const plan = useMemo(
    () => (solution.ok ? planFrom(solution.water, choice) : null),
    [solution, choice],
  );
  if (!solution.ok || plan === null) {
    return (
      <Notice tone="act" title="No plan from this sample" role="alert">
        {solution.ok ? 'The water could not be solved.' : solution.refusal}
      </Notice>
    );
  }
  const change = (part: Partial<PlanChoice>) => setChoice((current) => ({ ...current, ...part }));
  const reagent = REAGENTS[choice.reagent];
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-x-12 gap-y-8 lg:grid-cols-[22rem_minmax(0,1fr)]">
      <div className="grid grid-cols-[minmax(0,1fr)] content-start gap-6">
        <TargetControl desk={desk} choice={choice} plan={plan} onChange={change} />
        <SuggestionLine choice={choice} plan={plan} onUse={() => change({ doseText: null })} />
        <DoseControl choice={choice} plan={plan} onChange={change} />
        <SavePlan
          organisationSlug={organisationSlug}
          plantSlug={plantSlug}
          sampleId={desk.sample.id}
          choice={choice}
          plan={plan}
        />
      </div>
      <div className="grid grid-cols-[minmax(0,1fr)] content-start gap-6">
        {plan.after === null ? (
          <Notice tone="watch" title="No dose to work out yet">
            Choose another reagent or target, or write a dose of your own to see what it does.
          </Notice>
        ) : (
          <Ledger
            title={`of ${formatNumber(plan.doseMgL ?? 0, 2)} mg/L ${reagent.name} ${formatFormula(reagent.doseBasis)}`}
            before={solution.water}
            after={plan.after}
            account={plan.account}
          />
        )}
        <DoseCautions reagents={[choice.reagent]} />
        <details className="text-sm">
          <summary className="min-h-6 text-ink-soft">
            What this plan assumes ({solution.assumptions.length})
          </summary>
          <ul className="mt-1 list-disc pl-5">
            {solution.assumptions.map((sentence) => (
              <li key={sentence}>{sentence}</li>
            ))}
          </ul>
        </details>
      </div>
    </div>
  );
}
