import type { Water } from '@/lib/engine';
import { conductivityUsPerCm } from '../conductivity';
import { aerated, doseToReach, fed, settledCalcite, valuesOf, waterOf } from '../chemistry';
import type { Values } from '../raw-water';
import { aged, chlorineDoses, chlorineLeft, lively, roundTo } from '../treated-water';
import type { Doses, WorksProcess } from './definition';

const STRIPPED_SHARE = 0.62;
/** The reactor leaves a little of its calcite dissolved. */
const SETTLED_SHARE = 0.93;
const SOFTENED_CALCIUM_MG_L = 41;
const FINISHED_PH = 8;
/** The fluoride acid takes the pH down again by about this much. */
const PH_TAKEN_BY_FLUORIDE = 0.12;
const RESIDUAL_MG_L = 0.52;
const FLUORIDE_MG_L = 0.85;
// g/mol: H2SiF6 144.09, six F of 18.998.
const FLUORIDE_SHARE_OF_ACID = (6 * 18.998) / 144.09;
// Ca(OH)2 74.092, Ca 40.078, CO2 44.009.
const LIME_PER_CALCIUM = 74.092 / 40.078;
const LIME_PER_CARBON_DIOXIDE = 74.092 / 44.009;
/** Oxidising and settling 1 mg of iron(II) takes 2 equivalents a mole: 100.086 / 55.845 mg as CaCO3. */
const ALKALINITY_PER_IRON = 100.086 / 55.845;

const chlorineDemand = (raw: Values): number =>
  0.28 + 0.9 * (raw.ammonia ?? 0) + 0.08 * (raw.iron ?? 0);

const doseOf = (doses: Doses, key: string): number => doses[key] ?? 0;

/** After the cascade: CO2 blown out, iron oxidised at the cost of some alkalinity. */
function cascade(raw: Values): Water {
  const air = aerated(waterOf(raw), STRIPPED_SHARE);
  const acidMgLCaCO3 = (raw.iron ?? 0) * ALKALINITY_PER_IRON;
  // As hydrochloric acid of the same equivalents: 36.458 mg per 50.043 mg as CaCO3.
  return fed(air, [{ reagent: 'hydrochloric-acid', doseMgL: (acidMgLCaCO3 * 36.458) / 50.043 }]);
}

const softened = (water: Water, limeMgL: number): Water =>
  settledCalcite(fed(water, [{ reagent: 'calcium-hydroxide', doseMgL: limeMgL }]), SETTLED_SHARE);

/** Lime by the hand rule: for the free CO2, and for the calcium to be taken out. */
function limeFor(raw: Values, water: Water): number {
  const removed = Math.max(0, (raw.calcium ?? 0) - SOFTENED_CALCIUM_MG_L);
  return water.carbonDioxideMgLCO2 * LIME_PER_CARBON_DIOXIDE + removed * LIME_PER_CALCIUM;
}

function chooseDoses(raw: Values, inForce: Doses | null): Doses {
  const water = cascade(raw);
  const rule = limeFor(raw, water);
  // The hand rule, corrected once by what it leaves.
  const leftMgL = valuesOf(softened(water, rule)).calcium ?? SOFTENED_CALCIUM_MG_L;
  const lime = roundTo(rule + (leftMgL - SOFTENED_CALCIUM_MG_L) * LIME_PER_CALCIUM, 0.5);
  const gas = doseToReach(softened(water, lime), 'carbon-dioxide', {
    quantity: 'pH',
    value: FINISHED_PH + PH_TAKEN_BY_FLUORIDE,
  });
  const missing = FLUORIDE_MG_L - (raw.fluoride ?? 0);
  const chosen = {
    lime,
    'carbon-dioxide': roundTo(gas, 0.2),
    hypochlorite: roundTo(RESIDUAL_MG_L + chlorineDemand(raw), 0.05),
    fluoride: roundTo(missing / FLUORIDE_SHARE_OF_ACID, 0.02),
  };
  // Fluoride is moved only when it has to be.
  const fluoride = inForce?.fluoride;
  return fluoride !== undefined && Math.abs(fluoride - chosen.fluoride) < 0.05
    ? { ...chosen, fluoride }
    : chosen;
}

