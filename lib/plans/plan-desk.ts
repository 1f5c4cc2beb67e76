import type { ReagentKey, TargetQuantity } from '@/lib/engine';
import type { MeasuredValues } from '@/lib/samples/solve-sample';

/** What the plan screen is given. */
export interface PlanDeskData {
  readonly sample: { readonly id: string; readonly pointName: string; readonly takenAt: Date };
  readonly measured: MeasuredValues;
  /** Fed at this plant, in the order of its train. */
  readonly plantReagents: readonly ReagentKey[];
  /** The finished water's targets a dose can be asked to reach. */
  readonly plantTargets: readonly {
    readonly quantity: TargetQuantity;
    readonly lowest: number | null;
    readonly highest: number | null;
    readonly preferred: number | null;
  }[];
}
