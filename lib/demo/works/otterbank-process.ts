import type { Water } from '@/lib/engine';
import { conductivityUsPerCm } from '../conductivity';
import { doseToReach, fed, valuesOf, waterOf } from '../chemistry';
import type { Values } from '../raw-water';
import { aged, chlorineDoses, chlorineLeft, lively, roundTo } from '../treated-water';
import type { Doses, WorksProcess } from './definition';

const FINISHED_PH = 7.7;
const RESIDUAL_MG_L = 1.1;
/** Chlorine to ammonia nitrogen by mass: just short of the ratio at which free chlorine appears again. */
const CHLORINE_PER_NITROGEN = 4.2;
// NH3 17.031, N 14.007.
const AMMONIA_PER_NITROGEN = 17.031 / 14.007;

const chlorineDemand = (raw: Values): number =>
  0.5 + 0.021 * (raw.colour ?? 0) + 0.03 * (raw.temperature ?? 0) + 4 * (raw.ammonia ?? 0);

/** Ferric that the river asks for, mg/L as FeCl3: colour counts beside turbidity. */
const ferricDemand = (raw: Values): number =>
  8 + 3.4 * Math.log(1 + (raw.turbidity ?? 0)) + 0.18 * (raw.colour ?? 0);

/** Free chlorine leaves nothing of the river's own ammonia. */
const chlorinatedRiver = (raw: Values): Water => waterOf({ ...raw, ammonia: 0 });

const doseOf = (doses: Doses, key: string): number => doses[key] ?? 0;

function chooseDoses(raw: Values, inForce: Doses | null): Doses {
  const ferric = roundTo(ferricDemand(raw), 0.5);
  const chlorine = roundTo(RESIDUAL_MG_L + chlorineDemand(raw), 0.05);
  const ammonia = roundTo((RESIDUAL_MG_L / CHLORINE_PER_NITROGEN) * AMMONIA_PER_NITROGEN, 0.01);
  const ready = fed(chlorinatedRiver(raw), [
    { reagent: 'ferric-chloride', doseMgL: ferric },
    ...chlorineDoses('chlorine', chlorine, RESIDUAL_MG_L),
    { reagent: 'ammonia', doseMgL: ammonia },
  ]);
  const caustic =
    ready.pH < FINISHED_PH
      ? doseToReach(ready, 'sodium-hydroxide', { quantity: 'pH', value: FINISHED_PH })
      : 0;
  const isTurbid = (raw.turbidity ?? 0) > 60;
  const polymer = isTurbid ? 0.2 : (raw.temperature ?? 10) < 6 ? 0.15 : 0.1;
  return {
    ferric,
    polymer,
    chlorine,
    ammonia: inForce === null ? ammonia : doseOf(inForce, 'ammonia'),
    caustic: roundTo(caustic, 0.2),
  };
}

