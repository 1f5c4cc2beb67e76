import { formatNumber } from '@/lib/format';
import { INDICES, isIndexKey, type IndexKey } from './indices';
import { fromCanonical, isQuantityKey, QUANTITIES, type QuantityKey } from './quantities';

/** A measured quantity or a computed index, under one roof for charts, targets and the plant line. */
export type SeriesKey = QuantityKey | IndexKey;

export const isSeriesKey = (key: string): key is SeriesKey => isQuantityKey(key) || isIndexKey(key);

export interface Description {
  readonly label: string;
  readonly short: string;
  readonly unit: string;
  readonly decimals: number;
}

/** How a quantity or index is written when no sampling point says otherwise: its canonical unit. */
export function describe(key: SeriesKey): Description {
  if (isIndexKey(key)) return INDICES[key];
  const { label, short, units, decimals } = QUANTITIES[key];
  return { label, short, unit: units[0].label, decimals };
}

/** The same as one sampling point writes it. */
export function describeAt(
  key: SeriesKey,
  written: { unit: string; decimals: number } | undefined,
): Description {
  const base = describe(key);
  return written === undefined ? base : { ...base, unit: written.unit, decimals: written.decimals };
}

/** A canonical value in the unit of a description. */
export const inUnit = (key: SeriesKey, canonical: number, unit: string): number =>
  isQuantityKey(key) ? fromCanonical(key, canonical, unit) : canonical;

export const writeValue = (key: SeriesKey, canonical: number, as: Description): string =>
  formatNumber(inUnit(key, canonical, as.unit), as.decimals);
