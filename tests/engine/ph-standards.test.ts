import { describe, expect, it } from 'vitest';
import { accepted, spread } from './support';
import { ATOMIC_WEIGHTS as M } from '@/lib/engine/constants/elements';
import { CACO3_MG_PER_EQ } from '@/lib/engine/constants/carbonate-equivalents';
import { solveWater, type WaterAnalysis } from '@/lib/engine';
import standards from './published/ph-standards.json';

/** Compositions in mol/kg of water as published, carried to mg/L at 1 L = 1 kg like every input. */
const carbonate = (temperatureC: number): WaterAnalysis => ({
  temperatureC,
  alkalinityMgLCaCO3: 0.075 * CACO3_MG_PER_EQ,
  inorganicCarbonMgLC: 0.05 * 1000 * M.C,
  analytesMgL: { sodium: 0.075 * 1000 * M.Na },
});
const phosphate = (temperatureC: number): WaterAnalysis => ({
  temperatureC,
  alkalinityMgLCaCO3: 0.025 * CACO3_MG_PER_EQ,
  inorganicCarbonMgLC: 0,
  analytesMgL: {
    sodium: 0.05 * 1000 * M.Na,
    potassium: 0.025 * 1000 * M.K,
    phosphate: 0.05 * 1000 * M.P,
  },
});

const buffers = [
  { name: 'NaHCO3_0.025m_Na2CO3_0.025m', water: carbonate },
  { name: 'KH2PO4_0.025m_Na2HPO4_0.025m', water: phosphate },
] as const;

describe('primary pH standards from composition alone (published values recalled from memory)', () => {
  const samples = buffers.flatMap(({ name, water }) =>
    standards.temps_C.map((temperatureC, i) => ({
      name,
      temperatureC,
      published: standards.values[name][i] ?? NaN,
      pH: accepted(solveWater(water(temperatureC))).water.pH,
    })),
  );

  it.each(samples)('$name at $temperatureC °C is within 0.012 of $published', (sample) => {
    expect(Math.abs(sample.pH - sample.published)).toBeLessThanOrEqual(0.012);
  });

  it('drops no published sample', () => {
    expect(samples).toHaveLength(22);
    expect(Object.keys(standards.values)).toEqual(buffers.map((buffer) => buffer.name));
  });

  it('is off by less than 0.006 on average', () => {
    expect(spread(samples.map((s) => s.pH - s.published)).mean).toBeLessThan(0.006);
  });
});
