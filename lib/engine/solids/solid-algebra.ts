import { LEAST_TOTAL_MOL_KG } from '../constants/components';
import { SOLIDS_BY_KEY } from '../constants/table';
import { constantsAt } from '../speciation/equilibrium-constants';
import type { Workspace } from '../speciation/workspace';

/** Totals with an amount of a solid taken out (negative: dissolved into them). */
export function without(totals: Float64Array, key: string, moles: number): Float64Array {
  const composition = SOLIDS_BY_KEY.get(key)?.composition;
  return totals.map((total, component) => total - moles * (composition?.[component] ?? 0));
}

/** The solids whose every component is in the totals. */
export const possibleSolids = (totals: Float64Array, solids: readonly string[]): string[] =>
  solids.filter((key) => {
    const composition = SOLIDS_BY_KEY.get(key)?.composition;
    return composition?.every(
      (count, component) =>
        component === 0 || count === 0 || (totals[component] ?? 0) > LEAST_TOTAL_MOL_KG,
    );
  });

/** Most of a solid that totals can form, mol/kg. */
export function mostOf(totals: Float64Array, key: string): number {
  let most = Infinity;
  SOLIDS_BY_KEY.get(key)?.composition.forEach((count, component) => {
    if (component > 0 && count > 0) most = Math.min(most, (totals[component] ?? 0) / count);
  });
  return most;
}

/** ln of the saturation ratio of a solid in a solved workspace; −∞ where a component is absent. */
export function lnSaturation(workspace: Workspace, key: string, temperatureC: number): number {
  const { system, unknowns } = workspace;
  const composition = SOLIDS_BY_KEY.get(key)?.composition;
  let log = -Math.LN10 * (constantsAt(temperatureC).solids.get(key) ?? NaN);
  composition?.forEach((count, component) => {
    if (count === 0) return;
    const column = system.components.indexOf(component);
    log += column < 0 ? -Infinity : count * (unknowns[column] ?? NaN);
  });
  return log;
}
