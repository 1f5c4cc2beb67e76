import { CACO3_MG_PER_MOL } from '../constants/carbonate-equivalents';
import { COMPONENT_KEYS, CARBON } from '../constants/components';
import { SOLIDS_BY_KEY } from '../constants/table';
import { findRoot } from '../numeric/root';
import { refuse } from '../refusal';
import { checkNumber, TEMPERATURE_RANGE_C } from '../speciation/analysis';
import { solveClosed } from '../speciation/closed';
import { startOf, totalsOf } from '../speciation/state';
import { constantsAt } from '../speciation/equilibrium-constants';
import type { Workspace } from '../speciation/workspace';
import type { Refusal, Water } from '../types';
import { holdInEquilibrium } from './hold-in-equilibrium';

const CALCIUM = COMPONENT_KEYS.indexOf('Ca');
/** Most calcite that may dissolve, mol/kg: far beyond any water within the activity model. */
const MOST_DISSOLVED = 0.5;

export type Potential =
  { readonly ok: true; readonly mgLCaCO3: number; readonly evaluations: number } | Refusal;

/**
 * Calcium carbonate precipitation potential, mg/L as CaCO3: calcite formed (negative: dissolved) when the closed water
 * comes to equilibrium with it at `temperatureC`. Exact: the solid's amount is solved for with the speciation.
 */
export function precipitationPotentialAt(water: Water, temperatureC: number): Potential {
  const fault = checkNumber(temperatureC, 'temperatureC', TEMPERATURE_RANGE_C);
  if (fault) return fault;
  const totals = totalsOf(water);
  if (!((totals[CALCIUM] ?? 0) > 0) || !((totals[CARBON] ?? 0) > 0)) {
    return refuse('badInput', 'Water without calcium or inorganic carbon has no such potential.');
  }
  const joint = holdInEquilibrium(temperatureC, totals, ['calcite'], startOf(water));
  if (joint.ending.converged) {
    const m = joint.workspace.system.components.length;
    const moles = joint.workspace.unknowns[m + 1] ?? NaN;
    return { ok: true, mgLCaCO3: moles * CACO3_MG_PER_MOL, evaluations: 1 };
  }
  return bracketed(water, temperatureC, totals);
}

/** The same by bracketing the amount: the index falls without exception as calcite leaves. */
function bracketed(water: Water, temperatureC: number, totals: Float64Array): Potential {
  const calcite = SOLIDS_BY_KEY.get('calcite');
  const solubility = constantsAt(temperatureC).solids.get('calcite') ?? NaN;
  let evaluations = 0;
  const indexAfter = (moles: number): number => {
    evaluations++;
    const left = totals.map((total, i) => total - moles * (calcite?.composition[i] ?? 0));
    const { ending, workspace } = solveClosed(temperatureC, left, startOf(water));
    if (!ending.converged) return NaN;
    return productOf(workspace, calcite?.composition) - solubility;
  };
  const most = Math.min(totals[CALCIUM] ?? 0, totals[CARBON] ?? 0) * (1 - 1e-9);
  const now = indexAfter(0);
  const edge = now > 0 ? most : -MOST_DISSOLVED;
  const root = findRoot(indexAfter, { a: 0, fa: now, b: edge, fb: indexAfter(edge) }, 1e-15);
  if (!root.ok) return refuse('notConverged', 'The precipitation potential was not found.');
  return { ok: true, mgLCaCO3: root.x * CACO3_MG_PER_MOL, evaluations };
}

function productOf({ system, unknowns }: Workspace, composition?: Float64Array): number {
  let log = 0;
  system.components.forEach((component, column) => {
    log += ((composition?.[component] ?? 0) * (unknowns[column] ?? 0)) / Math.LN10;
  });
  return log;
}
