import { CARBON, HYDROGEN } from '../constants/components';
import { SPECIES_BY_KEY } from '../constants/table';
import type { Water } from '../types';

/** Equivalents of bicarbonate and carbonate, free and in complexes, eq/kg. */
export function carbonateAlkalinityOf(water: Water): number {
  let sum = 0;
  for (const [key, amount] of Object.entries(water.speciesMolKg)) {
    const composition = SPECIES_BY_KEY.get(key)?.composition;
    if (composition && (composition[CARBON] ?? 0) > 0) sum -= (composition[HYDROGEN] ?? 0) * amount;
  }
  return sum;
}
