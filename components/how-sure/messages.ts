import type { IndexKey } from '@/lib/samples/indices';
import type { IndexBands } from '@/lib/samples/how-sure';
import type { MeasuredValues } from '@/lib/samples/solve-sample';

/** What the page asks the worker. */
export interface BandRequest {
  readonly values: MeasuredValues;
  readonly shown: readonly IndexKey[];
  readonly draws: number;
}

/** What the worker says while it draws, and at the end. */
export type BandMessage =
  | { readonly kind: 'progress'; readonly share: number }
  | { readonly kind: 'done'; readonly answer: IndexBands };
