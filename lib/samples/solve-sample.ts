import {
  indicesOf,
  solveWater,
  type Analyte,
  type Water,
  type WaterAnalysis,
  type WaterIndices,
} from '@/lib/engine';
import type { IndexKey } from './indices';
import { QUANTITIES, QUANTITY_KEYS, type QuantityKey } from './quantities';

/** One result as the engine sees it: canonical value and qualifier. */
export interface MeasuredValue {
  readonly value: number;
  readonly qualifier: Qualifier;
}

export const QUALIFIERS = ['', '<', '>', 'nd', 'e'] as const;
export type Qualifier = (typeof QUALIFIERS)[number];

export type MeasuredValues = Readonly<Partial<Record<QuantityKey, MeasuredValue>>>;

export type SampleSolution =
  | {
      readonly ok: true;
      readonly analysis: WaterAnalysis;
      readonly water: Water;
      readonly indices: Readonly<Partial<Record<IndexKey, number>>>;
      readonly assumptions: readonly string[];
    }
  | { readonly ok: false; readonly analysis: WaterAnalysis | null; readonly refusal: string };

/**
 * What the engine is asked about a sample. A result below its limit counts as half of it and is named among the
 * assumptions; "not detected" counts as absent. Returns null while temperature, pH or alkalinity is missing.
 */
export function analysisOf(
  values: MeasuredValues,
): { analysis: WaterAnalysis; assumptions: string[] } | null {
  const { temperature, pH, alkalinity } = values;
  if (temperature === undefined || pH === undefined || alkalinity === undefined) return null;
  const assumptions: string[] = [];
  const analytesMgL: Partial<Record<Analyte, number>> = {};
  for (const key of QUANTITY_KEYS) {
    const measured = values[key];
    const analyte = QUANTITIES[key].engine;
    if (measured === undefined || analyte === undefined) continue;
    if (analyte === 'temperature' || analyte === 'pH' || analyte === 'alkalinity') continue;
    analytesMgL[analyte] = countedValue(key, measured, assumptions);
  }
  return {
    analysis: {
      temperatureC: temperature.value,
      pH: pH.value,
      alkalinityMgLCaCO3: countedValue('alkalinity', alkalinity, assumptions),
      analytesMgL,
    },
    assumptions,
  };
}

function countedValue(key: QuantityKey, measured: MeasuredValue, assumptions: string[]): number {
  const { label } = QUANTITIES[key];
  switch (measured.qualifier) {
    case '<':
      assumptions.push(`${label} was below its reporting limit and counts as half of it.`);
      return measured.value / 2;
    case 'nd':
      assumptions.push(`${label} was not detected and counts as absent.`);
      return 0;
    case '>':
      assumptions.push(`${label} was above the range of the test and counts as the limit of it.`);
      return measured.value;
    case 'e':
      assumptions.push(`${label} is an estimate.`);
      return measured.value;
    case '':
      return measured.value;
  }
}

/** Solves one sample. Pure, so the form's preview and the server's decision are the same computation. */
export function solveSample(values: MeasuredValues): SampleSolution {
  const asked = analysisOf(values);
  if (asked === null) {
    return {
      ok: false,
      analysis: null,
      refusal: 'Temperature, pH and alkalinity are needed before the water can be solved.',
    };
  }
  const solved = solveWater(asked.analysis);
  if (!solved.ok) return { ok: false, analysis: asked.analysis, refusal: solved.message };
  return {
    ok: true,
    analysis: asked.analysis,
    water: solved.water,
    indices: sampleIndices(solved.water, indicesOf(solved.water)),
    assumptions: [...asked.assumptions, ...solved.water.assumptions],
  };
}

/** The indices kept with a sample; one without meaning for the water is left out, never zero. */
export function sampleIndices(
  water: Water,
  indices: WaterIndices,
): Partial<Record<IndexKey, number>> {
  const all: Record<IndexKey, number | null> = {
    calciteIndex: indices.calciteIndex,
    langelier: indices.langelier,
    precipitationPotential: indices.precipitationPotentialMgLCaCO3,
    saturationPH: indices.saturationPH,
    ryznar: indices.ryznar,
    larson: indices.larson,
    chlorideSulfateMassRatio: indices.chlorideSulfateMassRatio,
    bufferIntensity: indices.bufferIntensityMeqLPerPH,
    inorganicCarbon: water.inorganicCarbonMgLC,
    carbonDioxide: water.carbonDioxideMgLCO2,
    totalHardness: indices.totalHardnessMgLCaCO3,
    ionicStrength: water.ionicStrengthMolKg,
    chargeBalance: water.chargeBalancePercent,
  };
  return Object.fromEntries(
    Object.entries(all).filter((entry): entry is [IndexKey, number] => entry[1] !== null),
  );
}
