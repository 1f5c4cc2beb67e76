import { GASES } from '../constants/gases';
import { formatReaction } from '../constants/notation';
import { SOURCES } from '../constants/sources';
import { refuse } from '../refusal';
import { constantsAt } from '../speciation/equilibrium-constants';
import { precipitationOf, type CompleteReaction } from '../steps/complete-reactions';
import type { Stream } from '../steps/blend';
import type { Ledger, Refusal, Water } from '../types';
import { balance } from './account-for';

/** A step that was taken, with what it says of itself beyond the two waters. */
export type StepTaken =
  | { readonly kind: 'heat'; readonly before: Water }
  | { readonly kind: 'blend'; readonly streams: readonly Stream[] }
  | { readonly kind: 'strip'; readonly before: Water }
  | { readonly kind: 'precipitate'; readonly before: Water }
  | {
      readonly kind: 'oxidise';
      readonly before: Water;
      readonly reactions: readonly CompleteReaction[];
    };

/**
 * The account of a treatment step, like `accountFor` of a dose: species before (of a blend: each stream by its part),
 * the reactions that ran to their end or to equilibrium with their extents, and species at equilibrium in `after`.
 * Carbon dioxide that left for the air or came from it, and solids that formed, stand among the reactions. Refused when
 * `after` is not what the step makes of `before`.
 */
export function accountForStep(
  step: StepTaken,
  after: Water,
): { readonly ok: true; readonly ledger: Ledger } | Refusal {
  switch (step.kind) {
    case 'heat':
      return balance(step.before.speciesMolKg, after, []);
    case 'blend':
      return blended(step.streams, after);
    case 'strip':
      return balance(step.before.speciesMolKg, after, [exchange(step.before, after)]);
    case 'precipitate':
      return balance(step.before.speciesMolKg, after, formed(after));
    case 'oxidise':
      return balance(withOxidant(step.before, step.reactions), after, step.reactions);
  }
}

function blended(
  streams: readonly Stream[],
  after: Water,
): { readonly ok: true; readonly ledger: Ledger } | Refusal {
  const whole = streams.reduce((sum, { part }) => sum + part, 0);
  if (!(whole > 0)) return refuse('badInput', 'At least one stream must flow.', 'streams');
  const amounts: Record<string, number> = {};
  for (const { water, part } of streams) {
    for (const [key, amount] of Object.entries(water.speciesMolKg)) {
      amounts[key] = (amounts[key] ?? 0) + (part / whole) * amount;
    }
  }
  return balance(amounts, after, []);
}

/** Oxidants from outside the water's own species: what the reactions used up of them stood there before, as fed. */
const FROM_OUTSIDE = ['O2', 'MnO4-'] as const;

function withOxidant(
  before: Water,
  reactions: readonly CompleteReaction[],
): Readonly<Record<string, number>> {
  const amounts: Record<string, number> = { ...before.speciesMolKg };
  for (const key of FROM_OUTSIDE) {
    const used = reactions.reduce(
      (sum, { coefficients, extentMolKg }) => sum - (coefficients[key] ?? 0) * extentMolKg,
      0,
    );
    if (used === 0) continue;
    amounts[key] = used;
    // Permanganate is fed as its potassium salt.
    if (key === 'MnO4-') amounts['K+'] = (amounts['K+'] ?? 0) + used;
  }
  return amounts;
}

/** Solids that left the water, each by its own reaction turned round. */
const formed = (after: Water): CompleteReaction[] =>
  Object.entries(after.precipitatedMolKg ?? {}).map(([solid, moles]) =>
    precipitationOf(solid, moles, after.temperatureC),
  );

/** Carbon dioxide between air and water: what the total of inorganic carbon gained (or, negative, lost). */
function exchange(before: Water, after: Water): CompleteReaction {
  const [henry] = GASES;
  return {
    key: 'CO2(g)',
    equation: formatReaction('CO2(g) = CO2'),
    coefficients: { CO2: 1 },
    extentMolKg: (after.totalsMolKg['CO3'] ?? 0) - (before.totalsMolKg['CO3'] ?? 0),
    logK: constantsAt(after.temperatureC).carbonDioxide,
    source: henry === undefined ? '' : SOURCES[henry.source],
  };
}
