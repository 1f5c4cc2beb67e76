import { factorise, substitute } from '../numeric/lu';
import { refuse } from '../refusal';
import type { LedgerRow, Refusal } from '../types';
import { allCanBePresent } from './possible';
import { conservationOf, type Conservation } from './conservation';

/** A balanced reaction: products positive, reactants negative, solvent and pure solids left out; K by amounts. */
export interface GivenReaction {
  readonly coefficients: Readonly<Record<string, number>>;
  readonly K: number;
}

export type ReactionTable =
  | {
      readonly ok: true;
      readonly extents: readonly number[];
      readonly rows: readonly LedgerRow[];
      /** Mass-action quotient of each reaction at equilibrium. */
      readonly quotients: readonly number[];
    }
  | Refusal;

const STEPS = 500;
/** Largest step in ln of any basis amount. */
const STEP = 5;
/** Steps in ln shorter than this are taken whole. */
const NEAR = 0.1;
const MOST_REACTIONS = 60;

/**
 * The before–change–equilibrium table of any set of independent reactions, amounts standing for activities (mol/L). The
 * equilibrium is the one root with no negative amount; initial amounts from which none exists are refused.
 */
export function solveReactions(
  reactions: readonly GivenReaction[],
  initial: Readonly<Record<string, number>>,
): ReactionTable {
  const fault = checkReactions(reactions, initial);
  if (fault) return fault;
  const species = [
    ...new Set([...Object.keys(initial), ...reactions.flatMap((r) => Object.keys(r.coefficients))]),
  ];
  const coefficients = reactions.map((r) => species.map((key) => r.coefficients[key] ?? 0));
  const lnK = reactions.map((r) => Math.log(r.K));
  const conservation = conservationOf(species, coefficients, lnK);
  if (!conservation) {
    return refuse('badInput', 'A reaction is a combination of the others.', 'reactions');
  }
  const before = species.map((key) => initial[key] ?? 0);
  const amounts = allCanBePresent(coefficients, before) ? minimise(conservation, before) : null;
  if (!amounts) {
    return refuse(
      'notConverged',
      'From these amounts no equilibrium exists in which every species is present.',
      'initial',
    );
  }
  return table(conservation, coefficients, before, amounts);
}

function checkReactions(
  reactions: readonly GivenReaction[],
  initial: Readonly<Record<string, number>>,
): Refusal | undefined {
  if (!Array.isArray(reactions) || reactions.length === 0) {
    return refuse('badInput', 'At least one reaction is needed.', 'reactions');
  }
  if (reactions.length > MOST_REACTIONS) {
    return refuse('outOfRange', `At most ${MOST_REACTIONS} reactions.`, 'reactions');
  }
  for (const [i, reaction] of (reactions as readonly unknown[]).entries()) {
    const path = `reactions.${i}`;
    if (!isRecord(reaction) || !isRecord(reaction['coefficients'])) {
      return refuse('badInput', 'A reaction has coefficients and K.', path);
    }
    const { K, coefficients } = reaction;
    if (typeof K !== 'number' || !(K > 0) || !(K < Infinity)) {
      return refuse('badInput', 'K must be a positive number.', `${path}.K`);
    }
    for (const [key, n] of Object.entries(coefficients)) {
      if (typeof n !== 'number' || !Number.isFinite(n) || n === 0 || Math.abs(n) > 100) {
        return refuse(
          'badInput',
          'A coefficient is a number other than 0.',
          `${path}.coefficients.${key}`,
        );
      }
    }
  }
  if (!isRecord(initial)) return refuse('badInput', 'Initial amounts are needed.', 'initial');
  for (const [key, amount] of Object.entries(initial as Readonly<Record<string, unknown>>)) {
    if (typeof amount !== 'number' || !(amount >= 0) || !(amount < 1e6)) {
      return refuse('badInput', 'An amount from 0 to a million is needed.', `initial.${key}`);
    }
  }
  return undefined;
}

const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/**
 * Amounts at equilibrium: the minimum of Σ n − Σ T x over x = ln(basis amounts), a convex function whose gradient is
 * the balances. null when it has none.
 */
