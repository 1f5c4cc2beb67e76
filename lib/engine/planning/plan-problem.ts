import { solveClosed } from '../speciation/closed';
import { describe } from '../speciation/describe';
import type { Start } from '../speciation/start';
import { startFrom, startOf, totalsOf } from '../speciation/state';
import { feedInto } from '../steps/dose';
import type { TargetQuantity, Water } from '../types';
import type { PlanRequest } from './plan-types';
import { quantityOf } from './quantity';

/** What counts as one step of each quantity when violations are weighed against each other. */
const STEP: Readonly<Record<TargetQuantity, number>> = {
  pH: 0.5,
  alkalinity: 20,
  inorganicCarbon: 5,
  calcium: 10,
  hardness: 25,
  langelier: 0.5,
  calciteIndex: 0.5,
  precipitationPotential: 5,
  larson: 0.5,
  chlorideSulfateMassRatio: 0.5,
};

/** A value without meaning (no carbonate left, say) counts as this many steps off. */
const MEANINGLESS = 100;
/** Bounds are met with this much to spare, in steps, so that a met target is met when checked again. */
const MARGIN = 1e-7;

/** One bound as `sign · value ≤ limit`, in steps of its quantity. */
export interface Bound {
  readonly target: number;
  readonly quantity: TargetQuantity;
  readonly side: 'min' | 'max';
  readonly after: number;
  readonly sign: 1 | -1;
  readonly limit: number;
  readonly step: number;
}

/** The plan as functions of the doses (mg/L, in the order of the reagents). */
export interface PlanProblem {
  readonly bounds: readonly Bound[];
  readonly least: readonly number[];
  readonly most: readonly number[];
  readonly costs: readonly number[];
  /** sign · value of every bound, in steps. */
  readonly valuesAt: (doses: readonly number[]) => number[];
  readonly watersAt: (doses: readonly number[]) => Water[];
  readonly evaluations: () => number;
}

export function planProblem(water: Water, request: PlanRequest): PlanProblem {
  const last = request.reagents.length;
  const bounds = request.targets.flatMap((target, i): Bound[] => {
    const step = STEP[target.quantity];
    const common = { target: i, quantity: target.quantity, after: target.after ?? last, step };
    const { min, max } = target;
    // A range narrower than twice the margin is met in its middle.
    const room = min === undefined || max === undefined ? Infinity : (max - min) / (2 * step);
    const spare = Math.min(MARGIN, room);
    return [
      ...(min === undefined
        ? []
        : [{ ...common, side: 'min', sign: -1, limit: -min / step - spare } as const]),
      ...(max === undefined
        ? []
        : [{ ...common, side: 'max', sign: 1, limit: max / step - spare } as const]),
    ];
  });
  const points = [...new Set(bounds.map((bound) => bound.after))].sort((a, b) => a - b);
  const starts = new Map<number, Start>();
  const { temperatureC } = water;
  let evaluations = 0;

  const totalsAfter = (doses: readonly number[], count: number): Float64Array => {
    let totals = totalsOf(water);
    request.reagents.slice(0, count).forEach((entry, i) => {
      const dose = { ...entry, doseMgL: doses[i] ?? 0 };
      if (dose.doseMgL > 0) totals = feedInto(totals, temperatureC, dose).totals;
    });
    return totals;
  };
  const waterAfter = (doses: readonly number[], count: number): Water | undefined => {
    const totals = totalsAfter(doses, count);
    evaluations++;
    const outcome = solveClosed(temperatureC, totals, starts.get(count) ?? startOf(water));
    if (!outcome.ending.converged) return undefined;
    starts.set(count, startFrom(outcome.workspace));
    return describe(outcome, totals, temperatureC, water.assumptions);
  };
  return {
    bounds,
    least: request.reagents.map((entry) => entry.minDoseMgL ?? 0),
    most: request.reagents.map((entry) => entry.maxDoseMgL),
    costs: request.reagents.map((entry) => entry.costPerKg),
    valuesAt(doses) {
      const waters = new Map(points.map((count) => [count, waterAfter(doses, count)]));
      return bounds.map((bound) => {
        const there = waters.get(bound.after);
        if (bound.quantity === 'precipitationPotential') evaluations++;
        const value = there ? quantityOf(there, bound.quantity) : null;
        if (value === null || !Number.isFinite(value)) return bound.limit + MEANINGLESS;
        return (bound.sign * value) / bound.step;
      });
    },
    watersAt: (doses) =>
      request.reagents.flatMap((_, i) => {
        const there = waterAfter(doses, i + 1);
        return there ? [there] : [];
      }),
    evaluations: () => evaluations,
  };
}
