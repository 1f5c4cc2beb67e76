import { minimiseLinear, type Optimum } from '../numeric/simplex';
import type { PlanProblem } from './plan-problem';

/** A point of the search: doses, the values of the bounds there, and its price with violations counted in. */
export interface Trial {
  readonly doses: readonly number[];
  readonly values: readonly number[];
  readonly cost: number;
  /** Sum of the bounds' violations, in steps. */
  readonly violation: number;
}

export interface Descent extends Trial {
  /** Worth of one step of slack of each bound, from the last linear programme. */
  readonly worth: readonly number[];
}

const ROUNDS = 40;
const FIRST_RADIUS = 0.5;
const LAST_RADIUS = 1e-6;
/** Step of the difference quotients, as a share of the dose's span. */
const PROBE = 1e-5;

export function tryDoses(problem: PlanProblem, doses: readonly number[]): Trial {
  const values = problem.valuesAt(doses);
  const violation = values.reduce(
    (sum, value, i) => sum + Math.max(value - (problem.bounds[i]?.limit ?? 0), 0),
    0,
  );
  const cost = doses.reduce((sum, dose, j) => sum + dose * (problem.costs[j] ?? 0), 0);
  return { doses, values, cost, violation };
}

/**
 * Sequential linear programming in a trust region, from one start. `price` is what a step of violation costs. Each
 * linear step is corrected once for curvature before it is judged, so that it may follow a curved bound.
 */
export function descend(problem: PlanProblem, start: Trial, price: number): Descent {
  const spans = problem.most.map((most, j) => most - (problem.least[j] ?? 0));
  const merit = (trial: Trial) => trial.cost + price * trial.violation;
  let best = start;
  let worth = problem.bounds.map(() => 0);
  let radius = FIRST_RADIUS;
  let slopes = slopesAt(problem, best, spans);
  for (let round = 0; round < ROUNDS && radius > LAST_RADIUS; round++) {
    const step = linearStep(problem, best, best.values, slopes, spans, radius, price);
    if (!step) break;
    worth = [...step.worth];
    let next = tryDoses(problem, move(problem, best, step));
    if (next.violation > best.violation) {
      // What the straight model missed at the new point is put into its constants.
      const curved = next.values.map((value, i) => {
        const straight = spans.reduce(
          (sum, _, j) =>
            sum + (slopes[i]?.[j] ?? 0) * ((next.doses[j] ?? 0) - (best.doses[j] ?? 0)),
          best.values[i] ?? 0,
        );
        return (best.values[i] ?? 0) + value - straight;
      });
      const corrected = linearStep(problem, best, curved, slopes, spans, radius, price);
      if (corrected) {
        const other = tryDoses(problem, move(problem, best, corrected));
        if (merit(other) < merit(next)) next = other;
      }
    }
    const gain = merit(best) - merit(next);
    if (gain > 1e-12 * Math.abs(merit(best))) {
      best = next;
      slopes = slopesAt(problem, best, spans);
      radius = Math.min(1, radius * 1.5);
    } else {
      radius /= 5;
    }
  }
  return { ...best, worth };
}

/** Derivatives of the bounds' values by each dose, by forward differences (backward at the upper end). */
function slopesAt(problem: PlanProblem, at: Trial, spans: readonly number[]): number[][] {
  const columns = spans.map((span, j) => {
    if (span === 0) return problem.bounds.map(() => 0);
    const dose = at.doses[j] ?? 0;
    const reach = span * PROBE;
    const h = dose + reach > (problem.most[j] ?? 0) ? -reach : reach;
    const beside = problem.valuesAt(at.doses.map((d, k) => (k === j ? d + h : d)));
    return beside.map((value, i) => (value - (at.values[i] ?? 0)) / h);
  });
  return problem.bounds.map((_, i) => columns.map((column) => column[i] ?? 0));
}

/** The best step of the straight model within the radius, as shifts from the lowest corner of the trust region. */
function linearStep(
  problem: PlanProblem,
  at: Trial,
  values: readonly number[],
  slopes: readonly (readonly number[])[],
  spans: readonly number[],
  radius: number,
  price: number,
): (Optimum & { readonly low: readonly number[] }) | null {
  const low = spans.map((span, j) =>
    Math.max(problem.least[j] ?? 0, (at.doses[j] ?? 0) - radius * span),
  );
  const high = spans.map((span, j) =>
    Math.min(problem.most[j] ?? 0, (at.doses[j] ?? 0) + radius * span),
  );
  const bounds = problem.bounds.map((bound, i) => {
    const atLow = low.reduce(
      (sum, dose, j) => sum + (slopes[i]?.[j] ?? 0) * (dose - (at.doses[j] ?? 0)),
      values[i] ?? 0,
    );
    return bound.limit - atLow;
  });
  const optimum = minimiseLinear({
    cost: problem.costs,
    rows: slopes,
    bounds,
    most: high.map((dose, j) => dose - (low[j] ?? 0)),
    penalties: bounds.map(() => price),
  });
  return optimum && { ...optimum, low };
}

const move = (
  problem: PlanProblem,
  at: Trial,
  step: Optimum & { readonly low: readonly number[] },
): number[] =>
  at.doses.map((_, j) => {
    const dose = (step.low[j] ?? 0) + (step.x[j] ?? 0);
    return Math.min(problem.most[j] ?? 0, Math.max(problem.least[j] ?? 0, dose));
  });
