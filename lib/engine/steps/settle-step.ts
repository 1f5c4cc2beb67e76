import { refuse } from '../refusal';
import { solveClosed } from '../speciation/closed';
import { describe } from '../speciation/describe';
import { startOf } from '../speciation/state';
import type { Refusal, Solved, Water } from '../types';

/** Equilibrium in solution of what a step left of a water; `solids` is what it took out, mol/kg by solid. */
export function settleStep(
  near: Water,
  totals: Float64Array,
  temperatureC: number,
  solids: Readonly<Record<string, number>> = {},
): Solved | Refusal {
  const outcome = solveClosed(temperatureC, totals, startOf(near));
  if (!outcome.ending.converged) {
    return refuse('notConverged', `No equilibrium was found (${outcome.ending.why}).`);
  }
  const water = describe(outcome, totals, temperatureC, near.assumptions);
  if (Object.keys(solids).length === 0) return { ok: true, water };
  return { ok: true, water: { ...water, precipitatedMolKg: solids } };
}
