import { findRoot } from '../numeric/root';
import { solveClosed } from '../speciation/closed';
import type { Outcome } from '../speciation/solve';
import { startFrom, startOf } from '../speciation/state';
import type { Water } from '../types';
import type { Rest } from './equilibrate-with';
import { lnSaturation, mostOf, without } from './solid-algebra';

const SWEEPS = 400;
/** Sweeps end when no solid's amount moves by more than this share of the largest. */
const STILL = 1e-13;

/**
 * Equilibrium with several solids one at a time, each brought to saturation (or to nothing) in its turn. Slow, but the
 * free energy falls at every turn and has one minimum, so it ends where the active set would.
 */
export function descendByTurns(
  water: Water,
  temperatureC: number,
  all: Float64Array,
  candidates: readonly string[],
): Rest | undefined {
  const moles = new Map(candidates.map((key) => [key, 0]));
  let totals = all;
  let near = startOf(water);
  let outcome = solveClosed(temperatureC, totals, near);
  for (let sweep = 0; sweep < SWEEPS; sweep++) {
    let moved = 0;
    let largest = 0;
    for (const key of candidates) {
      const had = moles.get(key) ?? 0;
      const free = without(totals, key, -had);
      const has = amountAtRest(free, key);
      if (has === undefined || !outcome.ending.converged) return undefined;
      totals = without(free, key, has);
      outcome = solveClosed(temperatureC, totals, near);
      near = startFrom(outcome.workspace);
      moles.set(key, has);
      moved = Math.max(moved, Math.abs(has - had));
      largest = Math.max(largest, has);
    }
    if (moved <= STILL * largest) break;
  }
  const formed = new Map([...moles].filter(([, amount]) => amount > 0));
  return outcome.ending.converged ? { outcome, totals, moles: formed } : undefined;

  /** Moles of one solid at which the rest is just saturated, 0 when it is not even so at none. */
  function amountAtRest(free: Float64Array, key: string): number | undefined {
    const excess = (amount: number): number => {
      const solved: Outcome = solveClosed(temperatureC, without(free, key, amount), near);
      return solved.ending.converged ? lnSaturation(solved.workspace, key, temperatureC) : NaN;
    };
    const now = excess(0);
    if (now <= 0) return 0;
    const most = mostOf(free, key);
    // In terms of what is left, which may be many powers of ten below what was there.
    const left = (share: number): number => excess(most * (1 - Math.exp(share)));
    let low = -4;
    let found = left(low);
    while (found > 0 && low > -60) {
      low *= 2;
      found = left(low);
    }
    const root = findRoot(left, { a: 0, fa: now, b: low, fb: found }, 1e-13);
    return root.ok ? most * (1 - Math.exp(root.x)) : undefined;
  }
}
