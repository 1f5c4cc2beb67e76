'use client';

import { useId } from 'react';
import { TextField } from '@/components/forms/text-field';
import { Formula } from '@/components/ui/formula';
import { REAGENTS } from '@/lib/engine';
import { formatFormula, formatNumber } from '@/lib/format';
import type { PlanChoice, WorkedPlan } from './plan-choice';

const SLIDER_STEPS = 200;
const LEAST_SPAN_MG_L = 10;

/** The dose itself, by slider and by number; touching either departs from the suggestion. */
export function DoseControl({
  choice,
  plan,
  onChange,
}: {
  choice: PlanChoice;
  plan: WorkedPlan;
  onChange: (part: Partial<PlanChoice>) => void;
}) {
  const sliderId = useId();
  const suggested = plan.suggestion?.ok === true ? (plan.suggestion.doses[0]?.doseMgL ?? 0) : 0;
  const span = tidySpan(Math.max(LEAST_SPAN_MG_L, 2 * suggested, plan.doseMgL ?? 0));
  const text = choice.doseText ?? (plan.doseMgL === null ? '' : plan.doseMgL.toFixed(2));
  return (
    <div>
      <TextField
        label={
          <>
            Dose,{' '}
            <span className="font-normal">
              <Formula>{`mg/L ${formatFormula(REAGENTS[choice.reagent].doseBasis)}`}</Formula>
            </span>
          </>
        }
        type="text"
        inputMode="decimal"
        autoComplete="off"
        value={text}
        onChange={(event) => onChange({ doseText: event.target.value })}
        problem={plan.doseProblem ?? undefined}
      />
      <label htmlFor={sliderId} className="sr-only">
        Dose by slider
      </label>
      <input
        id={sliderId}
        type="range"
        min={0}
        max={span}
        step={span / SLIDER_STEPS}
        value={plan.doseMgL ?? 0}
        onChange={(event) => onChange({ doseText: Number(event.target.value).toFixed(2) })}
        aria-valuetext={`${formatNumber(plan.doseMgL ?? 0, 2)} mg/L`}
        className="mt-3 h-touch w-full accent-verdigris"
      />
      <div className="flex justify-between text-sm text-ink-soft" aria-hidden="true">
        <span className="figure">0</span>
        <span className="figure">{formatNumber(span, 0)}</span>
      </div>
    </div>
  );
}

/** The next of 1, 2, 5 × 10ⁿ. */
function tidySpan(least: number): number {
  const power = 10 ** Math.floor(Math.log10(least));
  const step = [1, 2, 5, 10].find((multiple) => multiple * power >= least) ?? 10;
  return step * power;
}
