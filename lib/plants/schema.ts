import type { ReagentKey } from '@/lib/engine';

export interface Plant {
  readonly id: string;
  readonly slug: string;
  readonly name: string;
  readonly sourceSummary: string;
  readonly timeZone: string;
  readonly designFlowMlPerD: number;
}

export type PointKind = 'raw' | 'clarified' | 'filtered' | 'finished' | 'network';

export interface SamplingPoint {
  readonly id: string;
  readonly slug: string;
  readonly name: string;
  readonly kind: PointKind;
  /** The train step after which the point lies. */
  readonly position: number;
  readonly sampleEveryH: number | null;
}

/** A quantity as one sampling point writes it. */
export interface PointQuantity {
  readonly pointId: string;
  readonly quantity: string;
  readonly unit: string;
  readonly decimals: number;
  /** In `unit`. */
  readonly usualLow: number | null;
  readonly usualHigh: number | null;
}

/** In the quantity's canonical unit. */
export interface Target {
  readonly id: string;
  /** Raised by every change: a change names the version it was made from. */
  readonly version: number;
  readonly pointId: string;
  readonly quantity: string;
  readonly lowest: number | null;
  readonly highest: number | null;
  readonly preferred: number | null;
  readonly basis: string;
}

export type TrainStepKind =
  | 'intake'
  | 'aeration'
  | 'rapid-mix'
  | 'clarifier'
  | 'softening'
  | 'recarbonation'
  | 'filter'
  | 'contact-tank'
  | 'clearwell'
  | 'network';

export interface TrainStep {
  readonly id: string;
  readonly position: number;
  readonly kind: TrainStepKind;
  readonly name: string;
}

export interface DosingPoint {
  readonly id: string;
  readonly trainStepId: string;
  readonly reagent: ReagentKey | null;
  readonly productName: string;
  readonly doseBasis: string;
  /** What is being fed now; null when nothing was ever set. */
  readonly doseMgPerL: number | null;
  readonly setAt: Date | null;
}

export interface ShiftNote {
  readonly id: string;
  readonly body: string;
  readonly writtenAt: Date;
  readonly author: string;
}
