import {
  accountFor,
  applyDose,
  doseForTarget,
  type DoseSuggestion,
  type Ledger,
  type ReagentKey,
  type TargetQuantity,
  type Water,
} from '@/lib/engine';
import { formatNumber } from '@/lib/format';
import type { PlanDeskData } from '@/lib/plans/plan-desk';
import { readPlanNumber } from '@/lib/plans/schema';
import { TARGETS } from '@/lib/plans/quantities';

/** What the person chose and typed. */
export interface PlanChoice {
  readonly reagent: ReagentKey;
  readonly quantity: TargetQuantity;
  readonly targetText: string;
  /** A dose of their own; null follows the suggestion. */
  readonly doseText: string | null;
}

/** What follows from it. */
export interface WorkedPlan {
  readonly targetValue: number | null;
  readonly targetProblem: string | null;
  readonly suggestion: DoseSuggestion | null;
  readonly doseMgL: number | null;
  readonly doseProblem: string | null;
  readonly after: Water | null;
  readonly account: Ledger | null;
  /** Why there is nothing to show, in the engine's or the field's own words. */
  readonly problem: string | null;
}

const FALLBACK_TARGET = { quantity: 'pH', value: 8 } as const;

/** Starts from the plant's own: its finished-water pH target and the reagent that can reach it. */
export function firstChoice(desk: PlanDeskData, water: Water | null): PlanChoice {
  const target =
    desk.plantTargets.find(({ quantity }) => quantity === 'pH') ?? desk.plantTargets[0];
  const quantity = target?.quantity ?? FALLBACK_TARGET.quantity;
  const value = target?.preferred ?? target?.lowest ?? FALLBACK_TARGET.value;
  const candidates: readonly ReagentKey[] = [...desk.plantReagents, 'sodium-hydroxide'];
  const reaching = candidates.find(
    (reagent) => water !== null && doseForTarget(water, reagent, { quantity, value }).ok,
  );
  return {
    reagent: reaching ?? candidates[0] ?? 'sodium-hydroxide',
    quantity,
    targetText: formatNumber(value, TARGETS[quantity].decimals).replace('\u2212', '-'),
    doseText: null,
  };
}

/** Works a choice out with the engine: the same code that decides on the server. */
export function planFrom(before: Water, choice: PlanChoice): WorkedPlan {
  const target = readPlanNumber(choice.targetText);
  const suggestion = target.ok
    ? doseForTarget(before, choice.reagent, { quantity: choice.quantity, value: target.value })
    : null;
  const own = choice.doseText === null ? null : readPlanNumber(choice.doseText);
  const suggested = suggestion?.ok === true ? (suggestion.doses[0]?.doseMgL ?? null) : null;
  const ownValue = own?.ok === true ? own.value : null;
  const doseMgL = own === null ? suggested : ownValue;
  const dose = doseMgL === null ? null : { reagent: choice.reagent, doseMgL };
  const after = dose === null ? null : applyDose(before, dose);
  const account =
    dose !== null && after?.ok === true ? accountFor(before, after.water, dose) : null;
  const refusals = [
    target.ok ? null : target.message,
    suggestion?.ok === false ? suggestion.message : null,
    own?.ok === false ? own.message : null,
    after?.ok === false ? after.message : null,
  ];
  return {
    targetValue: target.ok ? target.value : null,
    targetProblem: target.ok ? null : target.message,
    suggestion,
    doseMgL,
    doseProblem: own?.ok === false ? own.message : after?.ok === false ? after.message : null,
    after: after?.ok === true ? after.water : null,
    account: account?.ok === true ? account.ledger : null,
    problem: refusals.find((sentence) => sentence !== null) ?? null,
  };
}
