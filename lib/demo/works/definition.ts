import type { ReagentKey } from '@/lib/engine';
import type { PointKind, TrainStepKind } from '@/lib/plants/schema';
import type { SeriesKey } from '@/lib/samples/describe';
import type { QuantityKey } from '@/lib/samples/quantities';
import type { SourceModel, Values } from '../raw-water';

/** A quantity as one tap's sheet lists it. `usual` and `reportingLimit` are in `unit`. */
export interface ListedQuantity {
  readonly quantity: QuantityKey;
  readonly unit: string;
  readonly decimals: number;
  readonly usual: readonly [number, number];
  /** Below it the sheet says `<` and this figure. */
  readonly reportingLimit?: number;
}

/** Canonical units. */
export interface TargetDefinition {
  readonly quantity: SeriesKey;
  readonly lowest: number | null;
  readonly highest: number | null;
  readonly preferred: number | null;
  readonly why: string;
}

export interface PointDefinition {
  readonly slug: string;
  readonly name: string;
  readonly kind: PointKind;
  /** The step it lies after. */
  readonly after: TrainStepKind;
  readonly everyH: number;
  readonly quantities: readonly ListedQuantity[];
  readonly targets: readonly TargetDefinition[];
}

export interface DosingDefinition {
  /** Name within the works, unique. */
  readonly key: string;
  readonly into: TrainStepKind;
  readonly reagent: ReagentKey | null;
  readonly productName: string;
  readonly doseBasis: string;
}

export interface WorksDefinition {
  readonly slug: string;
  readonly name: string;
  readonly sourceSummary: string;
  readonly timeZone: string;
  readonly designFlowMlPerD: number;
  /** In the order of the water. */
  readonly steps: readonly { readonly kind: TrainStepKind; readonly name: string }[];
  readonly points: readonly PointDefinition[];
  readonly dosing: readonly DosingDefinition[];
}

/** mg/L by dosing key. */
export type Doses = Readonly<Record<string, number>>;

/** Small independent chances of one day, standard normal. */
export type Scatter = () => number;

/** How a works treats its water: the invented plant itself, and the people who set it. */
export interface WorksProcess {
  readonly source: SourceModel;
  /** How much of yesterday's wetness the source remembers, 0 … 1. */
  readonly sourceMemory: number;
  /** What the people on shift would set for this water; `inForce` is null at the very start. */
  chooseDoses(raw: Values, inForce: Doses | null): Doses;
  /** The water at each point, by slug, canonical units; network water is the day's finished water grown older. */
  treat(raw: Values, doses: Doses, scatter: Scatter): Readonly<Record<string, Values>>;
  /** Whether the shift would not leave this as it is. */
  needsAttention(treated: Readonly<Record<string, Values>>): boolean;
}
