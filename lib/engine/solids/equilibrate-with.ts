import { COMPONENT_KEYS } from '../constants/components';
import { SOLIDS_BY_KEY } from '../constants/table';
import { refuse } from '../refusal';
import { solveClosed } from '../speciation/closed';
import { describe } from '../speciation/describe';
import type { Outcome } from '../speciation/solve';
import { startFrom, startOf, totalsOf } from '../speciation/state';
import type { Refusal, Solved, Water } from '../types';
import { descendByTurns } from './descend-by-turns';
import { holdInEquilibrium } from './hold-in-equilibrium';
import { lnSaturation, possibleSolids, without } from './solid-algebra';

/** ln of the saturation ratio above which an absent solid counts as oversaturated. */
export const SATURATION_SLACK = 1e-9;
const ROUNDS = 60;

/** A closed water beside its solids: moles of each per kg, and the dissolved rest. */
export interface Rest {
  readonly outcome: Outcome;
  readonly totals: Float64Array;
  readonly moles: ReadonlyMap<string, number>;
}

/**
 * Brings a water to equilibrium with a set of solids, closed to the atmosphere: no solid in a negative amount, none
 * absent that is oversaturated. Solids start absent, or from `presentMolKg` (a limestone bed, sludge carried along),
 * which may dissolve. `precipitatedMolKg` of the result is what formed, negative where it dissolved.
 */
export function equilibrateWith(
  water: Water,
  solids: readonly string[],
  presentMolKg: Readonly<Record<string, number>> = {},
): Solved | Refusal {
  const fault = checkSolids(solids, presentMolKg);
  if (fault) return fault;
  const rest = findRest(water, water.temperatureC, [...new Set(solids)], presentMolKg);
  if (!rest) return refuse('notConverged', 'No equilibrium with these solids was found.');
  const solved = describe(rest.outcome, rest.totals, water.temperatureC, water.assumptions);
  const precipitatedMolKg: Record<string, number> = {};
  for (const key of solids) {
    const formed = (rest.moles.get(key) ?? 0) - (presentMolKg[key] ?? 0);
    if (formed !== 0) precipitatedMolKg[key] = formed;
  }
  return { ok: true, water: { ...solved, precipitatedMolKg } };
}

/** Refuses unknown solids and amounts that are no amounts. */
export function checkSolids(
  solids: readonly string[],
  presentMolKg: Readonly<Record<string, number>> = {},
): Refusal | undefined {
  if (!Array.isArray(solids)) return refuse('badInput', 'A list of solids is needed.', 'solids');
  for (const [i, key] of solids.entries()) {
    if (typeof key !== 'string' || !SOLIDS_BY_KEY.has(key)) {
      return refuse('badInput', `No solid is called ${String(key)}.`, `solids.${i}`);
    }
  }
  for (const [key, amount] of Object.entries(presentMolKg)) {
    const path = `presentMolKg.${key}`;
    if (!solids.includes(key)) return refuse('badInput', `${key} is not among the solids.`, path);
    if (typeof amount !== 'number' || !(amount >= 0) || amount > 10) {
      return refuse('badInput', 'An amount from 0 to 10 mol/kg is needed.', path);
    }
  }
  return undefined;
}

/** The rest state by an active set; should it cycle or stall, by turns, which cannot. */
export function findRest(
  water: Water,
  temperatureC: number,
  solids: readonly string[],
  presentMolKg: Readonly<Record<string, number>> = {},
): Rest | undefined {
  // Everything is dissolved first: what lies there as solid belongs to the same totals.
  let all = totalsOf(water);
  for (const [key, amount] of Object.entries(presentMolKg)) all = without(all, key, -amount);
  const candidates = possibleSolids(all, solids);
  return (
    byActiveSet(water, temperatureC, all, candidates) ??
    descendByTurns(water, temperatureC, all, candidates)
  );
}

function byActiveSet(
  water: Water,
  temperatureC: number,
  all: Float64Array,
  candidates: readonly string[],
): Rest | undefined {
  const active = new Map<string, number>();
  const seen = new Set<string>();
  let outcome = solveClosed(temperatureC, all, startOf(water));
  for (let round = 0; round < ROUNDS; round++) {
    if (!outcome.ending.converged) return undefined;
    const negative = lowest(active);
    const missing = mostOversaturated(outcome, temperatureC, candidates, active);
    if (negative === undefined && missing === undefined) {
      return settleRest(outcome, temperatureC, all, active);
    }
    if (negative !== undefined) active.delete(negative);
    else if (missing !== undefined) active.set(missing, 0);
    const name = [...active.keys()].sort().join(' ');
    if (seen.has(name)) return undefined;
    seen.add(name);
    if (active.size >= outcome.workspace.system.components.length) return undefined;
    const keys = [...active.keys()];
    const start = startFrom(outcome.workspace);
    const joint = holdInEquilibrium(temperatureC, all, keys, start, [...active.values()]);
    if (!joint.ending.converged) return undefined;
    const m = joint.workspace.system.components.length;
    keys.forEach((key, s) => active.set(key, joint.workspace.unknowns[m + 1 + s] ?? 0));
    outcome = joint;
  }
  return undefined;
}

function lowest(active: ReadonlyMap<string, number>): string | undefined {
  let found: string | undefined;
  let least = 0;
  for (const [key, moles] of active) {
    if (moles < least) {
      least = moles;
      found = key;
    }
  }
  return found;
}

function mostOversaturated(
  { workspace }: Outcome,
  temperatureC: number,
  candidates: readonly string[],
  active: ReadonlyMap<string, number>,
): string | undefined {
  let found: string | undefined;
  let most = SATURATION_SLACK;
  for (const key of candidates) {
    if (active.has(key)) continue;
    const excess = lnSaturation(workspace, key, temperatureC);
    if (excess > most) {
      most = excess;
      found = key;
    }
  }
  return found;
}

/** Solves the dissolved rest once more by itself, so that its balances close without the solids. */
export function settleRest(
  near: Outcome,
  temperatureC: number,
  all: Float64Array,
  moles: ReadonlyMap<string, number>,
): Rest | undefined {
  let totals = all;
  for (const [key, amount] of moles) totals = without(totals, key, amount);
  for (let component = 1; component < COMPONENT_KEYS.length; component++) {
    if ((totals[component] ?? 0) < 0) return undefined;
  }
  const outcome = solveClosed(temperatureC, totals, startFrom(near.workspace));
  return outcome.ending.converged ? { outcome, totals, moles } : undefined;
}
