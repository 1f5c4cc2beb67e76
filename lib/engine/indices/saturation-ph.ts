import { CACO3_MG_PER_EQ } from '../constants/carbonate-equivalents';
import { SOLIDS_BY_KEY } from '../constants/table';
import { logKAt } from '../constants/temperature';
import { constantsAt } from '../speciation/equilibrium-constants';
import type { Water } from '../types';

/**
 * pHs = pK2 − pKs + p{Ca2+} + p{alkalinity}: the pH at which this calcium and this alkalinity, taken as bicarbonate,
 * would be saturated with calcite. {Ca2+} is the activity of free calcium; the alkalinity (eq/kg) carries the
 * activity coefficient of bicarbonate. Langelier 1936; constants Plummer & Busenberg 1982. null without calcium,
 * carbonate or positive alkalinity. Meant for pH 6.5 to 9.5.
 */
export function saturationPHOf(water: Water): number | null {
  const calcium = water.activities['Ca++'] ?? 0;
  const bicarbonate = water.speciesMolKg['HCO3-'] ?? 0;
  const alkalinity = water.alkalinityMgLCaCO3 / CACO3_MG_PER_EQ;
  if (!(calcium > 0) || !(bicarbonate > 0) || !(alkalinity > 0)) return null;
  const constants = constantsAt(water.temperatureC);
  const logK2 = (constants.species.get('CO3--') ?? NaN) - (constants.species.get('HCO3-') ?? NaN);
  const calcite = SOLIDS_BY_KEY.get('calcite')?.row;
  const logKs = calcite ? logKAt(calcite, water.temperatureC) : NaN;
  const coefficient = (water.activities['HCO3-'] ?? 0) / bicarbonate;
  return -logK2 + logKs - Math.log10(calcium) - Math.log10(coefficient * alkalinity);
}
