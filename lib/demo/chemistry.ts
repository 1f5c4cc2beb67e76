import {
  ANALYTES,
  applyDoses,
  doseForTarget,
  indicesOf,
  solveWater,
  type Analyte,
  type Dose,
  type DoseTarget,
  type ReagentKey,
  type Refusal,
  type Water,
} from '@/lib/engine';
import type { Values } from './raw-water';

/** The ions that decide pH and balance; the metals that treatment takes out follow rules of their own. */
const DISSOLVED = [
  'calcium',
  'magnesium',
  'sodium',
  'potassium',
  'chloride',
  'sulfate',
  'nitrate',
  'fluoride',
  'silica',
  'phosphate',
  'ammonia',
] as const satisfies readonly Analyte[];

/** The invented waters are all possible ones: a refusal is a fault in the demo, not an answer. */
function mustSolve<T extends { readonly ok: boolean }>(
  answer: T | Refusal,
  what: string,
): Extract<T, { ok: true }> {
  if (isRefusal(answer)) throw new Error(`The demo asked for ${what}: ${answer.message}`);
  return answer as Extract<T, { ok: true }>;
}

const isRefusal = (answer: { readonly ok: boolean }): answer is Refusal => !answer.ok;

/** The water at equilibrium that has these values; pH, alkalinity and temperature among them. */
export function waterOf(values: Values): Water {
  const { temperature = NaN, pH = NaN, alkalinity = NaN } = values;
  const analysis = {
    temperatureC: temperature,
    pH,
    alkalinityMgLCaCO3: alkalinity,
    analytesMgL: analytesOf(values),
  };
  return mustSolve(solveWater(analysis), 'a raw water').water;
}

const analytesOf = (values: Values): Partial<Record<Analyte, number>> =>
  Object.fromEntries(DISSOLVED.map((key) => [key, values[key] ?? 0]));

/** Canonical values of a water's dissolved part. */
export function valuesOf(water: Water): Values {
  const ions = DISSOLVED.map((key) => {
    const { component, molarMassGMol } = ANALYTES[key];
    return [key, (water.totalsMolKg[component] ?? 0) * molarMassGMol * 1000] as const;
  });
  return {
    ...Object.fromEntries(ions),
    temperature: water.temperatureC,
    pH: water.pH,
    alkalinity: water.alkalinityMgLCaCO3,
  };
}

/** The water after all doses. */
export function fed(water: Water, doses: readonly Dose[]): Water {
  return mustSolve(applyDoses(water, doses), 'a fed water').waters.at(-1) ?? water;
}

/** Smallest dose, mg/L, that brings the water to the target. */
export function doseToReach(water: Water, reagent: ReagentKey, target: DoseTarget): number {
  const [first] = mustSolve(doseForTarget(water, reagent, target), `a dose of ${reagent}`).doses;
  if (first === undefined) throw new Error(`The demo found no dose of ${reagent}.`);
  return first.doseMgL;
}

// g/mol, IUPAC atomic weights.
const CARBON = 12.011;
const CARBON_DIOXIDE = 44.009;
const CALCIUM_CARBONATE = 100.086;
const CALCIUM = 40.078;
/** Equilibrium with open air holds about this much CO2, mg/L (0.5–1 over the range of temperature). */
const IN_EQUILIBRIUM_WITH_AIR_MG_L = 0.7;

/** Blows out `share` of the CO2 above what air holds; alkalinity stays. */
export function aerated(water: Water, share: number): Water {
  const stripped = Math.max(0, water.carbonDioxideMgLCO2 - IN_EQUILIBRIUM_WITH_AIR_MG_L) * share;
  return closed(valuesOf(water), {
    alkalinity: water.alkalinityMgLCaCO3,
    inorganicCarbon: water.inorganicCarbonMgLC - (stripped * CARBON) / CARBON_DIOXIDE,
  });
}

/** Lets `share` of the calcite the water can deposit come out of it. */
export function settledCalcite(water: Water, share: number): Water {
  const potential = indicesOf(water).precipitationPotentialMgLCaCO3 ?? 0;
  const depositedMgL = Math.max(0, potential) * share;
  const values = valuesOf(water);
  return closed(
    {
      ...values,
      calcium: (values.calcium ?? 0) - (depositedMgL * CALCIUM) / CALCIUM_CARBONATE,
    },
    {
      alkalinity: water.alkalinityMgLCaCO3 - depositedMgL,
      inorganicCarbon: water.inorganicCarbonMgLC - (depositedMgL * CARBON) / CALCIUM_CARBONATE,
    },
  );
}

function closed(values: Values, carbon: { alkalinity: number; inorganicCarbon: number }): Water {
  const analysis = {
    temperatureC: values.temperature ?? NaN,
    alkalinityMgLCaCO3: carbon.alkalinity,
    inorganicCarbonMgLC: carbon.inorganicCarbon,
    analytesMgL: analytesOf(values),
  };
  return mustSolve(solveWater(analysis), 'a water of known carbon').water;
}
