import { howSure, indicesOf, solveWater, type Band, type Measured } from '@/lib/engine';
import type { IndexKey } from './indices';
import { QUANTITIES, QUANTITY_KEYS, type QuantityKey } from './quantities';
import { analysisOf, sampleIndices, type MeasuredValues } from './solve-sample';

export interface IndexBand extends Band {
  readonly key: IndexKey;
  /** The inputs whose errors matter most, with their share of the spread, largest first. */
  readonly matters: readonly { readonly quantity: QuantityKey; readonly share: number }[];
}

export type IndexBands =
  | {
      readonly ok: true;
      readonly bands: readonly IndexBand[];
      readonly draws: number;
      readonly failed: number;
    }
  | { readonly ok: false; readonly message: string };

/** Shares below this are noise of the sampling. */
const LEAST_SHARE = 0.05;
const MOST_NAMED = 3;
const SEED = 20_261;

/**
 * The 90 % band of every index of a sample, from the usual errors of its measurements. An index without meaning in some
 * draw is left out. Seeded: the same sample gives the same band.
 */
export function howSureOfSample(
  values: MeasuredValues,
  shown: readonly IndexKey[],
  draws: number,
  onProgress?: (share: number) => boolean,
): IndexBands {
  const asked = analysisOf(values);
  if (asked === null) return { ok: false, message: 'Temperature, pH and alkalinity are needed.' };
  const base = solveWater(asked.analysis);
  if (!base.ok) return base;
  const meant = sampleIndices(base.water, indicesOf(base.water));
  const keys = shown.filter((key) => meant[key] !== undefined);
  const sure = howSure(
    asked.analysis,
    (water) => {
      const indices = sampleIndices(water, indicesOf(water));
      const found: Record<string, number> = {};
      for (const key of keys) {
        const value = indices[key];
        if (value === undefined) return null;
        found[key] = value;
      }
      return found;
    },
    { seed: SEED, draws, ...(onProgress ? { onProgress } : {}) },
  );
  if (!sure.ok) return sure;
  const bands = keys.flatMap((key) => {
    const result = sure.results[key];
    if (result === undefined) return [];
    const matters = result.influences
      .filter(({ share }) => share >= LEAST_SHARE)
      .slice(0, MOST_NAMED)
      .map(({ input, share }) => ({ quantity: quantityOf(input), share }));
    return [{ key, ...result.band, matters }];
  });
  return { ok: true, bands, draws: sure.draws, failed: sure.failed };
}

const CONDITIONS: Readonly<Partial<Record<Measured, QuantityKey>>> = {
  temperatureC: 'temperature',
  pH: 'pH',
  alkalinityMgLCaCO3: 'alkalinity',
};

/** The quantity of a sample behind an input of the engine. */
function quantityOf(input: Measured): QuantityKey {
  const analyte = QUANTITY_KEYS.find((key) => QUANTITIES[key].engine === input);
  const found = CONDITIONS[input] ?? analyte;
  if (found === undefined) throw new Error(`No quantity of a sample gives the engine ${input}.`);
  return found;
}
