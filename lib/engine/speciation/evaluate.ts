import { fillCoefficients } from '../activity/coefficients';
import type { Gather } from './system';
import type { Workspace } from './workspace';

/**
 * Molality of every species at the current unknowns, and all sums the Newton step needs. Indices are bounded by the
 * system's own layout, hence the casts (see numeric/lu.ts). Allocates nothing.
 */
export function evaluate(workspace: Workspace): void {
  const { system, unknowns, lnGamma, slope } = workspace;
  fillCoefficients(
    workspace.coefficients,
    unknowns[system.components.length] as number,
    lnGamma,
    slope,
  );
  fillMolalities(workspace);
  addBalances(workspace);
  addPairs(workspace);
}

/** Molalities, their slopes by ionic strength, half their squared charge, and ionic strength itself. */
function fillMolalities(workspace: Workspace): void {
  const { system, unknowns, lnK, molality, steep, half, lnGamma, slope, scalars } = workspace;
  const { from, owner, count, charges, classIndex } = system;
  const n = molality.length;
  const m = system.components.length;
  for (let i = 0; i < n; i++) {
    molality[i] = (lnK[i] as number) - (lnGamma[classIndex[i] as number] as number);
  }
  for (let j = 0; j < m; j++) {
    const lnActivity = unknowns[j] as number;
    const to = from[j + 1] as number;
    for (let p = from[j] as number; p < to; p++) {
      const i = owner[p] as number;
      molality[i] = (molality[i] as number) + (count[p] as number) * lnActivity;
    }
  }
  let ionic = 0;
  let ionicSlope = 0;
  for (let i = 0; i < n; i++) {
    const amount = Math.exp(molality[i] as number);
    const z = charges[i] as number;
    const strength = 0.5 * z * z * amount;
    const by = slope[classIndex[i] as number] as number;
    molality[i] = amount;
    steep[i] = amount * by;
    half[i] = strength;
    ionic += strength;
    ionicSlope += strength * by;
  }
  scalars[0] = ionic;
  scalars[1] = ionicSlope;
}

function addBalances(workspace: Workspace): void {
  const { system, molality, steep, half, sums, byIonic, ionicBy } = workspace;
  const { from, owner, count } = system;
  const m = system.components.length;
  for (let j = 0; j < m; j++) {
    let sum = 0;
    let sumSteep = 0;
    let sumHalf = 0;
    const to = from[j + 1] as number;
    for (let p = from[j] as number; p < to; p++) {
      const i = owner[p] as number;
      const nu = count[p] as number;
      sum += nu * (molality[i] as number);
      sumSteep += nu * (steep[i] as number);
      sumHalf += nu * (half[i] as number);
    }
    sums[j] = sum;
    byIonic[j] = sumSteep;
    ionicBy[j] = sumHalf;
  }
}

function addPairs(workspace: Workspace): void {
  const { system, molality, steep, products, acid, scalars } = workspace;
  const m = system.components.length;
  sumInto(products, system.pairs, molality);
  sumInto(acid, system.acidPairs, molality);
  let sum = 0;
  let sumSteep = 0;
  for (let s = 0; s < system.acids.length; s++) {
    const i = system.acids[s] as number;
    const over = system.hydrogen[i] as number;
    sum += over * (molality[i] as number);
    sumSteep += over * (steep[i] as number);
  }
  scalars[2] = sum;
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
