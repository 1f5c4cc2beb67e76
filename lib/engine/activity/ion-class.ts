import { ION_SIZES } from '../constants/ion-sizes';

/** How one group of species departs from ideality: same equation, same coefficient. */
export type IonClass =
  | { readonly kind: 'neutral' }
  | { readonly kind: 'davies'; readonly chargeSquared: number }
  | {
      readonly kind: 'extended';
      readonly chargeSquared: number;
      readonly aAngstrom: number;
      readonly b: number;
    };

/** log10 γ = 0.1 I of a neutral species (Plummer & MacKenzie 1974; common practice). */
export const NEUTRAL_SLOPE = 0.1;
/** Davies 1962, Ion Association: the coefficient of the linear term. */
export const DAVIES_LINEAR = 0.3;

/** The class of a species: published ion size where there is one, Davies otherwise. */
export function classOf(key: string, charge: number): IonClass {
  if (charge === 0) return { kind: 'neutral' };
  const size = ION_SIZES[key];
  const chargeSquared = charge * charge;
  if (size === undefined) return { kind: 'davies', chargeSquared };
  return { kind: 'extended', chargeSquared, aAngstrom: size.aAngstrom, b: size.b };
}
