import { COMPONENT_KEYS, CARBON, HYDROGEN, LEAST_TOTAL_MOL_KG } from '../constants/components';
import type { Problem } from './problem';
import { solveByNewton, type Ending } from './newton';
import { guess, resume, settle, type Start } from './start';
import { systemOf } from './system';
import { workspaceOf, type Workspace } from './workspace';

/** Totals and conditions of one solve. */
export interface Conditions {
  readonly temperatureC: number;
  /** Minus alkalinity (eq/kg), then the totals in the order of COMPONENT_KEYS, mol/kg. */
  readonly totals: Float64Array;
  readonly problem: Problem;
  /** ln a(H+) and ln a(CO2), where the problem holds them. */
  readonly lnHydrogen?: number;
  readonly lnCarbonDioxide?: number;
  /** A state near the answer; without it the solve starts from a guess. */
  readonly start?: Start;
}

/** The workspace holds the state until the next solve of the same system. */
export interface Outcome {
  readonly ending: Ending;
  readonly workspace: Workspace;
}

/** Alkalinity and inorganic carbon known, pH to be found: the state of every closed water. */
export const CLOSED: Problem = { hydrogenRow: 'alkalinity', carbonRow: 'carbon' };

/** Speciates totals under the problem's conditions. */
export function solveConditions(conditions: Conditions): Outcome {
  const workspace = prepare(conditions);
  if (conditions.start) resume(workspace, conditions.totals, conditions.start);
  else guess(workspace, conditions);
  holdGiven(workspace, conditions);
  if (!conditions.start) settle(workspace, conditions.problem.carbonRow !== 'carbon');
  return { ending: solveByNewton(workspace, conditions.problem), workspace };
}

/** The workspace of the components present, with totals filled in and no solids active. */
export function prepare(conditions: Conditions): Workspace {
  let mask = 1 << HYDROGEN;
  COMPONENT_KEYS.forEach((_, component) => {
    const total = conditions.totals[component] ?? 0;
    if (component !== HYDROGEN && total > LEAST_TOTAL_MOL_KG) mask |= 1 << component;
  });
  if (conditions.problem.carbonRow !== 'carbon') mask |= 1 << CARBON;
  const system = systemOf(mask);
  const workspace = workspaceOf(system, conditions.temperatureC);
  system.components.forEach((component, column) => {
    workspace.totals[column] = conditions.totals[component] ?? 0;
  });
  workspace.activeSolids = 0;
  return workspace;
}

function holdGiven(workspace: Workspace, conditions: Conditions): void {
  const { carbon } = workspace.system;
  if (conditions.lnHydrogen !== undefined) workspace.unknowns[HYDROGEN] = conditions.lnHydrogen;
  if (conditions.lnCarbonDioxide !== undefined && carbon > 0) {
    workspace.unknowns[carbon] = conditions.lnCarbonDioxide;
  }
}
