import { COMPONENT_KEYS } from '../constants/components';
import { parseReaction } from '../constants/notation';
import { SOLIDS_BY_KEY, SPECIES_BY_KEY, solidFormula } from '../constants/table';
import { formatReaction } from '../constants/notation';
import { SOURCES } from '../constants/sources';
import { logKAt } from '../constants/temperature';

/** A reaction taken to run to its end instead of to an equilibrium. */
export interface CompleteReaction {
  readonly key: string;
  readonly equation: string;
  readonly coefficients: Readonly<Record<string, number>>;
  readonly extentMolKg: number;
  readonly logK: number;
  readonly source: string;
  /** Solid formed, by its key. */
  readonly solid?: string;
}

/** Precipitation of a solid, written from its dissolution reaction turned round. */
export function precipitationOf(
  solid: string,
  extentMolKg: number,
  temperatureC: number,
): CompleteReaction {
  const row = SOLIDS_BY_KEY.get(solid)?.row;
  if (row === undefined) throw new Error(`No solid is called ${solid}`);
  const formula = solidFormula(row);
  const coefficients: Record<string, number> = {};
  for (const [key, coefficient] of parseReaction(row.reaction)) {
    if (key === 'H2O') continue;
    coefficients[key === formula ? solid : key] = -coefficient;
  }
  const [left = '', right = ''] = row.reaction.split(' = ');
  return {
    key: solid,
    equation: formatReaction(`${right} = ${left}`),
    coefficients,
    extentMolKg,
    logK: -logKAt(row, temperatureC),
    source: SOURCES[row.source],
    solid,
  };
}

const CHLORINE_BY_SULFITE = 'HOCl + HSO3- = Cl- + SO4-- + 2H+';
/** From standard potentials (HOCl/Cl− 1.48 V, SO4/HSO3 0.11 V at pH 0): 2 × 1.37 / 0.0592. Order of magnitude, recalled. */
const CHLORINE_BY_SULFITE_LOG_K = 46;

/** Free chlorine and sulfite destroy each other at once, mole for mole. */
export function dechlorinationOf(extentMolKg: number): CompleteReaction {
  return {
    key: 'dechlorination',
    equation: formatReaction(CHLORINE_BY_SULFITE),
    coefficients: Object.fromEntries(parseReaction(CHLORINE_BY_SULFITE)),
    extentMolKg,
    logK: CHLORINE_BY_SULFITE_LOG_K,
    source: 'standard potentials, from memory',
  };
}

/** Takes a complete reaction's dissolved species out of (or into) totals laid out like COMPONENT_KEYS, mol/kg. */
export function applyComplete(reaction: CompleteReaction, totals: Float64Array): void {
  for (const [key, coefficient] of Object.entries(reaction.coefficients)) {
    addSpecies(totals, key, coefficient * reaction.extentMolKg);
  }
}

/** Adds an amount of one dissolved species to totals; anything that is not dissolved leaves them alone. */
export function addSpecies(totals: Float64Array, key: string, amountMolKg: number): void {
  const composition = SPECIES_BY_KEY.get(key)?.composition;
  if (composition === undefined) return;
  for (let component = 0; component < COMPONENT_KEYS.length; component++) {
    totals[component] = (totals[component] ?? 0) + amountMolKg * (composition[component] ?? 0);
  }
}
