import type { ReagentKey } from '@/lib/engine';

/** Stands beside every dose. */
export const GENERAL_CAUTION =
  'A suggestion, not an order. Confirm it by jar test or titration and at the tap, stay within the permit, the approved range and the product’s certified maximum use level, follow local codes, and leave the decision to the licensed operator in charge.';

type Hazard = 'acid' | 'alkali' | 'quicklime' | 'gas' | 'chlorine' | 'fluoride' | 'ammonia';

// Usual handling cautions of the trade; the supplier's safety data sheet rules.
const HAZARD_SENTENCES: Record<Hazard, string> = {
  acid: 'Acid: add acid to water, never water to acid; keep it from hypochlorite, with which it gives off chlorine gas.',
  alkali:
    'Strong alkali: burns skin and eyes; never feed it into the same line as a metal coagulant.',
  quicklime: 'Quicklime heats violently with little water: slake by the plant’s procedure only.',
  gas: 'Carbon dioxide displaces air: ventilate and watch the oxygen alarm in low places.',
  chlorine:
    'Chlorine product: never together with acid, coagulant or ammonia in one line, tank or fill point.',
  fluoride:
    'Fluoride: an overfeed makes people ill; interlock with flow and check the day’s use against the stock.',
  ammonia: 'Ammonia: store and feed apart from chlorine products.',
};

const HAZARDS: Partial<Record<ReagentKey, readonly Hazard[]>> = {
  'calcium-hydroxide': ['alkali'],
  'calcium-oxide': ['alkali', 'quicklime'],
  'sodium-hydroxide': ['alkali'],
  'potassium-hydroxide': ['alkali'],
  'sodium-carbonate': ['alkali'],
  'sodium-silicate': ['alkali'],
  'sodium-aluminate': ['alkali'],
  'carbon-dioxide': ['gas'],
  'sulfuric-acid': ['acid'],
  'hydrochloric-acid': ['acid'],
  'phosphoric-acid': ['acid'],
  'aluminum-sulfate': ['acid'],
  'ferric-chloride': ['acid'],
  'ferric-sulfate': ['acid'],
  'ferrous-sulfate': ['acid'],
  'hexafluorosilicic-acid': ['acid', 'fluoride'],
  'sodium-fluoride': ['fluoride'],
  chlorine: ['chlorine'],
  'sodium-hypochlorite': ['chlorine'],
  'calcium-hypochlorite': ['chlorine'],
  ammonia: ['ammonia'],
  'sodium-bisulfite': ['acid'],
  'polyaluminum-chloride': ['acid'],
  'sodium-hexafluorosilicate': ['fluoride'],
  'ammonium-sulfate': ['ammonia'],
};

/** The cautions of one reagent, by its hazards; the safety data sheet is always named. */
export function cautionsFor(reagent: ReagentKey): readonly string[] {
  return [
    ...(HAZARDS[reagent] ?? []).map((hazard) => HAZARD_SENTENCES[hazard]),
    'Handle by the product’s safety data sheet, with the protection it names.',
  ];
}
