import { COMPONENT_KEYS, COMPONENTS, CARBON, HYDROGEN } from '../constants/components';
import { chargeOf } from '../constants/notation';
import type { Problem } from './assemble';
import type { ConstantsAt } from './equilibrium-constants';
import { evaluate } from './evaluate';
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

const BASIS_CHARGE_SQUARED = Float64Array.from(
  COMPONENT_KEYS,
  (key) => chargeOf(COMPONENTS[key]) ** 2,
);
const LEAST_IONIC = 1e-7;
/** While Newton is still far off, ionic strength is kept below this many times the first guess. */
const IONIC_ROOM = 3;
const BISECTIONS = 24;
const SWEEPS = 4;
/** A sum this many times its total (natural log) is brought down before Newton starts. */
const TOO_MUCH = 1;

/**
 * A first guess into the unknowns: every total as if free, pH from water and carbonate alone, ionic strength from
 * the totals. Constants are taken as they stand, without activity corrections.
 */
export function guess(workspace: Workspace, given: Guess, constants: ConstantsAt): void {
  const { system, unknowns } = workspace;
  const m = system.components.length;
  let ionic = 0.5 * Math.abs(given.totals[HYDROGEN] ?? 0);
  for (let column = 1; column < m; column++) {
    const component = system.components[column] as number;
    const total = given.totals[component] as number;
    unknowns[column] = Math.log(Math.max(total, Number.MIN_VALUE));
    ionic += 0.5 * (BASIS_CHARGE_SQUARED[component] as number) * total;
  }
  const k1 = 10 ** (constants.species.get('HCO3-') ?? NaN);
  const k12 = 10 ** (constants.species.get('CO3--') ?? NaN);
  const kw = 10 ** (constants.species.get('OH-') ?? NaN);
  const alkalinity = -(given.totals[HYDROGEN] ?? 0);
  const carbon = given.totals[CARBON] ?? 0;
  const pressure = given.lnCarbonDioxide === undefined ? 0 : Math.exp(given.lnCarbonDioxide);
  const lnH = given.lnHydrogen ?? bisect(excess);
  unknowns[HYDROGEN] = lnH;
  const h = Math.exp(lnH);
  ionic += 0.5 * (h + kw / h);
  if (system.carbon > 0) {
    const one = k1 / h;
    const two = k12 / (h * h);
    let free = carbon / (1 + one + two);
    if (given.lnCarbonDioxide !== undefined) free = pressure;
    else if (given.problem.carbonRow === 'alkalinity') {
      const bound = alkalinity - kw / h + h;
      free = Math.max(bound, 1e-9 * (Math.abs(alkalinity) + h)) / (one + 2 * two);
    }
    unknowns[system.carbon] = Math.log(free);
    ionic += 0.5 * free * (one + 4 * two);
  }
  unknowns[m] = Math.max(ionic, LEAST_IONIC);
  workspace.ionicBound = IONIC_ROOM * (unknowns[m] as number);

  /** Rises with h: positive when h is too high. */
  function excess(h: number): number {
    const one = k1 / h;
    const two = k12 / (h * h);
    if (given.problem.hydrogenRow === 'carbon') return carbon - pressure * (1 + one + two);
    const free = given.lnCarbonDioxide === undefined ? carbon / (1 + one + two) : pressure;
    return alkalinity - free * (one + 2 * two) - kw / h + h;
  }
}

function bisect(excess: (h: number) => number): number {
  let low = -15 * Math.LN10;
  let high = Math.LN10;
  for (let i = 0; i < BISECTIONS; i++) {
    const middle = 0.5 * (low + high);
    if (excess(Math.exp(middle)) > 0) high = middle;
    else low = middle;
  }
  return 0.5 * (low + high);
}

/** Unknowns from an earlier state; components it did not hold start as if free. */
export function resume(workspace: Workspace, totals: Float64Array, start: Start): void {
  const { system, unknowns } = workspace;
  const m = system.components.length;
  for (let column = 0; column < m; column++) {
    const component = system.components[column] as number;
    const lnActivity = start.lnActivity[component] as number;
    const total = Math.max(totals[component] as number, Number.MIN_VALUE);
    unknowns[column] = Number.isFinite(lnActivity) ? lnActivity : Math.log(total);
  }
  unknowns[m] = Math.max(start.ionicStrengthMolKg, LEAST_IONIC);
  workspace.ionicBound = Infinity;
}

/**
 * Brings down components whose complexes alone exceed their total (aluminium at high pH by ten powers of ten), each
 * along its own diagonal with ionic strength as guessed, so that Newton never sees absurd amounts.
 */
export function settle(workspace: Workspace, carbonHeld: boolean): void {
  const { system, unknowns, sums, totals, products } = workspace;
  const m = system.components.length;
  for (let sweep = 0; sweep < SWEEPS; sweep++) {
    evaluate(workspace);
    let worst = 0;
    for (let j = 1; j < m; j++) {
      if (j === system.carbon && carbonHeld) continue;
      const sum = sums[j] as number;
      const over = Math.log(sum / (totals[j] as number));
      if (Math.abs(over) < TOO_MUCH) continue;
      worst = Math.max(worst, Math.abs(over));
      unknowns[j] = (unknowns[j] as number) - (over * sum) / (products[j * m + j] as number);
    }
    if (worst === 0) return;
  }
}
