import type { ReagentKey, Refusal, TargetQuantity, Water } from '../types';

/** A reagent that may be fed, in the order of the train. */
export interface PlanReagent {
  readonly reagent: ReagentKey;
  readonly minDoseMgL?: number;
  readonly maxDoseMgL: number;
  /** Any currency, per kg of the compound as dosed. */
  readonly costPerKg: number;
}

/** A quantity to be kept within a range, by default in the finished water. */
export interface PlanTarget {
  readonly quantity: TargetQuantity;
  readonly min?: number;
  readonly max?: number;
  /** After how many of the reagents it is to hold; all of them when left out. */
  readonly after?: number;
}

export interface PlanRequest {
  readonly reagents: readonly PlanReagent[];
  readonly targets: readonly PlanTarget[];
}

/** A target that stands at its bound, and what one unit of slack would save. */
export interface BindingTarget {
  readonly target: number;
  readonly quantity: TargetQuantity;
  readonly bound: 'min' | 'max';
  /** Cost per ML saved by one unit of the quantity's slack. */
  readonly costPerUnit: number;
}

/** The target that cannot be met, by how much at least, in the quantity's unit. */
export interface Violation {
  readonly target: number;
  readonly quantity: TargetQuantity;
  readonly bound: 'min' | 'max';
  readonly by: number;
  readonly message: string;
}

export type Plan =
  | {
      readonly ok: true;
      readonly feasible: boolean;
      readonly doses: readonly { readonly reagent: ReagentKey; readonly doseMgL: number }[];
      /** Reagent cost of treating 1 ML (1000 m³). */
      readonly costPerML: number;
      readonly binding: readonly BindingTarget[];
      readonly violations: readonly Violation[];
      /** The water after each reagent. */
      readonly waters: readonly Water[];
      /** Speciations the search took. */
      readonly evaluations: number;
    }
  | Refusal;
