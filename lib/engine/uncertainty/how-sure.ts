import { refuse } from '../refusal';
import { checkNumber } from '../speciation/analysis';
import { solveWater } from '../speciation/solve-water';
import type { Analyte, Refusal, Water, WaterAnalysis } from '../types';
import { drawsFrom } from './random';

/** Standard uncertainty of a measurement: a share of the value, an amount, or both (added in squares). */
export interface Uncertainty {
  readonly relative?: number;
  readonly absolute?: number;
}

/** What is measured and may be uncertain. */
export type Measured =
  | Analyte
  | 'temperatureC'
  | 'pH'
  | 'alkalinityMgLCaCO3'
  | 'inorganicCarbonMgLC'
  | 'carbonDioxideAtm';

/** Usual standard uncertainties of a works laboratory (common practice; editable by the caller). */
export const DEFAULT_UNCERTAINTIES: Readonly<Partial<Record<Measured, Uncertainty>>> = {
  temperatureC: { absolute: 0.3 },
  pH: { absolute: 0.05 },
  alkalinityMgLCaCO3: { relative: 0.03, absolute: 1 },
  inorganicCarbonMgLC: { relative: 0.05 },
  carbonDioxideAtm: { relative: 0.1 },
};
/** Any analyte not named otherwise. */
export const DEFAULT_ANALYTE_UNCERTAINTY: Uncertainty = { relative: 0.05 };

export interface Band {
  readonly median: number;
  /** Ends of the 90 % band. */
  readonly low: number;
  readonly high: number;
}

export interface Influence {
  readonly input: Measured;
  /** Share of the result's spread that goes with this input (squared rank correlation), 0…1. */
  readonly share: number;
}

export type HowSure =
  | {
      readonly ok: true;
      /** By the names `measure` returned. */
      readonly results: Readonly<
        Record<string, { readonly band: Band; readonly influences: readonly Influence[] }>
      >;
      readonly draws: number;
      /** Draws that could not be solved or measured; they are left out of every band. */
      readonly failed: number;
    }
  | Refusal;

export interface Sampling {
  readonly seed: number;
  /** 1000 when left out. */
  readonly draws?: number;
  readonly uncertainties?: Readonly<Partial<Record<Measured, Uncertainty>>>;
  /** Called now and then with the share done; false stops the sampling. */
  readonly onProgress?: (share: number) => boolean;
}

const MOST_DRAWS = 100_000;
const PROGRESS_EVERY = 25;

/**
 * Carries measurement errors through to anything computed from the water (`measure`: indices, doses; null to leave a
 * draw out). Errors are normal and independent, amounts are kept from going negative; the draws depend on the seed
 * alone.
 */
export function howSure(
  analysis: WaterAnalysis,
  measure: (water: Water, analysis: WaterAnalysis) => Readonly<Record<string, number>> | null,
  sampling: Sampling,
): HowSure {
  const draws = sampling.draws ?? 1000;
  const fault =
    checkNumber(sampling.seed, 'seed', [0, 2 ** 32 - 1]) ??
    checkNumber(draws, 'draws', [2, MOST_DRAWS]);
  if (fault) return fault;
  const base = solveWater(analysis);
  if (!base.ok) return base;
  const inputs = inputsOf(analysis, sampling);
  const { normal } = drawsFrom(sampling.seed);
  const drawn: number[][] = [];
  const outcomes: Readonly<Record<string, number>>[] = [];
  let failed = 0;
  for (let i = 0; i < draws; i++) {
    const values = inputs.map(({ value, sigma, least }) =>
      Math.max(least, value + sigma * normal()),
    );
    const varied = vary(analysis, inputs, values);
    const solved = solveWater(varied);
    const outcome = solved.ok ? measure(solved.water, varied) : null;
    if (outcome && Object.values(outcome).every((value) => Number.isFinite(value))) {
      drawn.push(values);
      outcomes.push(outcome);
    } else failed++;
    if (i % PROGRESS_EVERY === 0 && sampling.onProgress?.((i + 1) / draws) === false) {
      return refuse('notConverged', 'The sampling was stopped.');
    }
  }
  if (outcomes.length < 2) return refuse('notConverged', 'Hardly any draw could be computed.');
  const names = Object.keys(outcomes[0] ?? {});
  const results = Object.fromEntries(
    names.map((name) => {
      const column = outcomes.map((outcome) => outcome[name] ?? NaN);
      return [name, { band: bandOf(column), influences: influencesOn(column, inputs, drawn) }];
    }),
  );
  return { ok: true, results, draws, failed };
}

