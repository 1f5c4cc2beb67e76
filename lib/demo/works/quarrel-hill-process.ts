import type { Dose } from '@/lib/engine';
import { conductivityUsPerCm } from '../conductivity';
import { doseToReach, fed, valuesOf, waterOf } from '../chemistry';
import type { Values } from '../raw-water';
import { aged, chlorineDoses, chlorineLeft, lively, roundTo } from '../treated-water';
import type { Doses, WorksProcess } from './definition';

const COAGULATION_PH = 6.2;
const FINISHED_PH = 8.2;
/** Left for the caustic to trim, so that the last step can go both ways. */
const PH_BEFORE_TRIM = 7.15;
const ALKALINITY_BEFORE_TRIM_MG_L = 30;
const RESIDUAL_MG_L = 0.62;
const PHOSPHATE_MG_L_H3PO4 = 2.85;

/** Chlorine used up before the end of the contact tank, mg/L: organics left after filtration, and warmth. */
const chlorineDemand = (raw: Values): number =>
  0.45 + 0.006 * (raw.colour ?? 0) + 0.018 * (raw.temperature ?? 0);

const doseOf = (doses: Doses, key: string): number => doses[key] ?? 0;

const coagulation = (doses: Doses): Dose[] => [
  { reagent: 'aluminum-sulfate', doseMgL: doseOf(doses, 'alum') },
  { reagent: 'calcium-hydroxide', doseMgL: doseOf(doses, 'pre-lime') },
];

const disinfection = (doses: Doses, chlorineLeftMgL: number): Dose[] => [
  ...chlorineDoses('sodium-hypochlorite', doseOf(doses, 'hypochlorite'), chlorineLeftMgL),
  { reagent: 'phosphoric-acid', doseMgL: doseOf(doses, 'phosphate') },
];

/** The weekly setting: coagulant by colour, then every alkali and acid to its pH or alkalinity. */
function chooseDoses(raw: Values, inForce: Doses | null): Doses {
  const intake = waterOf(raw);
  const alum = roundTo(15 + 0.27 * (raw.colour ?? 0) + 0.5 * (raw.turbidity ?? 0), 0.5);
  const acidified = fed(intake, [{ reagent: 'aluminum-sulfate', doseMgL: alum }]);
  const preLime = doseToReach(acidified, 'calcium-hydroxide', {
    quantity: 'pH',
    value: COAGULATION_PH,
  });
  const hypochlorite = roundTo(RESIDUAL_MG_L + chlorineDemand(raw), 0.05);
  const first = {
    alum,
    'pre-lime': roundTo(preLime, 0.1),
    hypochlorite,
    phosphate: PHOSPHATE_MG_L_H3PO4,
  };
  const clarified = fed(intake, coagulation(first));
  const disinfected = fed(clarified, disinfection(first, RESIDUAL_MG_L));
  const lime = roundTo(
    doseToReach(disinfected, 'calcium-hydroxide', {
      quantity: 'alkalinity',
      value: ALKALINITY_BEFORE_TRIM_MG_L,
    }),
    0.2,
  );
  const limed = fed(disinfected, [{ reagent: 'calcium-hydroxide', doseMgL: lime }]);
  const carbonDioxide =
    limed.pH > PH_BEFORE_TRIM
      ? roundTo(
          doseToReach(limed, 'carbon-dioxide', { quantity: 'pH', value: PH_BEFORE_TRIM }),
          0.2,
        )
      : 0;
  const ready = fed(limed, [{ reagent: 'carbon-dioxide', doseMgL: carbonDioxide }]);
  const caustic = doseToReach(ready, 'sodium-hydroxide', { quantity: 'pH', value: FINISHED_PH });
  const chosen = {
    ...first,
    lime,
    'carbon-dioxide': carbonDioxide,
    caustic: roundTo(caustic, 0.1),
  };
  // The phosphate pump is left alone from week to week.
  return inForce === null ? chosen : { ...chosen, phosphate: doseOf(inForce, 'phosphate') };
}

