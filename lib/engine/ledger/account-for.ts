import { COMPONENTS, COMPONENT_KEYS } from '../constants/components';
import { formatReaction } from '../constants/notation';
import { SOURCES } from '../constants/sources';
import { SPECIES, type Entry } from '../constants/table';
import { logKAt } from '../constants/temperature';
import { refuse } from '../refusal';
import { TOLERANCE } from '../speciation/newton';
import { checkDose, feed } from '../steps/dose';
import type { CompleteReaction } from '../steps/complete-reactions';
import type { Dose, Ledger, LedgerReaction, LedgerRow, Refusal, Water } from '../types';

const BASIS = new Set<string>(COMPONENT_KEYS.map((key) => COMPONENTS[key]));

/**
 * The account of one dosing step. `before` of each species is the original water plus what the dose brought in as fed;
 * `change` is the sum of coefficient × extent; `equilibrium` is their sum and agrees with `after` within the solver's
 * tolerance, else the account is refused. Water itself is left out.
 */
export function accountFor(
  before: Water,
  after: Water,
  dose: Dose,
): { readonly ok: true; readonly ledger: Ledger } | Refusal {
  const fault = checkDose(dose);
  if (fault) return fault;
  if (before.temperatureC !== after.temperatureC) {
    return refuse('badInput', 'The two waters differ in temperature; a dose does not change it.');
  }
  const { fed, complete } = feed(before, dose);
  const amounts: Record<string, number> = { ...before.speciesMolKg };
  for (const [key, amount] of Object.entries(fed)) amounts[key] = (amounts[key] ?? 0) + amount;
  return balance(amounts, after, complete);
}

/** Finds the extents that carry `amounts` to the species of `after`, and checks that every component closes. */
export function balance(
  amounts: Readonly<Record<string, number>>,
  after: Water,
  complete: readonly CompleteReaction[],
): { readonly ok: true; readonly ledger: Ledger } | Refusal {
  const change = new Map<string, number>();
  const addChange = (key: string, amount: number) =>
    change.set(key, (change.get(key) ?? 0) + amount);
  for (const { coefficients, extentMolKg } of complete) {
    for (const [key, c] of Object.entries(coefficients)) addChange(key, c * extentMolKg);
  }
  const reactions: LedgerReaction[] = complete.map((reaction) => ({
    key: reaction.key,
    equation: reaction.equation,
    coefficients: reaction.coefficients,
    extentMolKg: reaction.extentMolKg,
    logK: reaction.logK,
    logQuotient: reaction.logK,
    source: reaction.source,
    complete: true,
  }));
  // Each row defines one species from earlier ones: from the last back, its extent is what is still missing of it.
  for (const entry of [...SPECIES].reverse()) {
    const reaction = extentOf(entry, amounts, after, change);
    if (!reaction) continue;
    for (const [key, c] of Object.entries(reaction.coefficients)) {
      addChange(key, c * reaction.extentMolKg);
    }
    reactions.push(reaction);
  }
  const species = rowsOf(amounts, change);
  const whole = wholeOf(amounts, after);
  const open = species.find((row) => !closes(row, whole.get(row.key) ?? 0, after));
  if (open) return refuse('notConverged', `The account does not close for ${open.key}.`, open.key);
  return { ok: true, ledger: { reactions, species } };
}

function extentOf(
  entry: Entry,
  amounts: Readonly<Record<string, number>>,
  after: Water,
  change: ReadonlyMap<string, number>,
): LedgerReaction | undefined {
  const { key, row, coefficients } = entry;
  if (!row || !coefficients) return undefined;
  const was = amounts[key] ?? 0;
  const is = after.speciesMolKg[key] ?? 0;
  if (was === 0 && is === 0) return undefined;
  const extentMolKg = (is - was - (change.get(key) ?? 0)) / (coefficients.get(key) ?? 1);
  const named = [...coefficients].filter(([term]) => term !== 'H2O');
  const logK = logKAt(row, after.temperatureC);
  const logQuotient = named.reduce(
    (sum, [term, c]) => sum + c * Math.log10(after.activities[term] ?? NaN),
    0,
  );
  return {
    key,
    equation: formatReaction(row.reaction),
    coefficients: Object.fromEntries(named),
    extentMolKg,
    logK,
    logQuotient: Number.isFinite(logQuotient) ? logQuotient : logK,
    source: SOURCES[row.source],
    ...(Number.isFinite(logQuotient) ? {} : { complete: true }),
  };
}

/** Basis species first, then the others in the order of the table, then solids; species that never occur left out. */
function rowsOf(
  amounts: Readonly<Record<string, number>>,
  change: ReadonlyMap<string, number>,
): LedgerRow[] {
  const keys = [...SPECIES.map((entry) => entry.key), ...change.keys()];
  return [...new Set(keys)]
    .map((key) => {
      const before = amounts[key] ?? 0;
      const moved = change.get(key) ?? 0;
      return { key, before, change: moved, equilibrium: before + moved };
    })
    .filter((row) => row.before !== 0 || row.change !== 0);
}

/** Of each basis species, all that holds it on either side of the step, mol/kg: what a rounding is measured against. */
function wholeOf(amounts: Readonly<Record<string, number>>, after: Water): Map<string, number> {
  const whole = new Map<string, number>();
  for (const { key, composition } of SPECIES) {
    const amount = (amounts[key] ?? 0) + (after.speciesMolKg[key] ?? 0);
    if (amount === 0) continue;
    COMPONENT_KEYS.forEach((component, column) => {
      const held = Math.abs(composition[column] ?? 0) * amount;
      if (held > 0)
        whole.set(COMPONENTS[component], (whole.get(COMPONENTS[component]) ?? 0) + held);
    });
  }
  return whole;
}

/** Rounding of a sum over everything that holds a basis species, as a share of it. */
const ROUNDING = 1e-13;

/**
 * A basis species must arrive where the solver put it; the rest arrive there by construction. What is left of a basis
 * species can be far less than the rounding of all that holds it (CO2 or H+ in a softened water).
 */
function closes(row: LedgerRow, whole: number, after: Water): boolean {
  if (!BASIS.has(row.key)) return true;
  const size = Math.abs(row.before) + Math.abs(row.change);
  const solved = after.speciesMolKg[row.key] ?? 0;
  return Math.abs(row.equilibrium - solved) <= 100 * TOLERANCE * size + ROUNDING * whole;
}
