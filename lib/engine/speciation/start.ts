import { CARBON, HYDROGEN } from '../constants/components';
import { evaluate } from './evaluate';
import type { Problem } from './problem';
import type { Workspace } from './workspace';

/** What a solve may start from: ln activity of every basis species by component, and ionic strength (mol/kg). */
export interface Start {
  readonly lnActivity: Float64Array;
  readonly ionicStrengthMolKg: number;
}

export interface Guess {
  /** Minus alkalinity, then the totals, in the order of COMPONENT_KEYS, mol/kg. */
  readonly totals: Float64Array;
  readonly problem: Problem;
  /** ln a(H+) and ln a(CO2) where they are given. */
  readonly lnHydrogen?: number;
  readonly lnCarbonDioxide?: number;
}

const LEAST_IONIC = 1e-7;
/** While Newton is still far off, ionic strength is kept below this many times the first guess. */
const IONIC_ROOM = 3;
/** pH is bisected from 16 down to −1 this often: to 0.02, as near as a guess without activities deserves. */
const BISECTIONS = 10;
const SWEEPS = 12;
/** A sum this far from its total (natural log) is brought near before Newton starts. */
const FAR = 1;

/**
 * A first guess into the unknowns: pH from water and every component with its own acids and hydroxides, then each
 * component's share that is free, ionic strength from the totals. Constants are taken without activity corrections,
 * complexes between components are left out.
 */
export function guess(workspace: Workspace, given: Guess): void {
  const { system, unknowns, totals } = workspace;
  const m = system.components.length;
  const lnH = given.lnHydrogen ?? bisectHydrogen(workspace, given);
  unknowns[HYDROGEN] = lnH;
  let ionic = 0.5 * Math.abs(totals[HYDROGEN] as number);
  ionic += 0.5 * Math.abs(hydrogenSum(workspace, HYDROGEN, lnH)) + Math.exp(lnH);
  for (let j = 1; j < m; j++) {
    const free = (totals[j] as number) / freeDivisor(workspace, j, lnH);
    unknowns[j] = Math.log(free);
    ionic += 0.5 * free * chargeSum(workspace, j, lnH);
  }
  if (system.carbon > 0) ionic += guessCarbon(workspace, given, lnH);
  unknowns[m] = Math.max(ionic, LEAST_IONIC);
  workspace.ionicBound = IONIC_ROOM * unknowns[m];
}

/** ln a(CO2) where the total does not give it; returns the ionic strength of its ions, mol/kg. */
function guessCarbon(workspace: Workspace, given: Guess, lnH: number): number {
  const { system, unknowns, totals } = workspace;
  const carbon = system.carbon;
  const hydrogenPer = hydrogenSum(workspace, carbon, lnH);
  if (given.lnCarbonDioxide !== undefined) {
    unknowns[carbon] = given.lnCarbonDioxide;
  } else if (given.problem.carbonRow === 'alkalinity') {
    const rest = -(totals[HYDROGEN] as number) + otherHydrogen(workspace, lnH);
    const least = 1e-9 * (Math.abs(totals[HYDROGEN] as number) + Math.exp(lnH));
    unknowns[carbon] = Math.log(Math.max(rest, least) / -hydrogenPer);
  }
  return -hydrogenPer * Math.exp(unknowns[carbon] as number);
}

/** Σ K·h^n over a component's own species: total over free. */
function freeDivisor({ system, lnK }: Workspace, column: number, lnH: number): number {
  let sum = 0;
  const to = system.aloneStart[column + 1] as number;
  for (let p = system.aloneStart[column] as number; p < to; p++) {
    const i = system.alone[p] as number;
    sum += Math.exp((lnK[i] as number) + (system.hydrogen[i] as number) * lnH);
  }
  return sum;
}

/** Σ z²·K·h^n over a component's own species: twice their ionic strength per free component. */
function chargeSum({ system, lnK }: Workspace, column: number, lnH: number): number {
  let sum = 0;
  const to = system.aloneStart[column + 1] as number;
  for (let p = system.aloneStart[column] as number; p < to; p++) {
    const i = system.alone[p] as number;
    const z = system.charges[i] as number;
    if (z !== 0) {
      sum += z * z * Math.exp((lnK[i] as number) + (system.hydrogen[i] as number) * lnH);
    }
  }
  return sum;
}

