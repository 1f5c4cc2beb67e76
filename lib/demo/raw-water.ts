import type { QuantityKey } from '@/lib/samples/quantities';
import { conductivityUsPerCm } from './conductivity';
import { createWander, type Random } from './random';
import { yearlyWave } from './season';

/** One water: canonical values of every quantity it is asked about. */
export type Values = Readonly<Partial<Record<QuantityKey, number>>>;

/**
 * How one quantity of a source behaves: `base` through the year, a yearly wave of `swing` that peaks on `peakDay`, `rain`
 * more in full spate, and a slow wander of standard deviation `wander`. A `relative` quantity takes the last three as
 * natural logarithms of a factor. `within` is what this source can give, canonical unit.
 */
export interface QuantityModel {
  readonly base: number;
  readonly swing?: number;
  readonly peakDay?: number;
  readonly rain?: number;
  readonly wander?: number;
  readonly relative?: boolean;
  readonly within: readonly [number, number];
}

/** Sodium and conductivity follow from the rest. */
export type SourceModel = Readonly<Partial<Record<QuantityKey, QuantityModel>>>;

const WANDER_MEMORY = 0.9;
/** Upland water at its softest still carries this much sodium, mg/L. */
const LEAST_SODIUM_MG_L = 3;

/** True raw water, day after day. `next` takes the day of the year and the runoff of that day. */
export function createSource(
  model: SourceModel,
  random: Random,
): (dayOfYear: number, runoff: number) => Values {
  const quantities = (Object.entries(model) as [QuantityKey, QuantityModel][]).map(
    ([key, quantity]) => ({
      key,
      quantity,
      wander: createWander(random.fork(key), WANDER_MEMORY),
    }),
  );
  return (dayOfYear, runoff) => {
    const values: Partial<Record<QuantityKey, number>> = {};
    for (const { key, quantity, wander } of quantities) {
      values[key] = valueOn(quantity, dayOfYear, runoff, wander());
    }
    const balanced = balanceWithSalt(values);
    return { ...balanced, conductivity: conductivityUsPerCm(balanced) };
  };
}

function valueOn(
  { base, swing = 0, peakDay = 0, rain = 0, wander = 0, relative = false, within }: QuantityModel,
  dayOfYear: number,
  runoff: number,
  drift: number,
): number {
  const moved = swing * yearlyWave(dayOfYear, peakDay) + rain * runoff + wander * drift;
  const value = relative ? levelledOff(base * Math.exp(moved), within[1]) : base + moved;
  return Math.min(Math.max(value, within[0]), within[1]);
}

/** A factor can grow without end; the most a source can give is approached, not struck flat. */
const levelledOff = (value: number, most: number): number =>
  value / (1 + (value / most) ** 4) ** 0.25;

// mg per meq, IUPAC atomic weights; alkalinity by its own definition (CaCO3 100.086 / 2).
const MG_PER_MEQ = {
  calcium: 20.039,
  magnesium: 12.1525,
  potassium: 39.098,
  sodium: 22.99,
  alkalinity: 50.043,
  chloride: 35.45,
  sulfate: 48.03,
  nitrate: 62.004,
} as const;

const meq = (values: Values, key: keyof typeof MG_PER_MEQ): number =>
  (values[key] ?? 0) / MG_PER_MEQ[key];

/** Sodium makes up for the anions; where that leaves too little of it, chloride makes up for the cations. */
function balanceWithSalt(values: Values): Values {
  const anions =
    meq(values, 'alkalinity') +
    meq(values, 'chloride') +
    meq(values, 'sulfate') +
    meq(values, 'nitrate');
  const others = meq(values, 'calcium') + meq(values, 'magnesium') + meq(values, 'potassium');
  const sodium = Math.max((anions - others) * MG_PER_MEQ.sodium, LEAST_SODIUM_MG_L);
  const lacking = others + sodium / MG_PER_MEQ.sodium - anions;
  const chloride = (values.chloride ?? 0) + lacking * MG_PER_MEQ.chloride;
  return { ...values, sodium, chloride };
}