interface Input {
  readonly key: Measured;
  readonly inAnalytes: boolean;
  readonly value: number;
  readonly sigma: number;
  readonly least: number;
}

function inputsOf(analysis: WaterAnalysis, { uncertainties = {} }: Sampling): readonly Input[] {
  const { analytesMgL, ...rest } = analysis;
  const input = (key: Measured, value: number, inAnalytes: boolean): Input => {
    const { relative = 0, absolute = 0 } =
      uncertainties[key] ??
      DEFAULT_UNCERTAINTIES[key] ??
      (inAnalytes ? DEFAULT_ANALYTE_UNCERTAINTY : {});
    const least = key === 'alkalinityMgLCaCO3' ? -Infinity : 0;
    return { key, inAnalytes, value, sigma: Math.hypot(relative * value, absolute), least };
  };
  const outside = Object.entries(rest) as [Measured, number | undefined][];
  const inside = Object.entries(analytesMgL) as [Analyte, number | undefined][];
  return [
    ...outside.flatMap(([key, value]) => (value === undefined ? [] : [input(key, value, false)])),
    ...inside.flatMap(([key, value]) => (value ? [input(key, value, true)] : [])),
  ].filter(({ sigma }) => sigma > 0);
}

function vary(
  analysis: WaterAnalysis,
  inputs: readonly Input[],
  values: readonly number[],
): WaterAnalysis {
  const outside: Record<string, number> = {};
  const inside: Record<string, number> = {};
  inputs.forEach(({ key, inAnalytes }, i) => {
    (inAnalytes ? inside : outside)[key] = values[i] ?? NaN;
  });
  return { ...analysis, ...outside, analytesMgL: { ...analysis.analytesMgL, ...inside } };
}

function bandOf(column: readonly number[]): Band {
  const sorted = [...column].sort((a, b) => a - b);
  const at = (share: number): number => {
    const place = share * (sorted.length - 1);
    const below = Math.floor(place);
    const low = sorted[below] ?? NaN;
    const high = sorted[Math.min(below + 1, sorted.length - 1)] ?? NaN;
    return low + (place - below) * (high - low);
  };
  return { median: at(0.5), low: at(0.05), high: at(0.95) };
}

function influencesOn(
  column: readonly number[],
  inputs: readonly Input[],
  drawn: readonly (readonly number[])[],
): readonly Influence[] {
  const result = ranks(column);
  return inputs
    .map(({ key }, i) => {
      const r = correlation(ranks(drawn.map((values) => values[i] ?? NaN)), result);
      return { input: key, share: r * r };
    })
    .sort((a, b) => b.share - a.share);
}

function ranks(column: readonly number[]): Float64Array {
  const order = column.map((_, i) => i).sort((a, b) => (column[a] ?? 0) - (column[b] ?? 0));
  const rank = new Float64Array(column.length);
  order.forEach((i, place) => (rank[i] = place));
  return rank;
}

function correlation(a: Float64Array, b: Float64Array): number {
  const n = a.length;
  const mean = (n - 1) / 2;
  let both = 0;
  let own = 0;
  for (let i = 0; i < n; i++) {
    both += ((a[i] ?? 0) - mean) * ((b[i] ?? 0) - mean);
    own += ((a[i] ?? 0) - mean) ** 2;
  }
  return own > 0 ? both / own : 0;
}
