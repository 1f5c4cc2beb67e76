import { SOLIDS_BY_KEY } from '../constants/table';
import { constantsAt } from '../speciation/equilibrium-constants';
import { solveByNewton } from '../speciation/newton';
import { CLOSED, prepare, type Outcome } from '../speciation/solve';
import { resume, type Start } from '../speciation/start';

/**
 * Speciates a closed water held at saturation with every solid named; each solid's moles (either sign) follow the
 * ionic strength in the unknowns. Solids whose components are absent must not be named.
 */
export function holdInEquilibrium(
  temperatureC: number,
  totals: Float64Array,
  solids: readonly string[],
  start: Start,
  moles: readonly number[] = [],
): Outcome {
  const workspace = prepare({ temperatureC, totals, problem: CLOSED });
  resume(workspace, totals, start);
  const { system, solidCounts, solidLnK, unknowns } = workspace;
  const m = system.components.length;
  const constants = constantsAt(temperatureC);
  solids.forEach((key, s) => {
    const solid = SOLIDS_BY_KEY.get(key);
    system.components.forEach((component, column) => {
      solidCounts[s * m + column] = solid?.composition[component] ?? 0;
    });
    solidLnK[s] = Math.LN10 * (constants.solids.get(key) ?? NaN);
    unknowns[m + 1 + s] = moles[s] ?? 0;
  });
  workspace.activeSolids = solids.length;
  const ending = solveByNewton(workspace, CLOSED);
  return { ending, workspace };
}
