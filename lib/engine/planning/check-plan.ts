import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import { checkDose, LARGEST_DOSE_MG_L } from '../steps/dose';
import type { Refusal } from '../types';
import type { PlanRequest } from './plan-types';
import { isTargetQuantity } from './quantity';

const MOST_REAGENTS = 12;
const MOST_TARGETS = 24;

/** Refuses a plan that names unknown things, has no reagent, or ranges turned round. */
export function checkPlan(request: PlanRequest): Refusal | undefined {
  if (typeof request !== 'object' || request === null) {
    return refuse('badInput', 'A plan is needed.', '');
  }
  const { reagents, targets } = request;
  if (!Array.isArray(reagents) || reagents.length === 0 || reagents.length > MOST_REAGENTS) {
    return refuse('badInput', `1 to ${MOST_REAGENTS} reagents are needed.`, 'reagents');
  }
  if (!Array.isArray(targets) || targets.length > MOST_TARGETS) {
    return refuse('badInput', `A list of at most ${MOST_TARGETS} targets is needed.`, 'targets');
  }
  for (const [i, entry] of request.reagents.entries()) {
    const path = `reagents.${i}`;
    const fault =
      checkDose({ ...entry, doseMgL: 0 }, path) ??
      checkNumber(entry.maxDoseMgL, `${path}.maxDoseMgL`, [0, LARGEST_DOSE_MG_L]) ??
      checkNumber(entry.minDoseMgL ?? 0, `${path}.minDoseMgL`, [0, entry.maxDoseMgL]) ??
      checkNumber(entry.costPerKg, `${path}.costPerKg`, [0, 1e9]);
    if (fault) return fault;
  }
  for (const [i, target] of request.targets.entries()) {
    const path = `targets.${i}`;
    if (typeof target !== 'object' || target === null) {
      return refuse('badInput', 'A target is needed.', path);
    }
    if (typeof target.quantity !== 'string' || !isTargetQuantity(target.quantity)) {
      const named = String(target.quantity);
      return refuse('badInput', `No quantity is called ${named}.`, `${path}.quantity`);
    }
    const { min, max, after } = target;
    if (min === undefined && max === undefined) {
      return refuse('badInput', 'A target has a lowest or a highest value.', path);
    }
    const fault =
      checkNumber(min ?? 0, `${path}.min`, [-1e9, 1e9]) ??
      checkNumber(max ?? 0, `${path}.max`, [-1e9, 1e9]) ??
      checkNumber(after ?? 0, `${path}.after`, [0, request.reagents.length]);
    if (fault) return fault;
    if (after !== undefined && !Number.isInteger(after)) {
      return refuse('badInput', 'A whole number is needed.', `${path}.after`);
    }
    if (min !== undefined && max !== undefined && min > max) {
      return refuse('badInput', 'The lowest value lies above the highest.', `${path}.min`);
    }
  }
  return undefined;
}
