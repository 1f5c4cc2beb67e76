import { COMPONENT_KEYS, type Component } from '../constants/components';
import { formatReaction, molarMassGMol, parseReaction } from '../constants/notation';
import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import { totalsOf } from '../speciation/state';
import type { Refusal, Water } from '../types';
import { addSpecies, precipitationOf, type CompleteReaction } from './complete-reactions';
import { settleStep } from './settle-step';

/** What may be oxidised. */
export type Oxidisable = 'iron' | 'manganese' | 'sulfide' | 'ammonia';

export interface Oxidation {
  /**
   * Chlorine: the free chlorine the water already holds (dose it first). Oxygen: from air, as much as is needed.
   * Permanganate: what is fed here; it takes no ammonia.
   */
  readonly oxidant: 'chlorine' | 'oxygen' | 'permanganate';
  /** Potassium permanganate fed with this step, mg/L; only with that oxidant. */
  readonly permanganateMgL?: number;
  /** In the order they are taken; iron, sulfide, manganese, ammonia when left out. Only chlorine takes ammonia. */
  readonly what?: readonly Oxidisable[];
  /** Share of each that gets oxidised if there is oxidant enough, 0…1; 1 when left out. */
  readonly extent?: number;
}

export type Oxidised =
  | {
      readonly ok: true;
      readonly water: Water;
      /** The reactions that ran, to their end, with their extents. */
      readonly reactions: readonly CompleteReaction[];
      /** Oxygen used, mol/kg. */
      readonly oxygenUsedMolKg: number;
      /** Sentences on what was left for want of chlorine. */
      readonly remarks: readonly string[];
    }
  | Refusal;

interface Route {
  readonly component: Component;
  readonly reaction: string;
  /** Moles of the oxidised component, of HOCl, of O2 and of MnO4- in one turn of the reaction. */
  readonly takes: number;
  readonly chlorine: number;
  readonly oxygen: number;
  readonly permanganate: number;
}

const route = (
  component: Component,
  reaction: string,
  takes: number,
  chlorine: number,
  oxygen: number,
  permanganate = 0,
): Route => ({ component, reaction, takes, chlorine, oxygen, permanganate });

/** Overall reactions of practice; iron leaves as ferrihydrite, manganese as its dioxide. */
const ROUTES = {
  chlorine: {
    iron: route('Fe2', '2Fe++ + HOCl + H+ = 2Fe+++ + Cl- + H2O', 2, 1, 0),
    sulfide: route('S', 'H2S + 4HOCl = SO4-- + 4Cl- + 6H+', 1, 4, 0),
    manganese: route('Mn', 'Mn++ + HOCl + H2O = MnO2 + Cl- + 3H+', 1, 1, 0),
  },
  oxygen: {
    iron: route('Fe2', '4Fe++ + O2 + 4H+ = 4Fe+++ + 2H2O', 4, 0, 1),
    sulfide: route('S', 'H2S + 2O2 = SO4-- + 2H+', 1, 0, 2),
    manganese: route('Mn', '2Mn++ + O2 + 2H2O = 2MnO2 + 4H+', 2, 0, 1),
  },
  permanganate: {
    iron: route('Fe2', '3Fe++ + MnO4- + 4H+ = 3Fe+++ + MnO2 + 2H2O', 3, 0, 0, 1),
    sulfide: route('S', '3H2S + 8MnO4- + 2H+ = 3SO4-- + 8MnO2 + 4H2O', 3, 0, 0, 8),
    manganese: route('Mn', '3Mn++ + 2MnO4- + 2H2O = 5MnO2 + 4H+', 3, 0, 0, 2),
  },
} as const;

const MONOCHLORAMINE = 'NH4+ + HOCl = NH2Cl + H2O + H+';
const BREAKPOINT = '2NH2Cl + HOCl = N2 + 3Cl- + 3H+ + H2O';
const OXIDANT_WORDS = {
  chlorine: 'Chlorine',
  oxygen: 'Oxygen',
  permanganate: 'Permanganate',
} as const;
const PERMANGANATE_G_MOL = molarMassGMol('KMnO4');
const MOST_PERMANGANATE_MG_L = 1000;

/** None of these rests at an equilibrium within the model: no constant is given for them. */
const SOURCE = 'overall stoichiometry, common practice';

/**
 * Oxidises to the end, as far as the oxidant goes. Ammonia takes chlorine first to monochloramine (1:1), then to
 * nitrogen (3 HOCl for 2 N in all, 7.6 mg Cl2 per mg N: the break-point); chlorine beyond that stays free.
 */