export const QUARREL_HILL_PROCESS: WorksProcess = {
  sourceMemory: 0.88,
  source: {
    temperature: { base: 9.8, swing: 5.9, peakDay: 217, wander: 0.7, within: [3, 18] },
    pH: { base: 6.68, swing: 0.1, peakDay: 205, rain: -0.14, wander: 0.05, within: [6.32, 6.98] },
    alkalinity: {
      base: 13.2,
      swing: 2.6,
      peakDay: 225,
      rain: -3,
      wander: 0.8,
      within: [8.4, 19.6],
    },
    calcium: { base: 3.5, swing: 0.55, peakDay: 225, rain: -0.4, wander: 0.18, within: [2.1, 4.9] },
    magnesium: { base: 1.25, swing: 0.12, peakDay: 225, wander: 0.06, within: [0.8, 1.9] },
    potassium: { base: 0.5, swing: 0.06, peakDay: 330, wander: 0.04, within: [0.3, 0.8] },
    chloride: { base: 10, swing: 1.3, peakDay: 35, wander: 0.5, within: [7, 15] },
    sulfate: { base: 4.9, swing: 0.5, peakDay: 60, wander: 0.25, within: [3.3, 7.5] },
    nitrate: { base: 0.9, swing: 0.35, peakDay: 40, wander: 0.1, within: [0.3, 1.8] },
    turbidity: { base: 1.4, rain: 1.5, wander: 0.2, relative: true, within: [0.6, 9] },
    colour: {
      base: 40,
      swing: 0.4,
      peakDay: 300,
      rain: 0.6,
      wander: 0.1,
      relative: true,
      within: [20, 90],
    },
    uvAbsorbance: {
      base: 0.19,
      swing: 0.38,
      peakDay: 300,
      rain: 0.52,
      wander: 0.08,
      relative: true,
      within: [0.09, 0.45],
    },
    iron: {
      base: 0.22,
      swing: 0.35,
      peakDay: 290,
      rain: 0.3,
      wander: 0.15,
      relative: true,
      within: [0.06, 0.65],
    },
    manganese: {
      base: 0.02,
      swing: 0.8,
      peakDay: 265,
      wander: 0.25,
      relative: true,
      within: [0.004, 0.14],
    },
  },
  chooseDoses,
  treat(raw, doses, scatter) {
    const clarified = fed(waterOf(raw), coagulation(doses));
    const left = lively(
      chlorineLeft(doseOf(doses, 'hypochlorite'), chlorineDemand(raw)),
      0.06,
      scatter,
    );
    const finished = fed(clarified, [
      ...disinfection(doses, left),
      { reagent: 'calcium-hydroxide', doseMgL: doseOf(doses, 'lime') },
      { reagent: 'carbon-dioxide', doseMgL: doseOf(doses, 'carbon-dioxide') },
      { reagent: 'sodium-hydroxide', doseMgL: doseOf(doses, 'caustic') },
    ]);
    // Alum works best near its own pH; off it, colour, turbidity and aluminium come through.
    const strain = Math.min(3, 1 + 4 * (clarified.pH - COAGULATION_PH) ** 2);
    const clearedTurbidity = lively(
      (0.3 + 0.11 * (raw.turbidity ?? 0)) * strain ** 0.5,
      0.16,
      scatter,
    );
    const aluminumLeft = lively(0.14 * strain, 0.18, scatter);
    const filteredTurbidity = lively(0.055 + 0.05 * clearedTurbidity, 0.12, scatter);
    const filteredAluminum = lively(0.022 + 0.1 * aluminumLeft, 0.18, scatter);
    const ions = valuesOf(finished);
    const finishedValues: Values = {
      ...ions,
      conductivity: conductivityUsPerCm(ions),
      freeChlorine: left,
      turbidity: lively(filteredTurbidity * 1.15, 0.08, scatter),
      aluminum: lively(filteredAluminum, 0.1, scatter),
      iron: lively(0.009 + 0.012 * (raw.iron ?? 0), 0.3, scatter),
    };
    return {
      raw,
      clarified: {
        pH: clarified.pH,
        turbidity: clearedTurbidity,
        aluminum: aluminumLeft,
        colour: lively(1.5 + 0.06 * (raw.colour ?? 0) * strain, 0.14, scatter),
      },
      filtered: {
        turbidity: filteredTurbidity,
        aluminum: filteredAluminum,
        colour: lively(1 + 0.035 * (raw.colour ?? 0), 0.18, scatter),
        uvAbsorbance: lively(0.012 + 0.09 * (raw.uvAbsorbance ?? 0), 0.1, scatter),
      },
      finished: finishedValues,
      network: aged(
        finishedValues,
        { ageH: 30, chlorineLossPerH: 0.045, pHDrift: 0.06, ironGainMgL: 0.03 },
        scatter,
      ),
    };
  },
  needsAttention: ({ clarified, finished }) =>
    Math.abs((clarified?.pH ?? 0) - COAGULATION_PH) > 0.22 ||
    Math.abs((finished?.pH ?? 0) - FINISHED_PH) > 0.24 ||
    Math.abs((finished?.freeChlorine ?? 0) - RESIDUAL_MG_L) > 0.16,
};
