'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Notice } from '@/components/ui/notice';
import { REAGENTS } from '@/lib/engine';
import { formatFormula, formatNumber } from '@/lib/format';
import type { PlanChoice, WorkedPlan } from './plan-choice';

/** The engine's answer in words: the dose, both doses where two meet the target, or why none does. */
export function SuggestionLine({
  choice,
  plan,
  onUse,
}: {
  choice: PlanChoice;
  plan: WorkedPlan;
  onUse: () => void;
}) {
  const { suggestion } = plan;
  if (suggestion === null) return null;
  if (!suggestion.ok) {
    return (
      <Notice tone="act" title="This target cannot be met" role="status">
        {suggestion.message}
      </Notice>
    );
  }
  const { name, doseBasis } = REAGENTS[choice.reagent];
  const [first, second] = suggestion.doses;
  return (
    <div role="status" className="border-y-2 border-verdigris py-3">
      <p className="log-label">Suggested dose</p>
      <p className="text-3xl">
        <Figure unit={`mg/L ${formatFormula(doseBasis)}`} className="font-semibold">
          {formatNumber(first?.doseMgL ?? 0, 2)}
        </Figure>
      </p>
      <p className="mt-1 text-sm text-ink-soft">
        of {name}
        {second === undefined
          ? '.'
          : `. A second dose meets the same target: ${formatNumber(second.doseMgL, 2)} mg/L; the smaller is suggested.`}
      </p>
      {choice.doseText === null ? null : (
        <Button className="mt-2" onClick={onUse}>
          Back to the suggestion
        </Button>
      )}
    </div>
  );
}
