import type { Dose } from '@/lib/engine';
import type { Values } from './raw-water';
import type { Scatter } from './works/definition';

/** A value that varies by `share` of itself. */
export const lively = (value: number, share: number, scatter: Scatter): number =>
  value * Math.exp(share * scatter());

export const roundTo = (value: number, step: number): number =>
  Number((Math.round(value / step) * step).toPrecision(12));

// g/mol, IUPAC atomic weights.
const CHLORINE = 70.9;
const HYDROGEN_CHLORIDE = 36.458;
const SODIUM_HYDROXIDE = 39.997;

/** What is left of a chlorine dose once the water has had its demand, mg/L as Cl2. */
export const chlorineLeft = (doseMgL: number, demandMgL: number): number =>
  Math.max(0.02, doseMgL - demandMgL);

/**
 * A chlorine product as the water meets it: what is left stays as free chlorine, what was used up has become chloride
 * (gas: two acids a mole; hypochlorite: plain salt, written here as its acid and its alkali).
 */
export function chlorineDoses(
  reagent: 'chlorine' | 'sodium-hypochlorite',
  doseMgL: number,
  leftMgL: number,
): Dose[] {
  const usedMmolL = Math.max(0, doseMgL - leftMgL) / CHLORINE;
  const acidMoles = reagent === 'chlorine' ? 2 : 1;
  const doses: Dose[] = [
    { reagent, doseMgL: leftMgL },
    { reagent: 'hydrochloric-acid', doseMgL: usedMmolL * acidMoles * HYDROGEN_CHLORIDE },
  ];
  return reagent === 'chlorine'
    ? doses
    : [...doses, { reagent: 'sodium-hydroxide', doseMgL: usedMmolL * SODIUM_HYDROXIDE }];
}

export interface Mains {
  readonly ageH: number;
  /** First-order loss of free chlorine, 1/h at 20 °C. */
  readonly chlorineLossPerH: number;
  readonly pHDrift: number;
  readonly ironGainMgL: number;
}

const GROUND_C = 11;
/** Bulk decay about doubles with 10 °C (common practice). */
const DECAY_FACTOR_10_C = 2;

/** Finished water after its time in the mains. */
export function aged(finished: Values, mains: Mains, scatter: Scatter): Values {
  const { temperature = GROUND_C, pH = 7, freeChlorine, iron = 0, turbidity = 0.1 } = finished;
  const temperatureC = 0.55 * temperature + 0.45 * GROUND_C + 0.4 * scatter();
  const lossPerH = mains.chlorineLossPerH * DECAY_FACTOR_10_C ** ((temperatureC - 20) / 10);
  const left = lively(Math.exp(-lossPerH * mains.ageH), 0.12, scatter);
  return {
    ...finished,
    temperature: temperatureC,
    pH: pH + mains.pHDrift + 0.05 * scatter(),
    turbidity: turbidity + lively(0.08, 0.45, scatter),
    iron: iron + lively(mains.ironGainMgL, 0.6, scatter),
    ...(freeChlorine === undefined ? {} : { freeChlorine: freeChlorine * left }),
  };
}
