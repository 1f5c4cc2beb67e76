import { minimiseLinear } from '../numeric/simplex';

/** Largest extent tried, as a multiple of all matter given. */
const REACH = 1000;
/** A largest smallest amount below this share of all matter is none. */
const NONE = 1e-12;

/**
 * Whether the reactions can bring every species to a positive amount: the greatest least amount over all extents, by
 * linear programming.
 */
export function allCanBePresent(
  coefficients: readonly (readonly number[])[],
  before: readonly number[],
): boolean {
  const scale = before.reduce((sum, n) => sum + n, 0);
  if (!(scale > 0)) return false;
  const n = coefficients.length;
  const rows = before.map((_, s) => [
    ...coefficients.map((reaction) => -(reaction[s] ?? 0)),
    ...coefficients.map((reaction) => reaction[s] ?? 0),
    1,
  ]);
  const optimum = minimiseLinear({
    cost: [...new Array<number>(2 * n).fill(0), -1],
    rows,
    bounds: before.map((amount) => amount / scale),
    most: [...new Array<number>(2 * n).fill(REACH), 1],
    penalties: rows.map(() => 1e6),
  });
  return optimum !== null && (optimum.x[2 * n] ?? 0) > NONE;
}
