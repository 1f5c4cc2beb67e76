import {
  applyDose,
  accountFor,
  solveWater,
  type Ledger,
  type ReagentKey,
  type Water,
  type WaterAnalysis,
} from '@/lib/engine';
import type { PlanQuantity } from './quantities';

/** Quantities before and at equilibrium, as the server found them when the plan was saved. */
export interface Predicted {
  readonly before: Readonly<Record<PlanQuantity, number | null>>;
  readonly equilibrium: Readonly<Record<PlanQuantity, number | null>>;
}

export interface ReworkedPlan {
  readonly before: Water;
  readonly after: Water;
  readonly account: Ledger | null;
}

/** Works a kept plan again from its frozen analysis; null when today's engine refuses it. */
export function reworkPlan(
  analysis: WaterAnalysis,
  dose: { reagent: ReagentKey; doseMgL: number },
): ReworkedPlan | null {
  const before = solveWater(analysis);
  if (!before.ok) return null;
  const after = applyDose(before.water, dose);
  if (!after.ok) return null;
  const account = accountFor(before.water, after.water, dose);
  return {
    before: before.water,
    after: after.water,
    account: account.ok ? account.ledger : null,
  };
}
