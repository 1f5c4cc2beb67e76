import { fromCanonical, toCanonical, type QuantityKey } from '@/lib/samples/quantities';
import type { Random } from './random';
import type { Values } from './raw-water';
import type { DemoResult } from './schema';
import type { ListedQuantity } from './works/definition';

/** Standard deviation of one grab sample and its test: a share of the value and a fixed part, canonical unit. */
const NOISE: Readonly<Record<QuantityKey, readonly [share: number, fixed: number]>> = {
  temperature: [0, 0.1],
  pH: [0, 0.03],
  alkalinity: [0.008, 0.3],
  calcium: [0.015, 0.03],
  magnesium: [0.015, 0.01],
  sodium: [0.015, 0.05],
  potassium: [0.03, 0.01],
  chloride: [0.012, 0.05],
  sulfate: [0.015, 0.05],
  nitrate: [0.02, 0.02],
  fluoride: [0.015, 0.01],
  silica: [0.02, 0.05],
  phosphate: [0.03, 0.01],
  ammonia: [0.04, 0.005],
  iron: [0.04, 0.002],
  manganese: [0.05, 0.0005],
  aluminum: [0.05, 0.002],
  conductivity: [0.008, 0.5],
  turbidity: [0.04, 0.008],
  colour: [0.03, 0.6],
  uvAbsorbance: [0.015, 0.001],
  freeChlorine: [0.03, 0.012],
};

/** One tap's sheet, filled in from the water that was there. A quantity the water has no value for is left blank. */
export const fillSheet = (
  sheet: readonly ListedQuantity[],
  water: Values,
  random: Random,
): DemoResult[] =>
  sheet.flatMap((line) => {
    const value = water[line.quantity];
    return value === undefined ? [] : [writeResult(line, value, random.normal())];
  });

function writeResult(line: ListedQuantity, trueValue: number, deviation: number): DemoResult {
  const { quantity, unit, decimals, reportingLimit } = line;
  const [share, fixed] = NOISE[quantity];
  const found = Math.max(0, trueValue + deviation * Math.hypot(share * trueValue, fixed));
  const written = fromCanonical(quantity, found, unit);
  const isBelow = reportingLimit !== undefined && written < reportingLimit;
  const text = (isBelow ? reportingLimit : written).toFixed(decimals);
  return asWritten(quantity, text, unit, isBelow ? '<' : '');
}

/** A result whose value is what its text says in its unit. */
export const asWritten = (
  quantity: QuantityKey,
  text: string,
  unit: string,
  qualifier: DemoResult['qualifier'],
): DemoResult => ({
  quantity,
  text,
  unit,
  qualifier,
  value: toCanonical(quantity, Number(text), unit),
});
