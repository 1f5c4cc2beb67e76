/** How a value between the printed ones is read. */
export type Reading = 'interpolated' | 'conservative';

/** A place on a printed axis: between two entries, by a share of the way. */
export interface Place {
  readonly low: number;
  readonly high: number;
  readonly share: number;
}

/**
 * Place of a value on a rising axis, held at its ends. Read conservatively it is the entry at or on the side given:
 * the lower temperature, the higher pH and residual.
 */
export function placeOn(
  axis: readonly number[],
  value: number,
  reading: Reading,
  safeSide: 'lower' | 'higher',
): Place {
  const last = axis.length - 1;
  const above = axis.findIndex((entry) => entry >= value);
  if (above === 0) return { low: 0, high: 0, share: 0 };
  if (above < 0) return { low: last, high: last, share: 0 };
  if (axis[above] === value) return { low: above, high: above, share: 0 };
  const below = above - 1;
  if (reading === 'conservative') {
    const at = safeSide === 'lower' ? below : above;
    return { low: at, high: at, share: 0 };
  }
  const from = axis[below] ?? NaN;
  const to = axis[above] ?? NaN;
  return { low: below, high: above, share: (value - from) / (to - from) };
}

/** Value at a place by straight line. */
export const readAt = (place: Place, entry: (index: number) => number): number =>
  place.share === 0
    ? entry(place.low)
    : entry(place.low) + place.share * (entry(place.high) - entry(place.low));
