import type { Problem, Row } from './problem';
import type { Gather } from './system';
import type { Workspace } from './workspace';

// Rows and columns of the matrix run over the components backwards, then ionic strength, then solids: the rare
// components, which touch few others, are eliminated first and hydrogen, which touches all, last.

/**
 * Fills the matrix of one Newton step at the molalities of the last `evaluate`, each row divided by the scale the last
 * `fillGaps` left. Allocates nothing. Casts: see numeric/lu.ts.
 */
export function fillJacobian(w: Workspace, problem: Problem): void {
  const m = w.system.components.length;
  const { carbon } = w.system;
  differentiate(w);
  w.matrix.fill(0, 0, (m + 1 + w.activeSolids) * w.stride);
  massRows(w, m);
  specialRow(w, m, problem.hydrogenRow, 0);
  if (carbon > 0 && problem.carbonRow !== 'carbon') specialRow(w, m, problem.carbonRow, carbon);
  ionicRow(w, m);
  for (let s = 0; s < w.activeSolids; s++) solidRow(w, m, s);
}

/** Derivatives of the balances by ln activities, and of the acids alone by everything. */
function differentiate(workspace: Workspace): void {
  const { system, molality, steep, sums, products, acid } = workspace;
  const m = system.components.length;
  for (let j = 0; j < m; j++) products[j * m + j] = sums[j] as number;
  sumInto(products, system.pairs, molality);
  addInto(products, system.squares, molality);
  sumInto(acid, system.acidPairs, molality);
  let sumSteep = 0;
  for (let s = 0; s < system.acids.length; s++) {
    const i = system.acids[s] as number;
    sumSteep += (system.hydrogen[i] as number) * (steep[i] as number);
  }
  acid[m] = sumSteep;
}

/** Entries without terms stay zero for good. */
function sumInto(target: Float64Array, terms: Gather, molality: Float64Array): void {
  const { at, from, factor, owner } = terms;
  let p = 0;
  for (let e = 0; e < at.length; e++) {
    const to = from[e + 1] as number;
    let sum = 0;
    for (; p < to; p++) sum += (factor[p] as number) * (molality[owner[p] as number] as number);
    target[at[e] as number] = sum;
  }
}

function addInto(target: Float64Array, terms: Gather, molality: Float64Array): void {
  const { at, from, factor, owner } = terms;
  let p = 0;
  for (let e = 0; e < at.length; e++) {
    const to = from[e + 1] as number;
    let sum = target[at[e] as number] as number;
    for (; p < to; p++) sum += (factor[p] as number) * (molality[owner[p] as number] as number);
    target[at[e] as number] = sum;
  }
}

/** The mass balance of every component in its own row. Few pairs of components share a species: the rest stays zero. */
function massRows(w: Workspace, m: number): void {
  const { matrix, products, scale, inverse, byIonic, stride, system } = w;
  const { rows, columns } = system.pairPlaces;
  const last = m - 1;
  for (let place = 0; place < m; place++) inverse[place] = 1 / (scale[place] as number);
  for (let e = 0; e < rows.length; e++) {
    const j = rows[e] as number;
    const k = columns[e] as number;
    const shared = products[j * m + k] as number;
    matrix[(last - j) * stride + last - k] = shared * (inverse[last - j] as number);
    matrix[(last - k) * stride + last - j] = shared * (inverse[last - k] as number);
  }
  for (let j = 0; j < m; j++) {
    const place = last - j;
    const base = place * stride;
    const by = inverse[place] as number;
    matrix[base + place] = (products[j * m + j] as number) * by;
    matrix[base + m] = -(byIonic[j] as number) * by;
    if (w.activeSolids > 0) solidsInRow(w, m, j, base, by);
  }
}

function specialRow(w: Workspace, m: number, kind: Row, j: number): void {
  const place = m - 1 - j;
  if (kind === 'alkalinity') alkalinityRow(w, m, place);
  else if (kind === 'carbon') carbonRow(w, m, place);
  else heldRow(w, m, place);
}

function heldRow(w: Workspace, m: number, place: number): void {
  const base = place * w.stride;
  w.matrix.fill(0, base, base + m + 1 + w.activeSolids);
  w.matrix[base + place] = 1;
}

/** The carbon balance in the place of the hydrogen row. */
function carbonRow(w: Workspace, m: number, place: number): void {
  const { matrix, products } = w;
  const j = w.system.carbon;
  const base = place * w.stride;
  const last = base + m - 1;
  const inverse = 1 / (w.scale[place] as number);
  for (let k = 0; k < j; k++) matrix[last - k] = (products[k * m + j] as number) * inverse;
  for (let k = j; k < m; k++) matrix[last - k] = (products[j * m + k] as number) * inverse;
  matrix[base + m] = -(w.byIonic[j] as number) * inverse;
  solidsInRow(w, m, j, base, inverse);
}

function alkalinityRow(w: Workspace, m: number, place: number): void {
  const { matrix, products, acid } = w;
  const base = place * w.stride;
  const last = base + m - 1;
  if (w.activeSolids > 0) {
    const inverse = 1 / (w.scale[place] as number);
    for (let k = 0; k < m; k++) matrix[last - k] = (products[k] as number) * inverse;
    matrix[base + m] = -(w.byIonic[0] as number) * inverse;
    solidsInRow(w, m, 0, base, inverse);
    return;
  }
  const alkalinity = -(w.totals[0] as number);
  const acids = w.scalars[2] as number;
  const byLeft = 1 / (acids + Math.max(alkalinity, 0));
  const byRight = 1 / (acids - (w.sums[0] as number) + Math.max(-alkalinity, 0));
  for (let k = 0; k < m; k++) {
    const over = acid[k] as number;
    matrix[last - k] = over * byLeft - (over - (products[k] as number)) * byRight;
  }
  const over = acid[m] as number;
  matrix[base + m] = (over - (w.byIonic[0] as number)) * byRight - over * byLeft;
}

function ionicRow(w: Workspace, m: number): void {
  const { matrix, ionicBy } = w;
  const inverse = 1 / (w.scale[m] as number);
  const base = m * w.stride;
  for (let k = 0; k < m; k++) matrix[base + m - 1 - k] = (ionicBy[k] as number) * inverse;
  matrix[base + m] = (-1 - (w.scalars[1] as number)) * inverse;
}

function solidRow(w: Workspace, m: number, s: number): void {
  const base = (m + 1 + s) * w.stride;
  for (let k = 0; k < m; k++) {
    w.matrix[base + m - 1 - k] = w.solidCounts[s * m + k] as number;
  }
}

/** Derivatives of a balance by the moles of the solids. */
function solidsInRow(w: Workspace, m: number, j: number, base: number, inverse: number): void {
  for (let s = 0; s < w.activeSolids; s++) {
    w.matrix[base + m + 1 + s] = (w.solidCounts[s * m + j] as number) * inverse;
  }
}
