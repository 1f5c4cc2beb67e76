import type { Analyte, WaterAnalysis } from '../../lib/engine';
import { ANALYTE_KEYS } from '../../lib/engine/constants/analytes';
import { drawsFrom } from '../../lib/engine/uncertainty/random';

/** Upper ends of what waters hold, mg/L; ionic strength stays below 0.5 for nearly all. */
const HIGHEST: Readonly<Record<Analyte, number>> = {
  calcium: 400,
  magnesium: 200,
  sodium: 3000,
  potassium: 300,
  chloride: 4000,
  sulfate: 2000,
  nitrate: 300,
  fluoride: 10,
  ammonia: 20,
  phosphate: 10,
  silica: 80,
  boron: 5,
  iron: 20,
  manganese: 10,
  aluminum: 20,
  copper: 5,
  lead: 2,
  zinc: 10,
  barium: 2,
  strontium: 10,
  sulfide: 5,
};

/** Valid waters without end: 0–40 °C, pH 4–12, empty to all analytes, zero and trace totals among them. */
export function* randomWaters(seed: number): Generator<WaterAnalysis, never> {
  const { uniform } = drawsFrom(seed);
  for (;;) {
    const dense = uniform();
    const analytesMgL: Partial<Record<Analyte, number>> = {};
    for (const key of ANALYTE_KEYS) {
      if (uniform() > dense) continue;
      const depth = uniform() < 0.1 ? 4 + 8 * uniform() : 4 * uniform();
      analytesMgL[key] = uniform() < 0.05 ? 0 : HIGHEST[key] * 10 ** -depth;
    }
    yield {
      temperatureC: 40 * uniform(),
      pH: 4 + 8 * uniform(),
      inorganicCarbonMgLC: uniform() < 0.05 ? 0 : 10 ** (5.4 * uniform() - 3),
      analytesMgL,
    };
  }
}
