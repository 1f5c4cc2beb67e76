import type { SeriesKey } from './describe';

/** One cell of the samples table: what is written, and whether it misses its target. */
export interface SampleCell {
  readonly text: string;
  readonly verdict: 'within' | 'below' | 'above' | null;
}

export interface SampleTableRow {
  readonly id: string;
  readonly taken: string;
  readonly point: string;
  readonly enteredBy: string;
  readonly cells: Readonly<Partial<Record<SeriesKey, SampleCell>>>;
}

export interface SampleColumn {
  readonly key: SeriesKey;
  readonly short: string;
  readonly label: string;
  readonly unit: string;
}

export interface SampleTable {
  readonly columns: readonly SampleColumn[];
  readonly rows: readonly SampleTableRow[];
  readonly total: number;
  readonly page: number;
  readonly pages: number;
}
