import type { Problem, Row } from './problem';
import type { Workspace } from './workspace';

/** Within this of 1 the series of the logarithm is off by less than 3e-9. */
const SERIES = 0.01;

/**
 * Fills the right side of one Newton step, each row's gap between what is and what should be, and the scale its
 * Jacobian row is divided by; returns the largest relative residual. Rows run over the components backwards, then
 * ionic strength, then solids (see jacobian.ts). `totals[0]` is minus the alkalinity. Casts: see numeric/lu.ts.
 */
export function fillGaps(w: Workspace, problem: Problem): number {
  const { carbon } = w.system;
  const m = w.sums.length;
  w.scalars[WORST] = 0;
  const carbonHasRow = carbon > 0 && problem.carbonRow !== 'carbon';
  if (w.activeSolids === 0) massGaps(w, m, carbonHasRow ? carbon : 0);
  else {
    for (let j = 1; j < m; j++) {
      if (j !== carbon || !carbonHasRow) massGapBesideSolids(w, m, j, m - 1 - j);
    }
    solidGaps(w, m);
  }
  specialGap(w, m, problem.hydrogenRow, 0);
  if (carbonHasRow) specialGap(w, m, problem.carbonRow, carbon);
  const ionic = w.unknowns[m] as number;
  const found = w.scalars[0] as number;
  w.scale[m] = Math.max(found, ionic);
  w.right[m] = (ionic - found) / w.scale[m];
  return Math.max(w.scalars[WORST], Math.abs(w.right[m]));
}

/** Where in `scalars` the largest residual so far is kept: a number returned by a call may be boxed. */
const WORST = 3;

function note(w: Workspace, residual: number): void {
  w.scalars[WORST] = Math.max(w.scalars[WORST] as number, residual);
}

/** Mass balances without solids, compared as logarithms; not that of `except`. */
function massGaps(w: Workspace, m: number, except: number): void {
  const { sums, totals, right, scale, scalars } = w;
  let worst = scalars[WORST] as number;
  for (let j = 1; j < m; j++) {
    if (j === except) continue;
    const place = m - 1 - j;
    const sum = sums[j] as number;
    const total = totals[j] as number;
    const gap = (total - sum) / sum;
    scale[place] = sum;
    right[place] = lnOnePlus(gap);
    worst = Math.max(worst, (Math.abs(gap) * sum) / Math.max(total, sum));
  }
  scalars[WORST] = worst;
}

function specialGap(w: Workspace, m: number, kind: Row, j: number): void {
  const place = m - 1 - j;
  if (kind === 'alkalinity') alkalinityGap(w, m, place);
  else if (kind === 'held') w.right[place] = 0;
  else if (w.activeSolids > 0) massGapBesideSolids(w, m, w.system.carbon, place);
  else {
    const sum = w.sums[w.system.carbon] as number;
    const total = w.totals[w.system.carbon] as number;
    w.scale[place] = sum;
    w.right[place] = lnOnePlus((total - sum) / sum);
    note(w, Math.abs(total - sum) / Math.max(total, sum));
  }
}

/** acids + alkalinity = bases. Without solids compared as logarithms, each side being a sum of positive terms. */
function alkalinityGap(w: Workspace, m: number, place: number): void {
  const alkalinity = -(w.totals[0] as number);
  const acids = w.scalars[2] as number;
  const left = acids + Math.max(alkalinity, 0);
  const right = acids - (w.sums[0] as number) + Math.max(-alkalinity, 0);
  const scale = Math.max(left, right);
  w.scale[place] = scale;
  const solids = w.activeSolids === 0 ? 0 : inSolids(w, m, 0);
  w.right[place] =
    w.activeSolids === 0 ? lnOnePlus((right - left) / left) : (right - left - solids) / scale;
  note(w, Math.abs(right - left - solids) / scale);
}

/** Balance of component j as amounts: beside solids the dissolved sum may be a small rest. */
function massGapBesideSolids(w: Workspace, m: number, j: number, place: number): void {
  const sum = w.sums[j] as number;
  const total = w.totals[j] as number;
  const scale = Math.max(sum, total);
  const gap = (total - inSolids(w, m, j) - sum) / scale;
  w.scale[place] = scale;
  w.right[place] = gap;
  note(w, Math.abs(gap));
}

/** A solid present: its ion activity product equals its constant. */
function solidGaps(w: Workspace, m: number): void {
  for (let s = 0; s < w.activeSolids; s++) {
    let gap = w.solidLnK[s] as number;
    for (let k = 0; k < m; k++) {
      gap -= (w.solidCounts[s * m + k] as number) * (w.unknowns[k] as number);
    }
    w.right[m + 1 + s] = gap;
    note(w, Math.abs(gap));
  }
}

/** Amount of component j held by the solids. */
function inSolids(w: Workspace, m: number, j: number): number {
  let amount = 0;
  for (let s = 0; s < w.activeSolids; s++) {
    amount += (w.solidCounts[s * m + j] as number) * (w.unknowns[m + 1 + s] as number);
  }
  return amount;
}

/** ln(1 + d); near 0 by its series to the third power, which is all a Newton step needs and costs no logarithm. */
function lnOnePlus(d: number): number {
  return Math.abs(d) < SERIES ? d * (1 - d * (0.5 - d / 3)) : Math.log(1 + d);
}
