import { CARBON, HYDROGEN } from '../constants/components';
import { findRoot } from '../numeric/root';
import type { Problem } from './problem';
import { solveConditions, type Conditions, type Outcome } from './solve';
import type { Start } from './start';
import { startFrom } from './state';

const DIRECT: Problem = { hydrogenRow: 'carbon', carbonRow: 'held' };
const BOTH_HELD: Problem = { hydrogenRow: 'held', carbonRow: 'held' };
/** pH is looked for upwards from here, in steps of one, to the last at which the model can be asked. */
const LOWEST_PH = -0.5;
const HIGHEST_PH = 15;

/**
 * CO2 pressure and inorganic carbon given, pH to be found. In acid water nearly all carbon is CO2, the rest, which alone
 * tells the pH, is a small difference, and Newton may miss it: pH is then bracketed, for at a fixed pressure inorganic
 * carbon rises with pH without exception. Undefined when CO2 alone exceeds the carbon given.
 */
export function solvePressureAndCarbon(
  conditions: Omit<Conditions, 'problem' | 'lnHydrogen' | 'start'>,
): Outcome | undefined {
  const direct = solveConditions({ ...conditions, problem: DIRECT });
  if (isAnswer(direct)) return direct;
  let near: Start | undefined;
  const excess = (lnHydrogen: number): number => {
    const held = { ...conditions, problem: BOTH_HELD, lnHydrogen };
    let outcome = solveConditions(near ? { ...held, start: near } : held);
    if (!outcome.ending.converged && near) outcome = solveConditions(held);
    if (!outcome.ending.converged) return NaN;
    near = startFrom(outcome.workspace);
    const { carbon } = outcome.workspace.system;
    return (outcome.workspace.sums[carbon] ?? NaN) - (conditions.totals[CARBON] ?? 0);
  };
  let a = -LOWEST_PH * Math.LN10;
  let fa = excess(a);
  if (!(fa < 0)) return undefined;
  for (let pH = LOWEST_PH + 1; pH <= HIGHEST_PH; pH++) {
    const b = -pH * Math.LN10;
    const fb = excess(b);
    if (Number.isNaN(fb)) return undefined;
    if (fb >= 0) {
      findRoot(excess, { a, fa, b, fb }, 1e-12);
      const last = solveConditions({
        ...conditions,
        problem: DIRECT,
        ...(near ? { start: near } : {}),
      });
      return isAnswer(last) ? last : undefined;
    }
    a = b;
    fa = fb;
  }
  return undefined;
}

const isAnswer = ({ ending, workspace }: Outcome): boolean =>
  ending.converged && (workspace.unknowns[HYDROGEN] ?? Infinity) < -LOWEST_PH * Math.LN10;
