import type { ReagentKey, WaterAnalysis } from '@/lib/engine';
import type { PointKind, TrainStepKind } from '@/lib/plants/schema';
import type { QuantityKey } from '@/lib/samples/quantities';
import type { Qualifier } from '@/lib/samples/solve-sample';

/** A way into the demo, the same every time. */
export interface DemoSignIn {
  readonly role: 'operator' | 'consultant' | 'manager' | 'owner';
  readonly name: string;
  readonly email: string;
  readonly password: string;
  readonly organisation: string;
}

export interface DemoPerson {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly role: DemoSignIn['role'];
}

export interface DemoPlant {
  readonly id: string;
  readonly slug: string;
  readonly name: string;
  readonly sourceSummary: string;
  readonly timeZone: string;
  readonly designFlowMlPerD: number;
  readonly position: number;
}

export interface DemoPoint {
  readonly id: string;
  readonly plantId: string;
  readonly slug: string;
  readonly name: string;
  readonly kind: PointKind;
  readonly position: number;
  readonly sampleEveryH: number;
}

export interface DemoPointQuantity {
  readonly pointId: string;
  readonly quantity: QuantityKey;
  readonly unit: string;
  readonly decimals: number;
  readonly position: number;
  /** In `unit`. */
  readonly usualLow: number;
  readonly usualHigh: number;
}

export interface DemoTarget {
  readonly id: string;
  readonly pointId: string;
  readonly quantity: string;
  /** Canonical unit. */
  readonly lowest: number | null;
  readonly highest: number | null;
  readonly preferred: number | null;
  readonly basis: string;
}

export interface DemoTrainStep {
  readonly id: string;
  readonly plantId: string;
  readonly position: number;
  readonly kind: TrainStepKind;
  readonly name: string;
}

export interface DemoDosingPoint {
  readonly id: string;
  readonly plantId: string;
  readonly trainStepId: string;
  readonly position: number;
  readonly reagent: ReagentKey | null;
  readonly productName: string;
  readonly doseBasis: string;
}

export interface DemoFeedSetting {
  readonly id: string;
  readonly dosingPointId: string;
  readonly doseMgPerL: number;
  readonly setBy: string;
  readonly setAt: Date;
}

export interface DemoShiftNote {
  readonly id: string;
  readonly plantId: string;
  readonly writtenBy: string;
  readonly writtenAt: Date;
  readonly body: string;
}

/** As written on the sheet, and in the canonical unit. */
export interface DemoResult {
  readonly quantity: QuantityKey;
  readonly text: string;
  readonly unit: string;
  readonly qualifier: Qualifier;
  readonly value: number;
}

export interface DemoSolution {
  readonly analysis: WaterAnalysis;
  readonly assumptions: readonly string[];
  readonly refusal: string | null;
  readonly indices: Readonly<Record<string, number>>;
}

export interface DemoSample {
  readonly id: string;
  readonly plantId: string;
  readonly pointId: string;
  readonly clientKey: string;
  readonly takenAt: Date;
  readonly enteredAt: Date;
  readonly enteredBy: string;
  readonly comment: string;
  readonly results: readonly DemoResult[];
  /** Null when the sheet has no temperature, pH or alkalinity. */
  readonly solution: DemoSolution | null;
}

/** Everything the demo puts into an empty database. */
export interface DemoData {
  readonly organisation: { readonly id: string; readonly slug: string; readonly name: string };
  readonly people: readonly DemoPerson[];
  readonly plants: readonly DemoPlant[];
  readonly points: readonly DemoPoint[];
  readonly pointQuantities: readonly DemoPointQuantity[];
  readonly targets: readonly DemoTarget[];
  readonly trainSteps: readonly DemoTrainStep[];
  readonly dosingPoints: readonly DemoDosingPoint[];
  readonly feedSettings: readonly DemoFeedSetting[];
  readonly shiftNotes: readonly DemoShiftNote[];
  readonly samples: readonly DemoSample[];
  readonly engineVersion: string;
  readonly constantsHash: string;
}
