import type { MeasuredValues, Qualifier } from './solve-sample';

/** Results by quantity, as the engine sees them. */
export const measuredValues = (
  results: readonly { quantity: string; value: number; qualifier: Qualifier }[],
): MeasuredValues =>
  Object.fromEntries(
    results.map(({ quantity, value, qualifier }) => [quantity, { value, qualifier }]),
  );
