import { CARBON } from '../constants/components';
import { refuse } from '../refusal';
import { checkNumber, HIGHEST_CO2_ATM } from '../speciation/analysis';
import { describe } from '../speciation/describe';
import { constantsAt } from '../speciation/equilibrium-constants';
import { solveConditions } from '../speciation/solve';
import { foundTotals, startOf, totalsOf } from '../speciation/state';
import type { Refusal, Solved, Water } from '../types';

/** CO2 pressure of outdoor air, atm (about 420 ppm at sea level in the 2020s; from memory). */
export const AIR_CO2_ATM = 4.2e-4;

/** Either a pressure to reach, or the share (0…1) of the way to the air's pressure that an aerator goes. */
export type Stripping =
  { readonly toAtm: number } | { readonly efficiency: number; readonly airAtm?: number };

/** Strips or absorbs CO2: alkalinity and everything else stay, inorganic carbon follows the pressure. */
export function stripCarbonDioxide(water: Water, how: Stripping): Solved | Refusal {
  if (!((water.totalsMolKg['CO3'] ?? 0) > 0)) {
    return refuse('badInput', 'This water holds no inorganic carbon.', 'water');
  }
  const target = targetOf(water, how);
  if (typeof target !== 'number') return target;
  const { temperatureC } = water;
  const totals = totalsOf(water);
  const lnCarbonDioxide = Math.log(target) + Math.LN10 * constantsAt(temperatureC).carbonDioxide;
  const conditions = {
    temperatureC,
    totals,
    problem: { hydrogenRow: 'alkalinity', carbonRow: 'held' },
    lnCarbonDioxide,
  } as const;
  const warm = solveConditions({ ...conditions, start: startOf(water) });
  const outcome = warm.ending.converged ? warm : solveConditions(conditions);
  if (!outcome.ending.converged) return refuse('notConverged', 'No equilibrium was found.');
  totals[CARBON] = 0;
  const found = foundTotals(outcome.workspace, totals, true);
  return { ok: true, water: describe(outcome, found, temperatureC, water.assumptions) };
}

function targetOf(water: Water, how: Stripping): number | Refusal {
  if ('toAtm' in how) {
    const fault = checkNumber(how.toAtm, 'toAtm', [1e-9, HIGHEST_CO2_ATM]);
    return fault ?? how.toAtm;
  }
  const airAtm = how.airAtm ?? AIR_CO2_ATM;
  const fault =
    checkNumber(how.efficiency, 'efficiency', [0, 1]) ??
    checkNumber(airAtm, 'airAtm', [1e-9, HIGHEST_CO2_ATM]);
  return fault ?? water.carbonDioxideAtm + how.efficiency * (airAtm - water.carbonDioxideAtm);
}
