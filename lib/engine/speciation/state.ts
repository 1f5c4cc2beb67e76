import { COMPONENT_KEYS, COMPONENTS, CARBON, HYDROGEN } from '../constants/components';
import { CACO3_MG_PER_EQ } from '../constants/carbonate-equivalents';
import type { Water } from '../types';
import type { Start } from './start';
import type { Workspace } from './workspace';

/** Totals of a water in the order of COMPONENT_KEYS, mol/kg; the first is minus its alkalinity in eq/kg. */
export function totalsOf(water: Water): Float64Array {
  const totals = new Float64Array(COMPONENT_KEYS.length);
  COMPONENT_KEYS.forEach((key, component) => {
    totals[component] = water.totalsMolKg[key] ?? 0;
  });
  totals[HYDROGEN] = -water.alkalinityMgLCaCO3 / CACO3_MG_PER_EQ;
  return totals;
}

/** Where a solve near this water may start. */
export function startOf(water: Water): Start {
  const lnActivity = new Float64Array(COMPONENT_KEYS.length).fill(NaN);
  COMPONENT_KEYS.forEach((key, component) => {
    const activity = water.activities[COMPONENTS[key]];
    if (activity !== undefined && activity > 0) lnActivity[component] = Math.log(activity);
  });
  return { lnActivity, ionicStrengthMolKg: water.ionicStrengthMolKg };
}

/** The state a workspace rests in, to start the next solve from. */
export function startFrom(workspace: Workspace): Start {
  const lnActivity = new Float64Array(COMPONENT_KEYS.length).fill(NaN);
  const { components } = workspace.system;
  components.forEach((component, column) => {
    lnActivity[component] = workspace.unknowns[column] ?? NaN;
  });
  return { lnActivity, ionicStrengthMolKg: workspace.unknowns[components.length] ?? 0 };
}

/** Totals with what was not given before the solve: alkalinity (unless `alkalinityGiven`) and inorganic carbon. */
export function foundTotals(
  workspace: Workspace,
  given: Float64Array,
  alkalinityGiven = false,
): Float64Array {
  const totals = Float64Array.from(given);
  if (!alkalinityGiven) totals[HYDROGEN] = workspace.sums[0] ?? 0;
  const { carbon } = workspace.system;
  if ((given[CARBON] ?? 0) === 0 && carbon > 0) totals[CARBON] = workspace.sums[carbon] ?? 0;
  return totals;
}
