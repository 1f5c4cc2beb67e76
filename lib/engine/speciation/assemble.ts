import type { Workspace } from './workspace';

/** What stands in the place of the hydrogen row and of the carbon row. */
export type Row = 'alkalinity' | 'carbon' | 'held';

export interface Problem {
  /** Row of H+: the alkalinity balance, the carbon balance (CO2 pressure given too), or pH held. */
  readonly hydrogenRow: Row;
  /** Row of inorganic carbon: its own balance, the alkalinity balance (pH given too), or CO2 pressure held. */
  readonly carbonRow: Row;
}

/** Within this of 1 the series of the logarithm is off by less than 3e-9. */
const SERIES = 0.01;

// Rows and columns of the matrix run over the components backwards, then ionic strength, then solids: the rare
// components, which touch few others, are eliminated first and hydrogen, which touches all, last.

/**
 * Fills the matrix and right side of one Newton step; returns the largest relative residual. `totals[0]` is minus the
 * alkalinity. Casts: see numeric/lu.ts.
 */
export function assemble(w: Workspace, problem: Problem): number {
  const m = w.system.components.length;
  const { carbon } = w.system;
  const size = m + 1 + w.activeSolids;
  let worst = ionicRow(w, m);
  for (let j = 1; j < m; j++) {
    if (j === carbon && problem.carbonRow !== 'carbon') continue;
    worst = Math.max(worst, massRow(w, m, j, j));
  }
  worst = Math.max(worst, specialRow(w, m, problem.hydrogenRow, 0));
  if (carbon > 0 && problem.carbonRow !== 'carbon') {
    worst = Math.max(worst, specialRow(w, m, problem.carbonRow, carbon));
  }
  for (let row = m + 1; row < size; row++) worst = Math.max(worst, solidRow(w, m, row));
  return worst;
}

function specialRow(w: Workspace, m: number, kind: Row, row: number): number {
  if (kind === 'alkalinity') return alkalinityRow(w, m, row);
  if (kind === 'carbon') return massRow(w, m, w.system.carbon, row);
  const place = m - 1 - row;
  w.matrix.fill(0, place * w.stride, place * w.stride + m + 1 + w.activeSolids);
  w.matrix[place * w.stride + place] = 1;
  w.right[place] = 0;
  return 0;
}

/** Balance of component j. As logarithms without solids; as amounts with them, for then the sum may be a small rest. */
function massRow(w: Workspace, m: number, j: number, row: number): number {
  const { matrix, products, stride, activeSolids } = w;
  const sum = w.sums[j] as number;
  const total = w.totals[j] as number;
  const place = m - 1 - row;
  const base = place * stride;
  const last = base + m - 1;
  const scale = activeSolids === 0 ? sum : Math.max(sum, total);
  const inverse = 1 / scale;
  for (let k = 0; k < j; k++) matrix[last - k] = (products[k * m + j] as number) * inverse;
  for (let k = j; k < m; k++) matrix[last - k] = (products[j * m + k] as number) * inverse;
  matrix[base + m] = -(w.byIonic[j] as number) * inverse;
  if (activeSolids === 0) {
    w.right[place] = lnRatio(total, sum);
    return Math.abs(sum - total) / Math.max(total, sum);
  }
  const left = total - inSolids(w, m, j, base, inverse);
  w.right[place] = (left - sum) * inverse;
  return Math.abs(left - sum) * inverse;
}

/** ln(a / b); near 1 by its series to the third power, which is all a Newton step needs and costs no logarithm. */
function lnRatio(a: number, b: number): number {
  const d = (a - b) / b;
  return Math.abs(d) < SERIES ? d * (1 - d * (0.5 - d / 3)) : Math.log(a / b);
}

/** Amount of component j held by the solids; writes the derivatives by their moles into the row. */
function inSolids(w: Workspace, m: number, j: number, base: number, inverse: number): number {
  let amount = 0;
  for (let s = 0; s < w.activeSolids; s++) {
    const count = w.solidCounts[s * m + j] as number;
    amount += count * (w.unknowns[m + 1 + s] as number);
    w.matrix[base + m + 1 + s] = count * inverse;
  }
  return amount;
}

/** acids + alkalinity = bases. Without solids compared as logarithms, each side being a sum of positive terms. */
function alkalinityRow(w: Workspace, m: number, row: number): number {
  const { matrix, products, acid, stride, activeSolids } = w;
  const alkalinity = -(w.totals[0] as number);
  const acids = w.scalars[2] as number;
  const bases = acids - (w.sums[0] as number);
  const left = acids + Math.max(alkalinity, 0);
  const right = bases + Math.max(-alkalinity, 0);
  const place = m - 1 - row;
  const base = place * stride;
  const last = base + m - 1;
  if (activeSolids > 0) {
    const inverse = 1 / Math.max(left, right);
    for (let k = 0; k < m; k++) matrix[last - k] = (products[k] as number) * inverse;
    matrix[base + m] = -(w.byIonic[0] as number) * inverse;
    const excess = left - right + inSolids(w, m, 0, base, inverse);
    w.right[place] = -excess * inverse;
    return Math.abs(excess) * inverse;
  }
  const byLeft = 1 / left;
  const byRight = 1 / right;
  for (let k = 0; k < m; k++) {
    const over = acid[k] as number;
    matrix[last - k] = over * byLeft - (over - (products[k] as number)) * byRight;
  }
  const over = acid[m] as number;
  matrix[base + m] = (over - (w.byIonic[0] as number)) * byRight - over * byLeft;
  w.right[place] = lnRatio(right, left);
  return Math.abs(left - right) / Math.max(left, right);
}

/** Ionic strength as an unknown of its own, so that it converges with the rest instead of lagging behind it. */
function ionicRow(w: Workspace, m: number): number {
  const { matrix, ionicBy, scalars, stride, activeSolids } = w;
  const ionic = w.unknowns[m] as number;
  const found = scalars[0] as number;
  const inverse = 1 / Math.max(found, ionic);
  const base = m * stride;
  for (let k = 0; k < m; k++) matrix[base + m - 1 - k] = (ionicBy[k] as number) * inverse;
  matrix[base + m] = (-1 - (scalars[1] as number)) * inverse;
  for (let s = 0; s < activeSolids; s++) matrix[base + m + 1 + s] = 0;
  w.right[m] = (ionic - found) * inverse;
  return Math.abs(found - ionic) * inverse;
}

/** A solid present: its ion activity product equals its constant. */
function solidRow(w: Workspace, m: number, row: number): number {
  const { matrix, stride, solidCounts, unknowns } = w;
  const s = row - m - 1;
  const base = row * stride;
  matrix.fill(0, base, base + m + 1 + w.activeSolids);
  let lnProduct = 0;
  for (let k = 0; k < m; k++) {
    const count = solidCounts[s * m + k] as number;
    matrix[base + m - 1 - k] = count;
    lnProduct += count * (unknowns[k] as number);
  }
  const gap = (w.solidLnK[s] as number) - lnProduct;
  w.right[row] = gap;
  return Math.abs(gap);
}
