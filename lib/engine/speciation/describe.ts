import {
  CACO3_MG_PER_EQ,
  CARBON_MG_PER_MOL,
  CO2_MG_PER_MOL,
} from '../constants/carbonate-equivalents';
import {
  COMPONENT_KEYS,
  COMPONENTS,
  CARBON,
  HYDROGEN,
  LEAST_TOTAL_MOL_KG,
} from '../constants/components';
import { chargeOf } from '../constants/notation';
import type { Water } from '../types';
import { constantsAt } from './equilibrium-constants';
import { rangeRemarks } from './remarks';
import type { Outcome } from './solve';

/** Reads a converged workspace out into a water. `totals`: minus alkalinity, then totals by component, mol/kg. */
export function describe(
  outcome: Outcome,
  totals: Float64Array,
  temperatureC: number,
  assumptions: readonly string[],
): Water {
  const { workspace, ending } = outcome;
  const { system, molality, lnGamma, unknowns } = workspace;
  const speciesMolKg: Record<string, number> = {};
  const activities: Record<string, number> = {};
  let cations = 0;
  let anions = 0;
  system.species.forEach((entry, i) => {
    const amount = molality[i] ?? 0;
    speciesMolKg[entry.key] = amount;
    activities[entry.key] = amount * Math.exp(lnGamma[system.classIndex[i] ?? 0] ?? 0);
    if (entry.charge > 0) cations += entry.charge * amount;
    else anions -= entry.charge * amount;
  });
  const carbonDioxide = speciesMolKg['CO2'] ?? 0;
  const constants = constantsAt(temperatureC);
  const henry = 10 ** constants.carbonDioxide;
  const remarks = rangeRemarks(workspace, temperatureC);
  return {
    temperatureC,
    pH: -(unknowns[HYDROGEN] ?? 0) / Math.LN10,
    alkalinityMgLCaCO3: -(totals[HYDROGEN] ?? 0) * CACO3_MG_PER_EQ,
    inorganicCarbonMgLC: (totals[CARBON] ?? 0) * CARBON_MG_PER_MOL,
    carbonDioxideMgLCO2: carbonDioxide * CO2_MG_PER_MOL,
    carbonDioxideAtm: (activities['CO2'] ?? 0) / henry,
    ionicStrengthMolKg: unknowns[system.components.length] ?? 0,
    chargeBalancePercent: (100 * (cations - anions)) / ((cations + anions) / 2),
    totalsMolKg: namedTotals(totals),
    speciesMolKg,
    activities,
    saturationIndex: saturationIndices(outcome, constants.solids),
    assumptions: [...assumptions, ...remarks.filter((remark) => !assumptions.includes(remark))],
    evidence: { iterations: ending.iterations, residual: ending.residual },
  };
}

/** Components present by name, and the charge the analysis does not account for (eq/kg). */
function namedTotals(totals: Float64Array): Record<string, number> {
  const named: Record<string, number> = {};
  let charge = totals[HYDROGEN] ?? 0;
  COMPONENT_KEYS.forEach((key, component) => {
    if (component === HYDROGEN) return;
    const total = totals[component] ?? 0;
    if (total > LEAST_TOTAL_MOL_KG) named[key] = total;
    charge += chargeOf(COMPONENTS[key]) * total;
  });
  named['charge'] = charge;
  return named;
}

function saturationIndices(
  { workspace }: Outcome,
  solubility: ReadonlyMap<string, number>,
): Record<string, number> {
  const { system, unknowns } = workspace;
  const indices: Record<string, number> = {};
  for (const solid of system.solids) {
    let logProduct = 0;
    system.components.forEach((component, column) => {
      const count = solid.composition[component] ?? 0;
      if (count !== 0) logProduct += (count * (unknowns[column] ?? 0)) / Math.LN10;
    });
    indices[solid.key] = logProduct - (solubility.get(solid.key) ?? 0);
  }
  return indices;
}
