import { fillCoefficients } from '../activity/coefficients';
import type { Workspace } from './workspace';

/**
 * Molality of every species at the current unknowns, the sums that the balances compare, and the derivatives of these
 * and of ionic strength by each other. Indices are bounded by the system's own layout, hence the casts (see
 * numeric/lu.ts). Allocates nothing.
 */
export function evaluate(workspace: Workspace): void {
  const { unknowns, sums, lnGamma, slope } = workspace;
  const ionic = unknowns[sums.length] as number;
  fillCoefficients(workspace.coefficients, ionic, lnGamma, slope);
  fillMolalities(workspace);
  addBalances(workspace);
}

/** Molalities, their slopes by ionic strength, half their squared charge, and ionic strength itself. */
function fillMolalities(workspace: Workspace): void {
  const { system, unknowns, lnK, molality, steep, lnGamma, slope, scalars } = workspace;
  const { from, terms, halfSquare, classIndex } = system;
  const n = molality.length;
  const m = workspace.sums.length;
  // The basis species stand first, one to a column: their activity is the unknown itself.
  for (let j = 0; j < m; j++) {
    molality[j] = (unknowns[j] as number) - (lnGamma[classIndex[j] as number] as number);
  }
  for (let i = m; i < n; i++) {
    molality[i] = (lnK[i] as number) - (lnGamma[classIndex[i] as number] as number);
  }
  for (let j = 0; j < m; j++) {
    const lnActivity = unknowns[j] as number;
    const to = 2 * (from[j + 1] as number);
    for (let p = 2 * (from[j] as number); p < to; p += 2) {
      const i = terms[p] as number;
      molality[i] = (molality[i] as number) + (terms[p + 1] as number) * lnActivity;
    }
  }
  // A loop of its own: around each call of exp the processor would have to put everything else aside.
  for (let i = 0; i < n; i++) molality[i] = Math.exp(molality[i] as number);
  let ionic = 0;
  let ionicSlope = 0;
  for (let i = 0; i < n; i++) {
    const amount = molality[i] as number;
    const strength = (halfSquare[i] as number) * amount;
    const by = slope[classIndex[i] as number] as number;
    steep[i] = amount * by;
    ionic += strength;
    ionicSlope += strength * by;
  }
  scalars[0] = ionic;
  scalars[1] = ionicSlope;
}

/** Σ ν m of each component; with it, at little cost beside, its derivative by ionic strength and of that by it. */
function addBalances({
  system,
  molality,
  steep,
  sums,
  byIonic,
  ionicBy,
  scalars,
}: Workspace): void {
  const { from, terms, termStrength, halfSquare, acids, hydrogen } = system;
  for (let j = 0; j < sums.length; j++) {
    let sum = molality[j] as number;
    let sumSteep = steep[j] as number;
    let sumHalf = (halfSquare[j] as number) * sum;
    const to = 2 * (from[j + 1] as number);
    for (let p = 2 * (from[j] as number); p < to; p += 2) {
      const i = terms[p] as number;
      const nu = terms[p + 1] as number;
      const amount = molality[i] as number;
      sum += nu * amount;
      sumSteep += nu * (steep[i] as number);
      sumHalf += (termStrength[p >> 1] as number) * amount;
    }
    sums[j] = sum;
    byIonic[j] = sumSteep;
    ionicBy[j] = sumHalf;
  }
  let held = 0;
  for (let s = 0; s < acids.length; s++) {
    const i = acids[s] as number;
    held += (hydrogen[i] as number) * (molality[i] as number);
  }
  scalars[2] = held;
}
