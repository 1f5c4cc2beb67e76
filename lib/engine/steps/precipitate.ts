import { checkNumber } from '../speciation/analysis';
import { totalsOf } from '../speciation/state';
import { refuse } from '../refusal';
import { checkSolids, findRest } from '../solids/equilibrate-with';
import { without } from '../solids/solid-algebra';
import type { Refusal, Water } from '../types';
import { settleStep } from './settle-step';

export interface Precipitation {
  readonly solids: readonly string[];
  /** How far each solid gets to its equilibrium amount in the time there is, 0…1; 1 when left out. */
  readonly approach?: number;
  /** Share of what formed that is not settled or filtered and goes on with the water, 0…1; 0 when left out. */
  readonly carryOver?: number;
}

export type Precipitated =
  | {
      readonly ok: true;
      /** The dissolved water; `precipitatedMolKg` is all that formed. */
      readonly water: Water;
      readonly settledMolKg: Readonly<Record<string, number>>;
      readonly carriedOverMolKg: Readonly<Record<string, number>>;
    }
  | Refusal;

/** Lets solids form (never dissolve) on the way to their equilibrium, and parts them from the water. */
export function precipitate(water: Water, how: Precipitation): Precipitated {
  const approach = how.approach ?? 1;
  const carryOver = how.carryOver ?? 0;
  const fault =
    checkSolids(how.solids) ??
    checkNumber(approach, 'approach', [0, 1]) ??
    checkNumber(carryOver, 'carryOver', [0, 1]);
  if (fault) return fault;
  const rest = findRest(water, water.temperatureC, [...new Set(how.solids)]);
  if (!rest) return refuse('notConverged', 'No equilibrium with these solids was found.');
  let totals = totalsOf(water);
  const formed: Record<string, number> = {};
  const settledMolKg: Record<string, number> = {};
  const carriedOverMolKg: Record<string, number> = {};
  for (const [key, moles] of rest.moles) {
    const amount = approach * moles;
    if (!(amount > 0)) continue;
    totals = without(totals, key, amount);
    formed[key] = amount;
    settledMolKg[key] = (1 - carryOver) * amount;
    carriedOverMolKg[key] = carryOver * amount;
  }
  const solved = settleStep(water, totals, water.temperatureC, formed);
  return solved.ok ? { ok: true, water: solved.water, settledMolKg, carriedOverMolKg } : solved;
}
