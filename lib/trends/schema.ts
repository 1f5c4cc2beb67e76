import * as z from 'zod';
import { isSeriesKey, type SeriesKey } from '@/lib/samples/describe';
import type { Qualifier } from '@/lib/samples/solve-sample';

const day = z.iso.date({ error: 'write a day as YYYY-MM-DD' });

export const seriesQuery = z
  .object({
    point: z.string().min(1),
    quantity: z.string().refine(isSeriesKey, 'is no quantity or index of Marlwick'),
    from: day,
    to: day,
  })
  .refine(({ from, to }) => from <= to, { error: 'must not lie before “from”', path: ['to'] });

export type SeriesQuery = z.infer<typeof seriesQuery>;

/** One value as the chart draws it, in the unit of its series. */
export interface SeriesPoint {
  /** ISO 8601, UTC. */
  readonly at: string;
  readonly value: number;
  readonly qualifier: Qualifier;
  readonly sampleId: string;
}

export interface Series {
  readonly quantity: SeriesKey;
  readonly label: string;
  readonly unit: string;
  readonly decimals: number;
  /** In the series' unit. */
  readonly target: {
    readonly lowest: number | null;
    readonly highest: number | null;
    readonly basis: string;
  } | null;
  readonly points: readonly SeriesPoint[];
  /** Points there are, before thinning for the wire. */
  readonly count: number;
  /** Of all points, thinned or not. */
  readonly summary: {
    readonly lowest: number;
    readonly median: number;
    readonly highest: number;
    readonly missed: number;
  } | null;
  /** A pause longer than this is a gap in the line. */
  readonly gapMs: number;
}