export const SALLOW_WELLS_PROCESS: WorksProcess = {
  sourceMemory: 0.98,
  source: {
    temperature: { base: 11, swing: 0.5, peakDay: 240, wander: 0.15, within: [9.8, 12.2] },
    pH: { base: 7.27, wander: 0.03, within: [7.15, 7.4] },
    alkalinity: { base: 280, swing: 2.5, peakDay: 120, wander: 2.5, within: [270, 290] },
    calcium: { base: 95, swing: 0.8, peakDay: 120, wander: 0.9, within: [91, 99] },
    magnesium: { base: 18, wander: 0.35, within: [16.8, 19.2] },
    potassium: { base: 3, wander: 0.12, within: [2.6, 3.5] },
    chloride: { base: 28, swing: 0.5, peakDay: 150, wander: 0.6, within: [25.5, 31] },
    sulfate: { base: 38, wander: 0.8, within: [35, 41.5] },
    nitrate: { base: 0.6, wander: 0.2, within: [0.2, 1.4] },
    ammonia: { base: 0.12, wander: 0.012, within: [0.08, 0.17] },
    fluoride: { base: 0.23, wander: 0.01, within: [0.19, 0.27] },
    silica: { base: 14.5, wander: 0.4, within: [13, 16] },
    iron: { base: 0.8, wander: 0.09, relative: true, within: [0.62, 1] },
    manganese: { base: 0.15, wander: 0.07, relative: true, within: [0.12, 0.185] },
    turbidity: { base: 0.45, wander: 0.3, relative: true, within: [0.18, 1.1] },
  },
  chooseDoses,
  treat(raw, doses, scatter) {
    const reactor = softened(cascade(raw), doseOf(doses, 'lime'));
    const recarbonated = fed(reactor, [
      { reagent: 'carbon-dioxide', doseMgL: doseOf(doses, 'carbon-dioxide') },
    ]);
    const left = lively(
      chlorineLeft(doseOf(doses, 'hypochlorite'), chlorineDemand(raw)),
      0.05,
      scatter,
    );
    const finished = fed(recarbonated, [
      ...chlorineDoses('sodium-hypochlorite', doseOf(doses, 'hypochlorite'), left),
      { reagent: 'hexafluorosilicic-acid', doseMgL: doseOf(doses, 'fluoride') },
    ]);
    const reactorValues = valuesOf(reactor);
    const iron = lively(0.012 + 0.008 * (raw.iron ?? 0), 0.35, scatter);
    const manganese = lively(0.0035, 0.4, scatter);
    const filteredTurbidity = lively(0.085, 0.2, scatter);
    const ions = valuesOf(finished);
    const finishedValues: Values = {
      ...ions,
      conductivity: conductivityUsPerCm(ions),
      freeChlorine: left,
      turbidity: lively(filteredTurbidity, 0.08, scatter),
      iron: lively(iron, 0.1, scatter),
      manganese: lively(manganese, 0.1, scatter),
    };
    return {
      raw,
      clarified: { ...reactorValues, turbidity: lively(2.2, 0.3, scatter) },
      filtered: { pH: recarbonated.pH, turbidity: filteredTurbidity, iron, manganese },
      finished: finishedValues,
      network: aged(
        finishedValues,
        { ageH: 36, chlorineLossPerH: 0.028, pHDrift: -0.04, ironGainMgL: 0.02 },
        scatter,
      ),
    };
  },
  needsAttention: ({ clarified, finished }) =>
    Math.abs((clarified?.calcium ?? 0) - SOFTENED_CALCIUM_MG_L) > 3 ||
    Math.abs((finished?.pH ?? 0) - FINISHED_PH) > 0.15 ||
    Math.abs((finished?.freeChlorine ?? 0) - RESIDUAL_MG_L) > 0.14 ||
    Math.abs((finished?.fluoride ?? 0) - FLUORIDE_MG_L) > 0.08,
};
