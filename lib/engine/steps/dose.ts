import { COMPONENT_KEYS } from '../constants/components';
import { refuse } from '../refusal';
import {
  ALUM_HYDRATE,
  isReagent,
  polyaluminumChloride,
  REAGENTS,
  WATER_G_MOL,
} from '../reagents/catalogue';
import { equilibrateWith } from '../solids/equilibrate-with';
import { checkNumber } from '../speciation/analysis';
import { solveClosed } from '../speciation/closed';
import { describe } from '../speciation/describe';
import { startOf, totalsOf } from '../speciation/state';
import type { Dose, Refusal, Solved, Water } from '../types';
import {
  addSpecies,
  applyComplete,
  dechlorinationOf,
  precipitationOf,
  type CompleteReaction,
} from './complete-reactions';

/** Largest dose the engine answers for, mg/L. */
export const LARGEST_DOSE_MG_L = 100_000;
/** Above it aluminium leaves no chloride to speak of: aluminium chlorohydrate reaches 0.83. */
const HIGHEST_BASICITY = 0.9;
/** Components that reactions run to an end may use up exactly; a rest of rounding is none. */
const ROUNDING = 1e-14;

/** What a dose does before equilibrium: the totals it leaves, what it fed (mol/kg) and what ran to its end. */
export interface Feeding {
  readonly totals: Float64Array;
  readonly fed: Readonly<Record<string, number>>;
  readonly complete: readonly CompleteReaction[];
}

export interface DoseOptions {
  /** `complete` (when left out): a coagulant's metal leaves to the last; `equilibrium`: as far as its solubility. */
  readonly solids?: 'complete' | 'equilibrium';
}

/** Refuses an unknown reagent, a dose that is not a number, negative, or absurd. */
export function checkDose(dose: Dose, path = ''): Refusal | undefined {
  const at = (field: string) => (path === '' ? field : `${path}.${field}`);
  if (typeof dose !== 'object' || dose === null)
    return refuse('badInput', 'A dose is needed.', path);
  if (typeof dose.reagent !== 'string' || !isReagent(dose.reagent)) {
    return refuse('badInput', `No reagent is called ${String(dose.reagent)}.`, at('reagent'));
  }
  if (typeof dose.doseMgL === 'number' && dose.doseMgL < 0) {
    return refuse('badInput', 'A dose cannot be negative.', at('doseMgL'));
  }
  if (dose.hydrate !== undefined) {
    const fault = checkNumber(dose.hydrate, at('hydrate'), [0, 30]);
    if (fault) return fault;
  }
  if (dose.basicity !== undefined) {
    if (dose.reagent !== 'polyaluminum-chloride') {
      const { name } = REAGENTS[dose.reagent];
      return refuse(
        'badInput',
        `Basicity belongs to polyaluminium chloride, not to ${name}.`,
        at('basicity'),
      );
    }
    const fault = checkNumber(dose.basicity, at('basicity'), [0, HIGHEST_BASICITY]);
    if (fault) return fault;
  }
  return checkNumber(dose.doseMgL, at('doseMgL'), [0, LARGEST_DOSE_MG_L]);
}

/** g/mol of the compound as dosed; `hydrate` replaces the usual water of hydration. */
export function doseMolarMass({ reagent, hydrate }: Pick<Dose, 'reagent' | 'hydrate'>): number {
  const { molarMassGMol } = REAGENTS[reagent];
  if (hydrate === undefined) return molarMassGMol;
  const usual =
    reagent === 'aluminum-sulfate' ? ALUM_HYDRATE : reagent === 'ferrous-sulfate' ? 7 : 0;
  return molarMassGMol + (hydrate - usual) * WATER_G_MOL;
}

/** Puts a (checked) dose into the totals of a water and runs what runs to its end. */
export const feed = (water: Water, dose: Dose): Feeding =>
  feedInto(totalsOf(water), water.temperatureC, dose);

/** The same for bare totals, which are not changed. */
export function feedInto(
  before: Float64Array,
  temperatureC: number,
  dose: Dose,
  options: DoseOptions = {},
): Feeding {
  const info = REAGENTS[dose.reagent];
  const moles = dose.doseMgL / (1000 * doseMolarMass(dose));
  const totals = Float64Array.from(before);
  const fed: Record<string, number> = {};
  const brought = dose.basicity === undefined ? info.fed : polyaluminumChloride(dose.basicity);
  for (const [key, count] of Object.entries(brought)) {
    fed[key] = count * moles;
    addSpecies(totals, key, count * moles);
  }
  const complete: CompleteReaction[] = [];
  if (info.precipitates && moles > 0 && options.solids !== 'equilibrium') {
    const { solid, molPerMol } = info.precipitates;
    complete.push(precipitationOf(solid, molPerMol * moles, temperatureC));
  }
  const chlorine = totals[COMPONENT_KEYS.indexOf('HOCl')] ?? 0;
  const sulfite = totals[COMPONENT_KEYS.indexOf('SO3')] ?? 0;
  const destroyed = Math.min(chlorine, sulfite);
  if (destroyed > 0) complete.push(dechlorinationOf(destroyed));
  const scale = Float64Array.from(totals, Math.abs);
  for (const reaction of complete) applyComplete(reaction, totals);
  totals.forEach((total, component) => {
    if (component > 0 && total < ROUNDING * (scale[component] ?? 0)) totals[component] = 0;
  });
  return { totals, fed, complete };
}

/**
 * Adds a dose and finds the new equilibrium in solution, closed to the atmosphere. A metal coagulant's metal leaves
 * completely as its hydroxide (`precipitatedMolKg`) unless the options say otherwise; no other solid forms.
 */
export function applyDose(water: Water, dose: Dose, options: DoseOptions = {}): Solved | Refusal {
  const fault = checkDose(dose);
  if (fault) return fault;
  const { totals, complete } = feedInto(totalsOf(water), water.temperatureC, dose, options);
  const outcome = solveClosed(water.temperatureC, totals, startOf(water));
  if (!outcome.ending.converged) {
    return refuse(
      'notConverged',
      `No equilibrium was found after this dose (${outcome.ending.why}).`,
    );
  }
  const solved = describe(outcome, totals, water.temperatureC, water.assumptions);
  const { precipitates } = REAGENTS[dose.reagent];
  if (options.solids === 'equilibrium' && precipitates) {
    return equilibrateWith(solved, [precipitates.solid]);
  }
  const solids = complete.filter((reaction) => reaction.solid !== undefined);
  if (solids.length === 0) return { ok: true, water: solved };
  const precipitatedMolKg: Record<string, number> = {};
  for (const { solid, extentMolKg } of solids) {
    if (solid !== undefined) precipitatedMolKg[solid] = extentMolKg;
  }
  return { ok: true, water: { ...solved, precipitatedMolKg } };
}

/** Adds doses one after another; every water on the way is returned. The first fault names its place in the list. */
export function applyDoses(
  water: Water,
  doses: readonly Dose[],
  options: DoseOptions = {},
): { readonly ok: true; readonly waters: Water[] } | Refusal {
  const waters: Water[] = [];
  let current = water;
  for (const [i, dose] of doses.entries()) {
    const fault = checkDose(dose, `${i}`);
    if (fault) return fault;
    const solved = applyDose(current, dose, options);
    if (!solved.ok) return solved;
    current = solved.water;
    waters.push(current);
  }
  return { ok: true, waters };
}
