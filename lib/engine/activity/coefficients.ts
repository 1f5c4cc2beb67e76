import { DAVIES_LINEAR, NEUTRAL_SLOPE, type IonClass } from './ion-class';
import type { DebyeHuckel } from './water-properties';

/** Below this ionic strength (mol/kg) the square root's slope is held, so that pure water has a finite derivative. */
const LEAST_IONIC_STRENGTH = 1e-12;

/** Every class at one temperature as one formula: ln γ = −limit √I / (1 + reach √I) + linear I. */
export interface CoefficientTable {
  readonly limit: Float64Array;
  readonly reach: Float64Array;
  readonly linear: Float64Array;
}

/** Fills a table for the Debye–Hückel slopes of a temperature. */
export function fillTable(
  classes: readonly IonClass[],
  { a, b }: DebyeHuckel,
  table: CoefficientTable,
): void {
  classes.forEach((group, c) => {
    const limit = group.kind === 'neutral' ? 0 : a * group.chargeSquared;
    const reach = group.kind === 'extended' ? b * group.aAngstrom : 1;
    const linear =
      group.kind === 'neutral'
        ? NEUTRAL_SLOPE
        : group.kind === 'davies'
          ? limit * DAVIES_LINEAR
          : group.b;
    table.limit[c] = Math.LN10 * limit;
    table.reach[c] = reach;
    table.linear[c] = Math.LN10 * linear;
  });
}

export const emptyTable = (classes: number): CoefficientTable => ({
  limit: new Float64Array(classes),
  reach: new Float64Array(classes),
  linear: new Float64Array(classes),
});

/**
 * Natural logarithms of the activity coefficients of every class at ionic strength `ionic` (mol/kg) into `lnGamma`,
 * and their derivatives by ionic strength into `slope`. Allocates nothing. Casts: see numeric/lu.ts.
 */
export function fillCoefficients(
  { limit, reach, linear }: CoefficientTable,
  ionic: number,
  lnGamma: Float64Array,
  slope: Float64Array,
): void {
  const strength = ionic > LEAST_IONIC_STRENGTH ? ionic : LEAST_IONIC_STRENGTH;
  const root = Math.sqrt(strength);
  const halfInverse = 0.5 / root;
  for (let c = 0; c < lnGamma.length; c++) {
    const share = 1 / (1 + (reach[c] as number) * root);
    const steep = (limit[c] as number) * share;
    const straight = linear[c] as number;
    lnGamma[c] = straight * strength - steep * root;
    slope[c] = straight - steep * share * halfInverse;
  }
}