function minimise(conservation: Conservation, before: readonly number[]): number[] | null {
  const { basis, share, lnFormation } = conservation;
  const m = basis.length;
  const totals = basis.map((_, b) =>
    before.reduce((sum, n, s) => sum + n * (share[s]?.[b] ?? 0), 0),
  );
  const scale = before.reduce((sum, n) => sum + n, 0);
  if (!(scale > 0)) return null;
  const x = new Float64Array(m).fill(Math.log(scale));
  const amountsAt = (at: Float64Array): number[] =>
    lnFormation.map((ln, s) => {
      let exponent = ln;
      for (let b = 0; b < m; b++) exponent += (share[s]?.[b] ?? 0) * (at[b] ?? 0);
      return Math.exp(exponent);
    });
  const potential = (at: Float64Array, amounts: readonly number[]): number =>
    amounts.reduce((sum, n) => sum + n, 0) -
    totals.reduce((sum, t, b) => sum + t * (at[b] ?? 0), 0);
  let amounts = amountsAt(x);
  let height = potential(x, amounts);
  for (let step = 0; step < STEPS; step++) {
    const gradient = totals.map(
      (t, b) => amounts.reduce((sum, n, s) => sum + n * (share[s]?.[b] ?? 0), 0) - t,
    );
    const sizes = totals.map((t, b) =>
      amounts.reduce((sum, n, s) => sum + n * Math.abs(share[s]?.[b] ?? 0), Math.abs(t)),
    );
    const worst = Math.max(...gradient.map((g, b) => Math.abs(g) / (sizes[b] ?? 1)), 0);
    if (worst < 4e-15) return amounts;
    const direction = newtonDirection(share, amounts, gradient, m);
    if (!direction) return null;
    const longest = direction.reduce((most, d) => Math.max(most, Math.abs(d)), 0);
    let along = Math.min(1, STEP / longest);
    let found = false;
    for (let halving = 0; halving < 60 && !found; halving++) {
      const next = x.map((value, b) => value + along * (direction[b] ?? 0));
      const there = amountsAt(next);
      const level = potential(next, there);
      // So near the end the potential no longer tells steps apart, and Newton's own step is right.
      if (longest < NEAR || level <= height) {
        x.set(next);
        amounts = there;
        height = level;
        found = true;
      } else along /= 2;
    }
    if (worst < 1e-12 && longest < 1e-13) return amounts;
    if (!found) return worst < 1e-10 ? amounts : null;
  }
  return null;
}

function newtonDirection(
  share: readonly (readonly number[])[],
  amounts: readonly number[],
  gradient: readonly number[],
  m: number,
): Float64Array | null {
  const hessian = new Float64Array(m * m);
  amounts.forEach((n, s) => {
    for (let a = 0; a < m; a++) {
      for (let b = 0; b < m; b++) {
        hessian[a * m + b] =
          (hessian[a * m + b] ?? 0) + n * (share[s]?.[a] ?? 0) * (share[s]?.[b] ?? 0);
      }
    }
  });
  // Symmetric scaling keeps amounts of very different size in one well-conditioned matrix.
  const weights = Float64Array.from(
    { length: m },
    (_, a) => 1 / Math.sqrt(hessian[a * m + a] ?? 1),
  );
  for (let a = 0; a < m; a++) {
    for (let b = 0; b < m; b++) {
      hessian[a * m + b] = (hessian[a * m + b] ?? 0) * (weights[a] ?? 0) * (weights[b] ?? 0);
    }
  }
  const right = Float64Array.from(gradient, (g, a) => -g * (weights[a] ?? 0));
  const pivots = new Int32Array(m);
  if (!factorise(hessian, m, m, pivots)) return null;
  substitute(hessian, m, m, pivots, right);
  return right.map((value, a) => value * (weights[a] ?? 0));
}

/** Extents from the change of the species that show them most sharply, and the table they make. */
function table(
  { species }: Conservation,
  coefficients: readonly (readonly number[])[],
  before: readonly number[],
  amounts: readonly number[],
): ReactionTable {
  const n = coefficients.length;
  const matrix = new Float64Array(n * n);
  const extents = new Float64Array(n);
  sharpest(coefficients, before, amounts).forEach((s, row) => {
    coefficients.forEach((reaction, r) => {
      matrix[row * n + r] = reaction[s] ?? 0;
    });
    extents[row] = (amounts[s] ?? 0) - (before[s] ?? 0);
  });
  const pivots = new Int32Array(n);
  if (!factorise(matrix, n, n, pivots)) {
    return refuse('badInput', 'A reaction is a combination of the others.', 'reactions');
  }
  substitute(matrix, n, n, pivots, extents);
  const rows = species.map((key, s) => {
    const change = coefficients.reduce((sum, c, r) => sum + (c[s] ?? 0) * (extents[r] ?? 0), 0);
    return { key, before: before[s] ?? 0, change, equilibrium: amounts[s] ?? 0 };
  });
  const quotients = coefficients.map((reaction) =>
    Math.exp(
      reaction.reduce((sum, c, s) => (c === 0 ? sum : sum + c * Math.log(amounts[s] ?? 0)), 0),
    ),
  );
  return { ok: true, extents: [...extents], rows, quotients };
}

/**
 * As many species as reactions, independent in the coefficients, the scarcest first: the difference of two large
 * amounts would lose the digits of a small extent.
 */
function sharpest(
  coefficients: readonly (readonly number[])[],
  before: readonly number[],
  amounts: readonly number[],
): readonly number[] {
  const size = (s: number) => Math.max(before[s] ?? 0, amounts[s] ?? 0);
  const order = before.map((_, s) => s).sort((a, b) => size(a) - size(b));
  const chosen: number[] = [];
  const reduced: { readonly row: readonly number[]; readonly pivot: number }[] = [];
  for (const s of order) {
    let row = coefficients.map((reaction) => reaction[s] ?? 0);
    for (const known of reduced) {
      const factor = (row[known.pivot] ?? 0) / (known.row[known.pivot] ?? 1);
      row = row.map((value, r) => value - factor * (known.row[r] ?? 0));
    }
    const largest = row.reduce(
      (most, value, r) => (Math.abs(value) > Math.abs(row[most] ?? 0) ? r : most),
      0,
    );
    if (Math.abs(row[largest] ?? 0) < 1e-9) continue;
    reduced.push({ row, pivot: largest });
    chosen.push(s);
    if (chosen.length === coefficients.length) break;
  }
  return chosen;
}