export const OTTERBANK_PROCESS: WorksProcess = {
  sourceMemory: 0.72,
  source: {
    temperature: {
      base: 11.2,
      swing: 6.6,
      peakDay: 206,
      rain: -0.4,
      wander: 0.9,
      within: [3.2, 20],
    },
    pH: { base: 7.98, swing: 0.09, peakDay: 150, rain: -0.2, wander: 0.05, within: [7.55, 8.3] },
    alkalinity: { base: 154, swing: 11, peakDay: 245, rain: -20, wander: 3.5, within: [121, 179] },
    calcium: { base: 69, swing: 2.4, peakDay: 245, rain: -5, wander: 1, within: [60.5, 74.5] },
    magnesium: { base: 7, swing: 0.4, peakDay: 245, rain: -0.7, wander: 0.18, within: [5.4, 8.4] },
    potassium: { base: 4.6, swing: 0.4, peakDay: 260, rain: 0.3, wander: 0.2, within: [3.6, 6.2] },
    chloride: { base: 38, swing: 3, peakDay: 250, rain: -5, wander: 1.2, within: [28, 47] },
    sulfate: { base: 45, swing: 3, peakDay: 250, rain: -5, wander: 1.2, within: [35, 55] },
    nitrate: { base: 23, swing: 5, peakDay: 25, rain: 1.5, wander: 1, within: [12.5, 33] },
    ammonia: { base: 0.06, rain: 0.45, wander: 0.3, relative: true, within: [0.012, 0.28] },
    turbidity: { base: 5.2, rain: 3, wander: 0.28, relative: true, within: [3.1, 390] },
    colour: { base: 14, rain: 0.85, wander: 0.14, relative: true, within: [8, 58] },
    uvAbsorbance: { base: 0.11, rain: 0.7, wander: 0.1, relative: true, within: [0.07, 0.34] },
  },
  chooseDoses,
  treat(raw, doses, scatter) {
    const ferric = doseOf(doses, 'ferric');
    const settled = fed(chlorinatedRiver(raw), [{ reagent: 'ferric-chloride', doseMgL: ferric }]);
    const left = lively(
      chlorineLeft(doseOf(doses, 'chlorine'), chlorineDemand(raw)),
      0.05,
      scatter,
    );
    const contact = fed(settled, chlorineDoses('chlorine', doseOf(doses, 'chlorine'), left));
    const finished = fed(contact, [
      { reagent: 'ammonia', doseMgL: doseOf(doses, 'ammonia') },
      { reagent: 'sodium-hydroxide', doseMgL: doseOf(doses, 'caustic') },
    ]);
    // Below what the river asks for, floc stays small and passes.
    const shortfall = Math.max(0, 1 - ferric / ferricDemand(raw));
    const strain = 1 + 6 * shortfall;
    const settledTurbidity = lively(
      (0.6 + 0.28 * Math.log(1 + (raw.turbidity ?? 0))) * strain,
      0.17,
      scatter,
    );
    const settledIron = lively(0.12 + 0.16 * settledTurbidity, 0.15, scatter);
    const filteredTurbidity = lively(0.05 + 0.03 * settledTurbidity, 0.14, scatter);
    const filteredIron = lively(0.009 + 0.014 * settledIron, 0.3, scatter);
    const ions = valuesOf(finished);
    const finishedValues: Values = {
      ...ions,
      conductivity: conductivityUsPerCm(ions),
      freeChlorine: Math.max(0, lively(0.025, 0.4, scatter)),
      turbidity: lively(filteredTurbidity * 1.05, 0.08, scatter),
      iron: lively(filteredIron, 0.1, scatter),
    };
    return {
      raw,
      clarified: {
        pH: settled.pH,
        turbidity: settledTurbidity,
        iron: settledIron,
        colour: lively(2 + 0.12 * (raw.colour ?? 0), 0.15, scatter),
      },
      filtered: {
        turbidity: filteredTurbidity,
        iron: filteredIron,
        colour: lively(1.2 + 0.07 * (raw.colour ?? 0), 0.18, scatter),
        uvAbsorbance: lively(0.014 + 0.27 * (raw.uvAbsorbance ?? 0), 0.08, scatter),
      },
      contact: { pH: contact.pH, freeChlorine: left },
      finished: finishedValues,
      network: aged(
        finishedValues,
        { ageH: 20, chlorineLossPerH: 0.02, pHDrift: -0.05, ironGainMgL: 0.025 },
        scatter,
      ),
    };
  },
  needsAttention: ({ raw = {}, finished, contact, clarified }) =>
    Math.abs((finished?.pH ?? 0) - FINISHED_PH) > 0.14 ||
    Math.abs((contact?.freeChlorine ?? 0) - RESIDUAL_MG_L) > 0.24 ||
    (clarified?.turbidity ?? 0) > 1.25 * (0.6 + 0.28 * Math.log(1 + (raw.turbidity ?? 0))),
};
