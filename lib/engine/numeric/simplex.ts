/** A linear programme: least cost·x with rows·x ≤ bounds and 0 ≤ x ≤ most, each row broken at its penalty if it must. */
export interface LinearProgramme {
  readonly cost: readonly number[];
  readonly rows: readonly (readonly number[])[];
  readonly bounds: readonly number[];
  readonly most: readonly number[];
  /** Price of breaking each row by one unit. */
  readonly penalties: readonly number[];
}

export interface Optimum {
  readonly x: readonly number[];
  /** How far each row is broken. */
  readonly broken: readonly number[];
  /** What one unit of each row's bound is worth (never negative). */
  readonly worth: readonly number[];
}

const TINY = 1e-11;

/**
 * Dense tableau simplex with Bland's rule, so that it always ends. Every row carries a variable for its violation,
 * which makes a start at x = 0 possible whatever the bounds. null if the pivots run out (they do not).
 */
export function minimiseLinear(programme: LinearProgramme): Optimum | null {
  const n = programme.cost.length;
  const upper = programme.most.map((_, j) => programme.cost.map((__, k) => (k === j ? 1 : 0)));
  const rows = [...programme.rows, ...upper];
  const bounds = [...programme.bounds, ...programme.most];
  const r = rows.length;
  const elastic = programme.rows.length;
  // Columns: x, slack of every row, violation of every elastic row, right side.
  const width = n + r + elastic + 1;
  const tableau = rows.map((row, i) => {
    const line = new Float64Array(width);
    const sign = (bounds[i] ?? 0) < 0 ? -1 : 1;
    row.forEach((a, j) => (line[j] = sign * a));
    line[n + i] = sign;
    if (i < elastic) line[n + r + i] = -sign;
    line[width - 1] = sign * (bounds[i] ?? 0);
    return line;
  });
  const prices = new Float64Array(width);
  programme.cost.forEach((c, j) => (prices[j] = c));
  programme.penalties.forEach((p, i) => (prices[n + r + i] = p));
  const basis = bounds.map((bound, i) => (bound < 0 ? n + r + i : n + i));
  const reduced = Float64Array.from(prices);
  basis.forEach((column, i) => subtract(reduced, tableau[i], prices[column] ?? 0));
  for (let pivots = 0; pivots < 2000; pivots++) {
    const entering = reduced.findIndex((price, j) => j < width - 1 && price < -TINY);
    if (entering < 0) return readOut();
    const leaving = leavingRow(tableau, basis, entering, width - 1);
    if (leaving < 0) return null;
    const line = tableau[leaving];
    const scale = line?.[entering] ?? 1;
    line?.forEach((value, j) => (line[j] = value / scale));
    tableau.forEach((other, i) => {
      if (i !== leaving) subtract(other, line, other[entering] ?? 0);
    });
    subtract(reduced, line, reduced[entering] ?? 0);
    basis[leaving] = entering;
  }
  return null;

  function readOut(): Optimum {
    const values = new Float64Array(width);
    basis.forEach((column, i) => (values[column] = tableau[i]?.[width - 1] ?? 0));
    return {
      x: [...values.subarray(0, n)],
      broken: [...values.subarray(n + r, n + r + elastic)],
      worth: programme.rows.map((_, i) => Math.max(reduced[n + i] ?? 0, 0)),
    };
  }
}

function subtract(from: Float64Array, line: Float64Array | undefined, factor: number): void {
  if (factor === 0 || !line) return;
  for (let j = 0; j < from.length; j++) from[j] = (from[j] ?? 0) - factor * (line[j] ?? 0);
}

function leavingRow(
  tableau: readonly Float64Array[],
  basis: readonly number[],
  entering: number,
  last: number,
): number {
  let leaving = -1;
  let least = Infinity;
  tableau.forEach((line, i) => {
    const pivot = line[entering] ?? 0;
    if (pivot <= TINY) return;
    const ratio = (line[last] ?? 0) / pivot;
    const tie = ratio <= least + TINY && (basis[i] ?? 0) < (basis[leaving] ?? Infinity);
    if (ratio < least - TINY || tie) {
      least = ratio;
      leaving = i;
    }
  });
  return leaving;
}
