import type { Description, SeriesKey } from '@/lib/samples/describe';
import type { DosingPoint, PointKind, ShiftNote, Target, TrainStepKind } from '@/lib/plants/schema';
import type { Verdict } from '@/lib/plants/judge';
import type { Due } from './rules';

/** One value at one point as the plant line shows it. */
export interface Reading {
  readonly key: SeriesKey;
  readonly as: Description;
  /** As written where a person wrote it, else computed and rounded. */
  readonly text: string;
  readonly takenAt: Date;
  readonly verdict: Verdict | null;
  readonly target: Target | null;
}

export interface Station {
  readonly pointId: string;
  readonly slug: string;
  readonly name: string;
  readonly kind: PointKind;
  readonly readings: readonly Reading[];
  readonly lastSample: { readonly id: string; readonly takenAt: Date } | null;
  readonly due: Due | null;
}

/** One step of the train with what is fed into it and what is sampled after it. */
export interface LineStep {
  readonly id: string;
  readonly kind: TrainStepKind;
  readonly name: string;
  readonly dosing: readonly DosingPoint[];
  readonly station: Station | null;
}

export interface Today {
  readonly now: Date;
  readonly steps: readonly LineStep[];
  readonly notes: readonly ShiftNote[];
}