/** Σ n·K·h^n over a component's own species: H+ bound per free component (column 0: in water itself). */
function hydrogenSum({ system, lnK }: Workspace, column: number, lnH: number): number {
  let sum = 0;
  const to = system.aloneStart[column + 1] as number;
  for (let p = system.aloneStart[column] as number; p < to; p++) {
    const i = system.alone[p] as number;
    const n = system.hydrogen[i] as number;
    sum += n * Math.exp((lnK[i] as number) + n * lnH);
  }
  return sum;
}

/** H+ over the basis held by everything but inorganic carbon. */
function otherHydrogen(workspace: Workspace, lnH: number): number {
  const { system, totals } = workspace;
  let sum = hydrogenSum(workspace, HYDROGEN, lnH);
  for (let j = 1; j < system.components.length; j++) {
    const runs = (system.aloneStart[j + 1] as number) - (system.aloneStart[j] as number);
    if (j === system.carbon || runs < 2) continue;
    const free = (totals[j] as number) / freeDivisor(workspace, j, lnH);
    sum += free * hydrogenSum(workspace, j, lnH);
  }
  return sum;
}

function bisectHydrogen(workspace: Workspace, given: Guess): number {
  let low = -16 * Math.LN10;
  let high = Math.LN10;
  for (let i = 0; i < BISECTIONS; i++) {
    const middle = 0.5 * (low + high);
    if (excess(workspace, given, middle) > 0) high = middle;
    else low = middle;
  }
  return 0.5 * (low + high);
}

/** Rises with h: positive where h is too high. */
function excess(workspace: Workspace, given: Guess, lnH: number): number {
  const { carbon } = workspace.system;
  const pressed = given.lnCarbonDioxide;
  if (given.problem.hydrogenRow === 'carbon') {
    const held = Math.exp(pressed ?? 0) * freeDivisor(workspace, carbon, lnH);
    return (given.totals[CARBON] ?? 0) - held;
  }
  let sum = otherHydrogen(workspace, lnH) - (given.totals[HYDROGEN] ?? 0);
  if (carbon > 0) {
    const free =
      pressed === undefined
        ? (given.totals[CARBON] ?? 0) / freeDivisor(workspace, carbon, lnH)
        : Math.exp(pressed);
    sum += free * hydrogenSum(workspace, carbon, lnH);
  }
  return sum;
}

/** Unknowns from an earlier state; components it did not hold start as if free. */
export function resume(workspace: Workspace, totals: Float64Array, start: Start): void {
  const { system, unknowns } = workspace;
  const m = system.components.length;
  const lnH = start.lnActivity[HYDROGEN] as number;
  for (let column = 0; column < m; column++) {
    const component = system.components[column] as number;
    const lnActivity = start.lnActivity[component] as number;
    const known = Number.isFinite(lnActivity);
    unknowns[column] = known
      ? lnActivity
      : Math.log((totals[component] as number) / freeDivisor(workspace, column, lnH));
  }
  unknowns[m] = Math.max(start.ionicStrengthMolKg, LEAST_IONIC);
  workspace.ionicBound = Infinity;
}

/**
 * While some component's sum is far from its total (fluoride beside aluminium, say), moves the worst one along its own
 * diagonal with ionic strength as guessed: descent on a convex function, so that Newton never sees absurd amounts.
 */
export function settle(workspace: Workspace, carbonHeld: boolean): void {
  const { system, unknowns, sums, totals } = workspace;
  const m = system.components.length;
  for (let sweep = 0; sweep < SWEEPS; sweep++) {
    evaluate(workspace);
    let worst = FAR;
    let column = 0;
    let over = 0;
    for (let j = 1; j < m; j++) {
      if (j === system.carbon && carbonHeld) continue;
      const gap = Math.log((sums[j] as number) / (totals[j] as number));
      if (Math.abs(gap) <= worst) continue;
      worst = Math.abs(gap);
      column = j;
      over = gap;
    }
    if (column === 0) return;
    const diagonal = squareSum(workspace, column) / (sums[column] as number);
    unknowns[column] = (unknowns[column] as number) - over / diagonal;
  }
}

/** Σ count² · molality: the derivative of a component's sum by its own ln activity. */
function squareSum({ system, molality }: Workspace, column: number): number {
  const { from, terms } = system;
  let sum = molality[column] as number;
  const to = 2 * (from[column + 1] as number);
  for (let p = 2 * (from[column] as number); p < to; p += 2) {
    sum += (terms[p + 1] as number) ** 2 * (molality[terms[p] as number] as number);
  }
  return sum;
}
