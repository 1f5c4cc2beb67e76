'use client';

import { useId } from 'react';
import { inputClass } from '@/components/forms/input-class';
import { TextField } from '@/components/forms/text-field';
import { Formula } from '@/components/ui/formula';
import { REAGENTS, type ReagentKey, type TargetQuantity } from '@/lib/engine';
import { formatNumber } from '@/lib/format';
import type { PlanDeskData } from '@/lib/plans/plan-desk';
import { TARGET_KEYS, TARGETS } from '@/lib/plans/quantities';
import type { PlanChoice, WorkedPlan } from './plan-choice';

/** What to feed and what to reach with it. */
export function TargetControl({
  desk,
  choice,
  plan,
  onChange,
}: {
  desk: PlanDeskData;
  choice: PlanChoice;
  plan: WorkedPlan;
  onChange: (part: Partial<PlanChoice>) => void;
}) {
  const reagentId = useId();
  const quantityId = useId();
  const others = (Object.keys(REAGENTS) as ReagentKey[]).filter(
    (key) => !desk.plantReagents.includes(key),
  );
  const own = desk.plantTargets.find(({ quantity }) => quantity === choice.quantity);
  const { unit, decimals } = TARGETS[choice.quantity];
  return (
    <div className="grid items-end gap-4 sm:max-lg:grid-cols-3">
      <div>
        <label htmlFor={reagentId} className="block font-semibold">
          Feed
        </label>
        <select
          id={reagentId}
          value={choice.reagent}
          onChange={(event) =>
            onChange({ reagent: event.target.value as ReagentKey, doseText: null })
          }
          className={`mt-1 ${inputClass(false)}`}
        >
          <optgroup label="Fed at this plant">
            {desk.plantReagents.map((key) => (
              <option key={key} value={key}>
                {REAGENTS[key].name}
              </option>
            ))}
          </optgroup>
          <optgroup label="Others">
            {others.map((key) => (
              <option key={key} value={key}>
                {REAGENTS[key].name}
              </option>
            ))}
          </optgroup>
        </select>
      </div>
      <div>
        <label htmlFor={quantityId} className="block font-semibold">
          To reach
        </label>
        <select
          id={quantityId}
          value={choice.quantity}
          onChange={(event) => {
            const quantity = event.target.value as TargetQuantity;
            const preset = desk.plantTargets.find((target) => target.quantity === quantity);
            const value = preset?.preferred ?? preset?.lowest ?? preset?.highest;
            onChange({
              quantity,
              doseText: null,
              targetText: value === undefined || value === null ? '' : String(value),
            });
          }}
          className={`mt-1 ${inputClass(false)}`}
        >
          {TARGET_KEYS.map((key) => (
            <option key={key} value={key}>
              {TARGETS[key].label}
            </option>
          ))}
        </select>
      </div>
      <TextField
        label={
          <>
            Target{unit === '' ? '' : ', '}
            <span className="font-normal">
              <Formula>{unit}</Formula>
            </span>
          </>
        }
        hint={
          own === undefined || own.lowest === null || own.highest === null
            ? undefined
            : `This plant’s finished water: ${formatNumber(own.lowest, decimals)} to ${formatNumber(own.highest, decimals)}`
        }
        type="text"
        autoComplete="off"
        value={choice.targetText}
        onChange={(event) => onChange({ targetText: event.target.value, doseText: null })}
        problem={plan.targetProblem ?? undefined}
      />
    </div>
  );
}
