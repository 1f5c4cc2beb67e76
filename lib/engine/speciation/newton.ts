import { backSubstitute, factorise, substitute } from '../numeric/lu';
import { evaluate } from './evaluate';
import { fillGaps } from './gaps';
import { fillJacobian } from './jacobian';
import type { Problem } from './problem';
import type { Workspace } from './workspace';

export type Ending =
  | { readonly converged: true; readonly iterations: number; readonly residual: number }
  | {
      readonly converged: false;
      readonly why: 'singular' | 'iterationLimit' | 'notFinite';
      readonly iterations: number;
      readonly residual: number;
    };

/** Largest relative residual that counts as converged. */
export const TOLERANCE = 1e-10;
/**
 * Below the tolerance the last factors are used again until the residual gets here or a step no longer helps: so near
 * the answer they are as good as new ones, and the last digits cost one evaluation.
 */
const GOAL = 2e-14;
/** Largest step in ln a(H+), and in ln of any other activity. */
const HYDROGEN_STEP = 4;
const ACTIVITY_STEP = 5;
/** Ionic strength may change by this factor in one step. */
const IONIC_FACTOR = 2;
/** A step is taken back when the largest gap of a row grows by this factor while it is still above FAR. */
const WORSE = 1.2;
const FAR = 0.5;
const HALVINGS = 3;

/**
 * Newton's method on ln activities, ionic strength and solids together with the analytic Jacobian, from the unknowns
 * and totals already in the workspace. Says why it stopped. Allocates nothing in the loop.
 */
export function solveByNewton(workspace: Workspace, problem: Problem, limit = 40): Ending {
  const size = workspace.system.components.length + 1 + workspace.activeSolids;
  const { matrix, right, pivots, stride } = workspace;
  let previous = Infinity;
  let bestGap = Infinity;
  let halvings = 0;
  let factored = false;
  for (let iterations = 0; ; iterations++) {
    evaluate(workspace);
    const residual = fillGaps(workspace, problem);
    if (!(residual < Infinity)) return { converged: false, why: 'notFinite', iterations, residual };
    const stalled = residual <= TOLERANCE && residual > 0.01 * previous;
    if (residual <= GOAL || stalled) return { converged: true, iterations, residual };
    if (iterations === limit) {
      return { converged: false, why: 'iterationLimit', iterations, residual };
    }
    const gap = largest(right, size);
    if (gap > WORSE * bestGap && gap > FAR && halvings < HALVINGS) {
      halvings++;
      stepBack(workspace, size);
      continue;
    }
    halvings = 0;
    bestGap = gap;
    if (gap < FAR) workspace.ionicBound = Infinity;
    previous = residual;
    if (!factored || residual > TOLERANCE) {
      fillJacobian(workspace, problem);
      factored = factorise(matrix, size, stride, pivots, right);
      if (!factored) return { converged: false, why: 'singular', iterations, residual };
      backSubstitute(matrix, size, stride, right);
    } else substitute(matrix, size, stride, pivots, right);
    step(workspace, size);
  }
}

function largest(values: Float64Array, size: number): number {
  let most = 0;
  for (let k = 0; k < size; k++) most = Math.max(most, Math.abs(values[k] as number));
  return most;
}

/** Undoes three quarters of the last step. */
function stepBack(workspace: Workspace, size: number): void {
  const { unknowns, held } = workspace;
  for (let k = 0; k < size; k++) {
    const from = held[k] as number;
    unknowns[k] = from + 0.25 * ((unknowns[k] as number) - from);
  }
}

/** Adds the step in `right` to the unknowns, shortened where it would leave the region the model is trusted in. */
function step(workspace: Workspace, size: number): void {
  const { unknowns, right, held } = workspace;
  const m = workspace.sums.length;
  let most = 0;
  for (let place = 0; place < m; place++) most = Math.max(most, Math.abs(right[place] as number));
  const share = most > HYDROGEN_STEP ? shareOfStep(right, m) : 1;
  // Components stand backwards in the matrix (see jacobian.ts).
  for (let k = 0; k < m; k++) {
    const from = unknowns[k] as number;
    held[k] = from;
    unknowns[k] = from + share * (right[m - 1 - k] as number);
  }
  for (let k = m; k < size; k++) {
    const from = unknowns[k] as number;
    held[k] = from;
    unknowns[k] = from + share * (right[k] as number);
  }
  const ionic = held[m] as number;
  unknowns[m] = Math.min(
    Math.max(unknowns[m] as number, ionic / IONIC_FACTOR),
    ionic * IONIC_FACTOR,
    workspace.ionicBound,
  );
}

function shareOfStep(right: Float64Array, m: number): number {
  let share = Math.min(1, HYDROGEN_STEP / Math.abs(right[m - 1] as number));
  for (let place = 0; place < m - 1; place++) {
    share = Math.min(share, ACTIVITY_STEP / Math.abs(right[place] as number));
  }
  return share;
}
