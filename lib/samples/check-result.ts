import { formatNumber } from '@/lib/format';
import { fromCanonical, QUANTITIES, toCanonical, type QuantityKey } from './quantities';
import { readMeasurement } from './read-measurement';
import type { MeasuredValue, Qualifier } from './solve-sample';

export interface WrittenResult {
  readonly quantity: QuantityKey;
  readonly text: string;
  readonly qualifier: Qualifier;
  readonly unit: string;
}

export type CheckedResult =
  | { readonly kind: 'empty' }
  | (MeasuredValue & { readonly kind: 'value'; readonly text: string })
  | { readonly kind: 'problem'; readonly message: string };

/** One written result as a canonical value, or the sentence that stops it: unreadable, or physically impossible. */
export function checkResult(result: WrittenResult): CheckedResult {
  const read = readMeasurement(result.text, result.qualifier);
  if (read.kind !== 'value') return read;
  const { label, possible, decimals, units } = QUANTITIES[result.quantity];
  if (!units.some((unit) => unit.label === result.unit)) {
    return { kind: 'problem', message: `${label} cannot be written in ${result.unit}.` };
  }
  const value = toCanonical(result.quantity, read.value, result.unit);
  const [low, high] = possible;
  if (value < low || value > high) {
    const bound = (canonical: number) =>
      formatNumber(
        fromCanonical(result.quantity, canonical, result.unit),
        Number.isInteger(canonical) ? 0 : decimals,
      );
    const unit = result.unit === label ? '' : ` ${result.unit}`;
    return {
      kind: 'problem',
      message:
        value < 0 && low === 0 && result.quantity !== 'temperature'
          ? `${label} cannot be negative.${slipHint(result, read.value)}`
          : `${label} lies between ${bound(low)} and ${bound(high)}${unit}.${slipHint(result, read.value)}`,
    };
  }
  return { kind: 'value', value, qualifier: read.qualifier, text: read.text };
}

/** A slip of the decimal point is the commonest reason for an impossible value. */
function slipHint(result: WrittenResult, written: number): string {
  const [low, high] = QUANTITIES[result.quantity].possible;
  const tenth = toCanonical(result.quantity, written / 10, result.unit);
  const tidy = Number((written / 10).toPrecision(12));
  return written > 0 && tenth >= low && tenth <= high ? ` Is it ${tidy}?` : '';
}

export interface UsualRange {
  readonly usualLow: number | null;
  readonly usualHigh: number | null;
  readonly decimals: number;
}

/** A value outside what this point usually shows: kept, but worth a second look. Written unit throughout. */
export function unusualRemark(written: number, usual: UsualRange): string | null {
  const { usualLow: low, usualHigh: high, decimals } = usual;
  if (low !== null && written < low) {
    return `below the usual ${formatNumber(low, decimals)}${high === null ? '' : ` to ${formatNumber(high, decimals)}`}`;
  }
  if (high !== null && written > high) {
    return `above the usual ${low === null ? '' : `${formatNumber(low, decimals)} to `}${formatNumber(high, decimals)}`;
  }
  return null;
}
