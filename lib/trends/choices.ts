import type { SeriesKey } from '@/lib/samples/describe';

/** What the trend screen can be asked for. */
export interface TrendChoices {
  readonly today: string;
  readonly points: readonly {
    readonly slug: string;
    readonly name: string;
    readonly quantities: readonly { readonly key: SeriesKey; readonly label: string }[];
    /** Shown when the address names none. */
    readonly first: readonly SeriesKey[];
  }[];
}

/** Spans offered in days; anything else goes through the two date fields. */
export const SPANS = [
  { days: 30, label: '30 days' },
  { days: 90, label: '90 days' },
  { days: 365, label: 'a year' },
  { days: 731, label: 'two years' },
] as const;

export const DEFAULT_SPAN_DAYS = 365;
export const MOST_PANELS = 4;
