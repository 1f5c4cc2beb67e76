import { DAVIES_LINEAR, NEUTRAL_SLOPE, type IonClass } from './ion-class';
import type { DebyeHuckel } from './water-properties';

/** Below this ionic strength (mol/kg) the square root's slope is held, so that pure water has a finite derivative. */
const LEAST_IONIC_STRENGTH = 1e-12;

/**
 * Natural logarithms of the activity coefficients of every class at ionic strength `ionic` (mol/kg) into `lnGamma`,
 * and their derivatives by ionic strength into `slope`. Allocates nothing.
 */
export function fillCoefficients(
  classes: readonly IonClass[],
  debyeHuckel: DebyeHuckel,
  ionic: number,
  lnGamma: Float64Array,
  slope: Float64Array,
): void {
  const strength = ionic > LEAST_IONIC_STRENGTH ? ionic : LEAST_IONIC_STRENGTH;
  const root = Math.sqrt(strength);
  for (let c = 0; c < classes.length; c++) {
    const group = classes[c] as IonClass;
    if (group.kind === 'neutral') {
      lnGamma[c] = Math.LN10 * NEUTRAL_SLOPE * strength;
      slope[c] = Math.LN10 * NEUTRAL_SLOPE;
      continue;
    }
    const reach = group.kind === 'davies' ? 1 : debyeHuckel.b * group.aAngstrom;
    const linear =
      group.kind === 'davies' ? debyeHuckel.a * group.chargeSquared * DAVIES_LINEAR : group.b;
    const denominator = 1 + reach * root;
    const limiting = debyeHuckel.a * group.chargeSquared;
    lnGamma[c] = Math.LN10 * ((-limiting * root) / denominator + linear * strength);
    slope[c] = Math.LN10 * (-limiting / (2 * root * denominator * denominator) + linear);
  }
}