export function oxidise(water: Water, how: Oxidation): Oxidised {
  if (!Object.hasOwn(ROUTES, how.oxidant)) {
    return refuse('badInput', `No oxidant is called ${String(how.oxidant)}.`, 'oxidant');
  }
  const extent = how.extent ?? 1;
  const permanganateMgL = how.permanganateMgL ?? 0;
  const fault =
    checkNumber(extent, 'extent', [0, 1]) ??
    checkNumber(permanganateMgL, 'permanganateMgL', [0, MOST_PERMANGANATE_MG_L]);
  if (fault) return fault;
  const totals = totalsOf(water);
  let permanganateLeft =
    how.oxidant === 'permanganate' ? permanganateMgL / (1000 * PERMANGANATE_G_MOL) : 0;
  // Only what reacts enters the account: its potassium stays in the water, its manganese leaves as the dioxide.
  const permanganateFed = permanganateLeft;
  const reactions: CompleteReaction[] = [];
  const remarks: string[] = [];
  let oxygenUsedMolKg = 0;
  for (const what of how.what ?? (['iron', 'sulfide', 'manganese', 'ammonia'] as const)) {
    if (what === 'ammonia') {
      if (how.oxidant === 'chlorine') chlorinateAmmonia(totals, extent, reactions);
      continue;
    }
    const path = ROUTES[how.oxidant][what];
    if (path === undefined) return refuse('badInput', `${String(what)} is not oxidised.`, 'what');
    const wanted = (extent * totalOf(totals, path.component)) / path.takes;
    const possible = Math.min(
      path.chlorine > 0 ? totalOf(totals, 'HOCl') / path.chlorine : Infinity,
      path.permanganate > 0 ? permanganateLeft / path.permanganate : Infinity,
    );
    const turns = Math.min(wanted, possible);
    if (turns < wanted)
      remarks.push(`${OXIDANT_WORDS[how.oxidant]} ran out before all ${what} was oxidised.`);
    if (!(turns > 0)) continue;
    run(path.reaction, turns, totals, reactions);
    oxygenUsedMolKg += turns * path.oxygen;
    permanganateLeft -= turns * path.permanganate;
    if (what === 'iron') {
      const hydroxide = precipitationOf('ferrihydrite', turns * path.takes, water.temperatureC);
      takeOut(hydroxide, totals);
      reactions.push(hydroxide);
    }
  }
  addSpecies(totals, 'K+', permanganateFed - permanganateLeft);
  if (permanganateLeft > 1e-12) {
    const leftMgL = permanganateLeft * 1000 * PERMANGANATE_G_MOL;
    remarks.push(
      `${leftMgL.toPrecision(2)} mg/L of permanganate found nothing to oxidise: the water would turn pink.`,
    );
  }
  const solids = solidsOf(reactions);
  clearRounding(totals);
  const solved = settleStep(water, totals, water.temperatureC, solids);
  return solved.ok
    ? { ok: true, water: solved.water, reactions, oxygenUsedMolKg, remarks }
    : solved;
}

function chlorinateAmmonia(
  totals: Float64Array,
  extent: number,
  reactions: CompleteReaction[],
): void {
  const combined = Math.min(extent * totalOf(totals, 'NH4'), totalOf(totals, 'HOCl'));
  if (combined > 0) run(MONOCHLORAMINE, combined, totals, reactions);
  const burnt = Math.min(totalOf(totals, 'NH2Cl') / 2, totalOf(totals, 'HOCl'));
  if (burnt > 0) run(BREAKPOINT, burnt, totals, reactions);
}

function run(
  reaction: string,
  extentMolKg: number,
  totals: Float64Array,
  reactions: CompleteReaction[],
): void {
  const named = [...parseReaction(reaction)].filter(([key]) => key !== 'H2O');
  const coefficients = Object.fromEntries(named);
  const complete: CompleteReaction = {
    key: reaction,
    equation: formatReaction(reaction),
    coefficients,
    extentMolKg,
    logK: 0,
    source: SOURCE,
    ...('MnO2' in coefficients ? { solid: 'manganese-dioxide' } : {}),
  };
  takeOut(complete, totals);
  reactions.push(complete);
}

function takeOut({ coefficients, extentMolKg }: CompleteReaction, totals: Float64Array): void {
  for (const [key, n] of Object.entries(coefficients)) addSpecies(totals, key, n * extentMolKg);
}

function solidsOf(reactions: readonly CompleteReaction[]): Record<string, number> {
  const solids: Record<string, number> = {};
  for (const { solid, extentMolKg, coefficients } of reactions) {
    if (solid === undefined) continue;
    const count = coefficients['MnO2'] ?? 1;
    solids[solid] = (solids[solid] ?? 0) + count * extentMolKg;
  }
  return solids;
}

const totalOf = (totals: Float64Array, component: Component): number =>
  totals[COMPONENT_KEYS.indexOf(component)] ?? 0;

/** What a reaction used up to the end is zero, not a rounding rest. */
function clearRounding(totals: Float64Array): void {
  const largest = Math.max(...totals);
  totals.forEach((total, component) => {
    if (component > 0 && total < 1e-16 * largest) totals[component] = 0;
  });
}
