import { fillCoefficients } from '../activity/coefficients';
import type { Workspace } from './workspace';

/**
 * Molality of every species at the current unknowns, and all sums the Newton step needs. Indices are bounded by the
 * system's own layout, hence the casts (see numeric/lu.ts). Allocates nothing.
 */
export function evaluate(workspace: Workspace): void {
  const { system, unknowns, lnK, molality, lnGamma, slope } = workspace;
  const { sums, products, byIonic, ionicBy, basic, scalars } = workspace;
  const { start, column, count, charges, classIndex, hydrogen } = system;
  const m = system.components.length;
  fillCoefficients(system.classes, workspace.debyeHuckel, unknowns[m] as number, lnGamma, slope);
  sums.fill(0);
  products.fill(0);
  byIonic.fill(0);
  ionicBy.fill(0);
  basic.fill(0);
  let ionic = 0;
  let ionicSlope = 0;
  let basicSum = 0;
  for (let i = 0; i < molality.length; i++) {
    const from = start[i] as number;
    const to = start[i + 1] as number;
    const group = classIndex[i] as number;
    let exponent = (lnK[i] as number) - (lnGamma[group] as number);
    for (let p = from; p < to; p++) {
      exponent += (count[p] as number) * (unknowns[column[p] as number] as number);
    }
    const amount = Math.exp(exponent);
    molality[i] = amount;
    const steep = amount * (slope[group] as number);
    const z = charges[i] as number;
    const half = 0.5 * z * z * amount;
    ionic += half;
    ionicSlope += half * (slope[group] as number);
    for (let p = from; p < to; p++) {
      const row = column[p] as number;
      const nu = count[p] as number;
      const weighted = nu * amount;
      sums[row] = (sums[row] as number) + weighted;
      byIonic[row] = (byIonic[row] as number) + nu * steep;
      ionicBy[row] = (ionicBy[row] as number) + nu * half;
      for (let q = p; q < to; q++) {
        const at = row * m + (column[q] as number);
        products[at] = (products[at] as number) + weighted * (count[q] as number);
      }
    }
    const short = -(hydrogen[i] as number);
    if (short > 0) {
      const weighted = short * amount;
      basicSum += weighted;
      for (let p = from; p < to; p++) {
        const k = column[p] as number;
        basic[k] = (basic[k] as number) + weighted * (count[p] as number);
      }
      basic[m] = (basic[m] as number) + short * steep;
    }
  }
  scalars[0] = ionic;
  scalars[1] = ionicSlope;
  scalars[2] = basicSum;
}
