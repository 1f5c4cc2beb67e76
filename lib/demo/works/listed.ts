import type { QuantityKey } from '@/lib/samples/quantities';
import type { ListedQuantity, TargetDefinition } from './definition';

/** One line of a tap's sheet. */
export const listed = (
  quantity: QuantityKey,
  unit: string,
  decimals: number,
  usual: readonly [number, number],
  reportingLimit?: number,
): ListedQuantity => ({ quantity, unit, decimals, usual, reportingLimit });

/** A target from `lowest` to `highest`, best at `preferred`; null leaves an end open. */
export const target = (
  quantity: TargetDefinition['quantity'],
  [lowest, highest]: readonly [number | null, number | null],
  preferred: number | null,
  why: string,
): TargetDefinition => ({ quantity, lowest, highest, preferred, why });
