import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { hardWater, riverWater, softWater, waterOf } from './support';
import { anyWater } from './waters';
import {
  copperOneSolubilityOf,
  copperSolubilityOf,
  indicesOf,
  leadSolubilityOf,
} from '@/lib/engine';

describe('indices by their formulas', () => {
  const water = waterOf(riverWater);
  const indices = indicesOf(water);
  const calciumAsCaCO3 = (38 * 100.086) / 40.078;

  // Formulas as published; sources stand beside each function of the engine.
  it.each([
    ['ryznar', 2 * (indices.saturationPH ?? NaN) - 7.7],
    ['puckorius', 2 * (indices.saturationPH ?? NaN) - (1.465 * Math.log10(92) + 4.54)],
    ['aggressiveness', 7.7 + Math.log10(calciumAsCaCO3 * 92)],
    ['chlorideSulfateMassRatio', 21 / 29],
    ['totalHardnessMgLCaCO3', calciumAsCaCO3 + (7.2 * 100.086) / 24.305],
    ['carbonateHardnessMgLCaCO3', 92],
  ] as const)('%s', (key, expected) => {
    expect(indices[key]).toBeCloseTo(expected, 9);
  });

  it('counts chloride and sulfate against carbonate alkalinity for Larson', () => {
    const salts = 21 / 35.45 + (2 * 29) / 96.056;
    expect(indices.larson).toBeCloseTo(salts / (92 / 50.043), 1);
  });

  it('is null where an index has no meaning', () => {
    const bare = indicesOf(
      waterOf({ temperatureC: 20, pH: 7, inorganicCarbonMgLC: 0, analytesMgL: { sodium: 5 } }),
    );
    expect(bare).toMatchObject({
      calciteIndex: null,
      saturationPH: null,
      langelier: null,
      precipitationPotentialMgLCaCO3: null,
      larson: null,
      chlorideSulfateMassRatio: null,
    });
  });
});

describe('buffer intensity', () => {
  it('is the slope of alkalinity by pH at constant carbon', () => {
    fc.assert(
      fc.property(anyWater, (analysis) => {
        const water = waterOf(analysis);
        const step = 1e-4;
        const beside = (pH: number) => waterOf({ ...analysis, pH }).alkalinityMgLCaCO3 / 50.043;
        const slope = (beside(water.pH + step) - beside(water.pH - step)) / (2 * step);
        const found = indicesOf(water).bufferIntensityMeqLPerPH;
        expect(found).toBeGreaterThan(0);
        expect(Math.abs(found / slope - 1)).toBeLessThan(1e-3);
      }),
      { numRuns: 60, seed: 12 },
    );
  });
});

describe('theoretical metal solubility', () => {
  const phosphated = waterOf({
    ...riverWater,
    pH: 7.6,
    analytesMgL: { ...riverWater.analytesMgL, phosphate: 0.5 },
  });

  it.each([
    ['lead', leadSolubilityOf, ['cerussite', 'hydrocerussite', 'hydroxypyromorphite']],
    ['copper', copperSolubilityOf, ['copper-hydroxide', 'tenorite', 'malachite']],
  ] as const)('of %s saturates its solid when that much is in the water', (metal, of, solids) => {
    const found = of(phosphated);
    for (const solid of solids) {
      const mgL = found.find((entry) => entry.solid === solid)?.mgL ?? NaN;
      // A hundredth of it, so that the rest of the water is hardly moved; the index then shows the factor.
      const trace = waterOf({
        ...riverWater,
        pH: 7.6,
        analytesMgL: { ...riverWater.analytesMgL, phosphate: 0.5, [metal]: mgL / 100 },
      });
      const atoms =
        { hydrocerussite: 3, hydroxypyromorphite: 5, malachite: 2 }[solid as string] ?? 1;
      expect((trace.saturationIndex[solid] ?? NaN) + 2 * atoms).toBeCloseTo(0, 1);
    }
  });

  it('falls with phosphate, and names no solid the water cannot form', () => {
    const plain = leadSolubilityOf(waterOf(softWater));
    expect(plain.map((entry) => entry.solid)).not.toContain('hydroxypyromorphite');
    expect(leadSolubilityOf(phosphated)[0]?.solid).toBe('hydroxypyromorphite');
    expect(copperSolubilityOf(waterOf(hardWater))[0]?.mgL).toBeGreaterThan(0);
  });

  // Cu2O + 2H+ = 2Cu+ + H2O from standard potentials of Cu2O/Cu (0.471 V) and Cu+/Cu (0.521 V), from memory: −1.69.
  it('of copper(I) is the activity over cuprite that the standard potentials give, in a water without complexers', () => {
    const bare = waterOf({ temperatureC: 25, pH: 7.5, alkalinityMgLCaCO3: 40, analytesMgL: {} });
    const [cuprite] = copperOneSolubilityOf(bare);
    const byPotentials = 10 ** ((2 * (0.471 - 0.521)) / 0.05916 / 2 - 7.5) * 63_546;
    expect(Math.log10((cuprite?.mgL ?? NaN) / byPotentials)).toBeCloseTo(0, 0.7);
    expect(cuprite?.mgL).toBeLessThan(copperSolubilityOf(bare)[0]?.mgL ?? NaN);
  });

  it('of copper(I) rises with chloride, which holds it', () => {
    const salty = { ...riverWater, analytesMgL: { ...riverWater.analytesMgL, chloride: 210 } };
    const mgL = (analysis: typeof riverWater) => copperOneSolubilityOf(waterOf(analysis))[0]?.mgL;
    expect(mgL(salty)).toBeGreaterThan(mgL(riverWater) ?? NaN);
  });
});
