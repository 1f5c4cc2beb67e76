import { COMPONENT_KEYS, COMPONENTS, type Component } from '../constants/components';
import { molarMassGMol } from '../constants/notation';
import { SOLIDS_BY_KEY, SPECIES, type Entry } from '../constants/table';
import { classOf } from '../activity/ion-class';
import { emptyTable, fillCoefficients, fillTable } from '../activity/coefficients';
import { debyeHuckelAt } from '../activity/water-properties';
import { constantsAt } from '../speciation/equilibrium-constants';
import type { Water } from '../types';

/** Dissolved metal a model's equilibrium with one named solid would give. Not a forecast of what comes from a tap. */
export interface Solubility {
  readonly solid: string;
  readonly mgL: number;
}

const LEAD_SOLIDS = ['cerussite', 'hydrocerussite', 'lead-hydroxide', 'hydroxypyromorphite'];
const COPPER_SOLIDS = ['copper-hydroxide', 'tenorite', 'malachite'];
const COPPER_I_SOLIDS = ['cuprite'];

/**
 * Theoretical lead solubility by solid, mg/L Pb, least first (Schock's constants, 25 °C). It says which solid a model
 * would expect to hold and how pH, carbonate and phosphate move it; it is no measure of protection.
 */
export const leadSolubilityOf = (water: Water): readonly Solubility[] =>
  solubilities(water, 'Pb', LEAD_SOLIDS);

/** The same for copper(II), mg/L Cu (EPA/600/R-95/085, 25 °C). New pipes follow the hydroxide, old ones the others. */
export const copperSolubilityOf = (water: Water): readonly Solubility[] =>
  solubilities(water, 'Cu2', COPPER_SOLIDS);

/** Copper(I) beside cuprite, mg/L Cu, 25 °C: what a water without oxidant, stagnant in a copper pipe, would hold. */
export const copperOneSolubilityOf = (water: Water): readonly Solubility[] =>
  solubilities(water, 'Cu1', COPPER_I_SOLIDS);

function solubilities(
  water: Water,
  metal: Component,
  solids: readonly string[],
): readonly Solubility[] {
  const column = COMPONENT_KEYS.indexOf(metal);
  const mgPerMol = 1000 * molarMassGMol(COMPONENTS[metal].replace(/[+-]+$/, ''));
  return solids
    .flatMap((solid): Solubility[] => {
      const lnMetal = lnMetalAtSaturation(water, solid, column);
      if (lnMetal === null) return [];
      return [{ solid, mgL: totalOfMetal(water, column, lnMetal) * mgPerMol }];
    })
    .sort((a, b) => a.mgL - b.mgL);
}

/** ln a(metal) beside the solid, everything else as in the water; null where the water lacks a part of the solid. */
function lnMetalAtSaturation(water: Water, solid: string, column: number): number | null {
  const entry = SOLIDS_BY_KEY.get(solid);
  const metal = entry?.composition[column] ?? 0;
  const rest = entry && lnOfOthers(water, entry, column);
  if (rest === null || rest === undefined || metal === 0) return null;
  const lnK = Math.LN10 * (constantsAt(water.temperatureC).solids.get(solid) ?? NaN);
  return (lnK - rest) / metal;
}

/** Σ count · ln a over every component but the metal; null where one is absent. */
function lnOfOthers(water: Water, entry: Entry, column: number): number | null {
  let sum = 0;
  for (const [component, key] of COMPONENT_KEYS.entries()) {
    const count = entry.composition[component] ?? 0;
    if (count === 0 || component === column) continue;
    const activity = water.activities[COMPONENTS[key]] ?? 0;
    if (!(activity > 0)) return null;
    sum += count * Math.log(activity);
  }
  return sum;
}

/** Metal in all its species at a free activity, mol/kg, as a trace that changes nothing else. */
function totalOfMetal(water: Water, column: number, lnMetal: number): number {
  const { species: constants } = constantsAt(water.temperatureC);
  let total = 0;
  for (const entry of SPECIES) {
    const count = entry.composition[column] ?? 0;
    if (count === 0) continue;
    const rest = lnOfOthers(water, entry, column);
    if (rest === null) continue;
    const lnActivity = Math.LN10 * (constants.get(entry.key) ?? NaN) + count * lnMetal + rest;
    total += count * Math.exp(lnActivity - lnGammaOf(water, entry));
  }
  return total;
}

function lnGammaOf(water: Water, entry: Entry): number {
  const table = emptyTable(1);
  fillTable([classOf(entry.key, entry.charge)], debyeHuckelAt(water.temperatureC), table);
  const lnGamma = new Float64Array(1);
  fillCoefficients(table, water.ionicStrengthMolKg, lnGamma, new Float64Array(1));
  return lnGamma[0] ?? NaN;
}
