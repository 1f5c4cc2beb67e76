import fc from 'fast-check';
import type { Analyte, Dose, ReagentKey, WaterAnalysis } from '@/lib/engine';
import { ANALYTE_KEYS } from '@/lib/engine/constants/analytes';
import { REAGENTS } from '@/lib/engine';

/** Two of the four that fix the carbonate system. */
export const CARBONATE_PAIRS = [
  ['pH', 'alkalinityMgLCaCO3'],
  ['pH', 'inorganicCarbonMgLC'],
  ['pH', 'carbonDioxideAtm'],
  ['alkalinityMgLCaCO3', 'inorganicCarbonMgLC'],
  ['alkalinityMgLCaCO3', 'carbonDioxideAtm'],
  ['inorganicCarbonMgLC', 'carbonDioxideAtm'],
] as const;

/** Upper ends of what raw, process and finished waters hold, mg/L. Ionic strength stays below 0.5. */
const HIGHEST: Readonly<Record<Analyte, number>> = {
  calcium: 400,
  magnesium: 200,
  sodium: 2000,
  potassium: 200,
  chloride: 3000,
  sulfate: 1500,
  nitrate: 200,
  fluoride: 10,
  ammonia: 20,
  phosphate: 10,
  silica: 80,
  boron: 5,
  iron: 20,
  manganese: 10,
  aluminum: 10,
  copper: 5,
  lead: 2,
  zinc: 10,
  barium: 2,
  strontium: 10,
  sulfide: 5,
};

/** Nothing, a trace down to 1e-12 of the highest, or anything between: spread over powers of ten. */
const amount = (highest: number): fc.Arbitrary<number | undefined> =>
  fc.oneof(
    { weight: 3, arbitrary: fc.constant(undefined) },
    { weight: 1, arbitrary: fc.constant(0) },
    {
      weight: 5,
      arbitrary: fc.double({ min: -4, max: 0, noNaN: true }).map((p) => highest * 10 ** p),
    },
    {
      weight: 1,
      arbitrary: fc.double({ min: -12, max: -4, noNaN: true }).map((p) => highest * 10 ** p),
    },
  );

const analytes = fc.record(
  Object.fromEntries(ANALYTE_KEYS.map((key) => [key, amount(HIGHEST[key])])),
) as fc.Arbitrary<Partial<Record<Analyte, number>>>;

/** Valid waters from empty to all analytes, 0–40 °C, pH 4–12, by pH and inorganic carbon. */
export const anyWater: fc.Arbitrary<WaterAnalysis> = fc.record({
  temperatureC: fc.double({ min: 0, max: 40, noNaN: true }),
  pH: fc.double({ min: 4, max: 12, noNaN: true }),
  inorganicCarbonMgLC: fc.double({ min: -3, max: 2.4, noNaN: true }).map((p) => 10 ** p),
  analytesMgL: analytes,
});

/** Any dose a plant might feed. */
export const anyDose: fc.Arbitrary<Dose> = fc.record({
  reagent: fc.constantFrom(...(Object.keys(REAGENTS) as ReagentKey[])),
  doseMgL: fc.double({ min: 0, max: 60, noNaN: true }),
});
