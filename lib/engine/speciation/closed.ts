import { findRoot } from '../numeric/root';
import { HYDROGEN } from '../constants/components';
import type { Start } from './start';
import { startFrom } from './state';
import { CLOSED, solveConditions, type Outcome } from './solve';

const HIGHEST_LN_H = 2 * Math.LN10;
const LOWEST_LN_H = -16 * Math.LN10;

/**
 * A closed water (alkalinity and all totals known). Newton from the state given, else from a guess; should both fail,
 * pH is bracketed: at fixed totals alkalinity rises with pH without exception, so the bracket cannot miss.
 */
export function solveClosed(temperatureC: number, totals: Float64Array, start?: Start): Outcome {
  if (start) {
    const warm = solveConditions({ temperatureC, totals, problem: CLOSED, start });
    if (warm.ending.converged) return warm;
  }
  const cold = solveConditions({ temperatureC, totals, problem: CLOSED });
  if (cold.ending.converged) return cold;
  return bracketed(temperatureC, totals);
}

function bracketed(temperatureC: number, totals: Float64Array): Outcome {
  const target = totals[HYDROGEN] ?? 0;
  let near: Start | undefined;
  let iterations = 0;
  const excess = (lnHydrogen: number): number => {
    const held = {
      temperatureC,
      totals,
      problem: { hydrogenRow: 'held', carbonRow: 'carbon' },
      lnHydrogen,
    } as const;
    let outcome = solveConditions(near ? { ...held, start: near } : held);
    if (!outcome.ending.converged && near) outcome = solveConditions(held);
    iterations += outcome.ending.iterations;
    if (!outcome.ending.converged) return NaN;
    near = startFrom(outcome.workspace);
    return (outcome.workspace.sums[0] ?? NaN) - target;
  };
  findRoot(
    excess,
    {
      a: LOWEST_LN_H,
      fa: excess(LOWEST_LN_H),
      b: HIGHEST_LN_H,
      fb: excess(HIGHEST_LN_H),
    },
    1e-9,
  );
  const last = solveConditions({
    temperatureC,
    totals,
    problem: CLOSED,
    ...(near ? { start: near } : {}),
  });
  return {
    workspace: last.workspace,
    ending: { ...last.ending, iterations: iterations + last.ending.iterations },
  };
}
