import type { Water } from '../types';
import { checkPlan } from './check-plan';
import { descend, tryDoses, type Descent, type Trial } from './descend';
import { planProblem, type Bound, type PlanProblem } from './plan-problem';
import type { BindingTarget, Plan, PlanRequest, Violation } from './plan-types';
import { QUANTITY_NAMES } from './quantity';

/** A plan this little off, in steps of its quantities, is feasible. */
const FEASIBLE = 1e-8;
/** A bound this near, in steps, binds. */
const NEAR = 1e-5;
/** Points looked at before the search starts, and how many of them it starts from. */
const LOOKS = 30;
const STARTS = 3;
/** A step of violation costs at first this many times the dearest plan; then, if targets stay broken, far more. */
const PRICES = [3, 1000] as const;

/**
 * The cheapest doses that keep every target within its range: linear steps in a trust region from the best of many
 * points, so that a separate feasible region is not missed. Infeasible, it returns the doses that break the targets
 * least (in steps of their quantities) and names those broken.
 */
export function planDoses(water: Water, request: PlanRequest): Plan {
  const fault = checkPlan(request);
  if (fault) return fault;
  const problem = planProblem(water, request);
  const dearest = problem.most.reduce((sum, most, j) => sum + most * (problem.costs[j] ?? 0), 0);
  const scale = dearest > 0 ? dearest : 1;
  let best: Descent | undefined;
  for (const start of starts(problem, PRICES[0] * scale)) {
    let found = descend(problem, start, PRICES[0] * scale);
    if (found.violation > FEASIBLE) found = descend(problem, found, PRICES[1] * scale);
    if (!best || better(found, best)) best = found;
  }
  const chosen = best ?? { ...tryDoses(problem, problem.least), worth: [] };
  const feasible = chosen.violation <= FEASIBLE;
  const reagents = request.reagents;
  const waters = problem.watersAt(chosen.doses);
  return {
    ok: true,
    feasible,
    doses: reagents.map(({ reagent }, j) => ({ reagent, doseMgL: chosen.doses[j] ?? 0 })),
    costPerML: chosen.cost,
    binding: feasible ? bindingOf(problem, chosen) : [],
    violations: feasible ? [] : violationsOf(problem, chosen, request),
    waters,
    evaluations: problem.evaluations(),
  };
}

function better(a: Trial, b: Trial): boolean {
  const bothFeasible = a.violation <= FEASIBLE && b.violation <= FEASIBLE;
  return bothFeasible ? a.cost < b.cost : a.violation < b.violation;
}

/** The most promising of evenly scattered points, nothing fed among them. */
function starts(problem: PlanProblem, price: number): readonly Trial[] {
  const trials = Array.from({ length: LOOKS }, (_, k) =>
    tryDoses(
      problem,
      problem.most.map((most, j) => {
        const least = problem.least[j] ?? 0;
        return least + scatter(k, j) * (most - least);
      }),
    ),
  );
  const merit = (trial: Trial) => trial.cost + price * trial.violation;
  return trials.sort((a, b) => merit(a) - merit(b)).slice(0, STARTS);
}

/** Halton's sequence, squared: closer together at small doses, where most plans end. */
function scatter(k: number, j: number): number {
  const base = [2, 3, 5, 7, 11, 13, 17, 19, 23, 29, 31, 37][j] ?? 41;
  let share = 0;
  let digit = 1 / base;
  for (let rest = k; rest > 0; rest = Math.floor(rest / base)) {
    share += (rest % base) * digit;
    digit /= base;
  }
  return share * share;
}

const slackOf = (bound: Bound, value: number): number => bound.limit - value;

function bindingOf(problem: PlanProblem, { values, worth }: Descent): BindingTarget[] {
  return problem.bounds.flatMap((bound, i) => {
    if (slackOf(bound, values[i] ?? 0) > NEAR) return [];
    const { target, quantity, side, step } = bound;
    return [{ target, quantity, bound: side, costPerUnit: (worth[i] ?? 0) / step }];
  });
}

function violationsOf(
  problem: PlanProblem,
  { values }: Trial,
  request: PlanRequest,
): readonly Violation[] {
  return problem.bounds
    .flatMap((bound, i): Violation[] => {
      const over = -slackOf(bound, values[i] ?? 0);
      if (over <= FEASIBLE) return [];
      const { target, quantity, side, step } = bound;
      const by = over * step;
      const wanted = request.targets[target]?.[side] ?? NaN;
      const way = side === 'min' ? 'at least' : 'at most';
      const message = `${QUANTITY_NAMES[quantity]} cannot be ${way} ${wanted}; it misses by ${by.toPrecision(3)}.`;
      const capital = message.startsWith('pH')
        ? message
        : message.charAt(0).toUpperCase() + message.slice(1);
      return [{ target, quantity, bound: side, by, message: capital }];
    })
    .sort((a, b) => b.by - a.by);
}
