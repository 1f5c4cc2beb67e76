import { describe, expect, it } from 'vitest';
import { accepted, riverWater, waterOf } from './support';
import { doseForTarget, howSure, indicesOf, type Water } from '@/lib/engine';
import { drawsFrom } from '@/lib/engine/uncertainty/random';

const index = (water: Water) => ({ index: water.saturationIndex['calcite'] ?? NaN });

describe('seeded draws', () => {
  it('have the mean and spread of a standard normal', () => {
    const { normal } = drawsFrom(42);
    const values = Array.from({ length: 40_000 }, normal);
    const mean = values.reduce((sum, value) => sum + value, 0) / values.length;
    const variance = values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / values.length;
    // Five standard errors.
    expect(Math.abs(mean)).toBeLessThan(0.025);
    expect(Math.abs(variance - 1)).toBeLessThan(0.036);
  });

  it('fill the unit interval evenly', () => {
    const { uniform } = drawsFrom(7);
    const counts = new Array<number>(10).fill(0);
    for (let i = 0; i < 20_000; i++) {
      const slot = Math.floor(uniform() * 10);
      counts[slot] = (counts[slot] ?? 0) + 1;
    }
    for (const count of counts) expect(Math.abs(count - 2000)).toBeLessThan(250);
  });

  it('repeat with the seed and part with another', () => {
    expect(drawsFrom(5).uniform()).toBe(drawsFrom(5).uniform());
    expect(drawsFrom(5).uniform()).not.toBe(drawsFrom(6).uniform());
  });
});

describe('how sure', () => {
  it('gives the same band for the same seed', () => {
    const once = howSure(riverWater, index, { seed: 3, draws: 100 });
    expect(howSure(riverWater, index, { seed: 3, draws: 100 })).toEqual(once);
  });

  it('carries the error of pH straight into the index, and names it', () => {
    const { results, failed } = accepted(
      howSure(riverWater, index, {
        seed: 1,
        draws: 1500,
        uncertainties: {
          pH: { absolute: 0.1 },
          temperatureC: {},
          alkalinityMgLCaCO3: { relative: 0.01 },
          calcium: { relative: 0.01 },
        },
      }),
    );
    const { band, influences } = results['index'] ?? { band: null, influences: [] };
    expect(failed).toBe(0);
    // The index moves one for one with pH: the 90 % band is 2 × 1.645 × 0.1 wide, within sampling error.
    expect(Math.abs((band?.high ?? NaN) - (band?.low ?? NaN) - 0.329)).toBeLessThan(0.03);
    expect(influences[0]?.input).toBe('pH');
    expect(influences[0]?.share).toBeGreaterThan(0.9);
  });

  it('has its median near the value of the analysis itself', () => {
    const { results } = accepted(howSure(riverWater, index, { seed: 2, draws: 800 }));
    const median = results['index']?.band.median ?? NaN;
    expect(Math.abs(median - (waterOf(riverWater).saturationIndex['calcite'] ?? NaN))).toBeLessThan(
      0.02,
    );
  });

  it('carries errors to a dose', () => {
    const dose = (water: Water) => {
      const found = doseForTarget(water, 'calcium-hydroxide', { quantity: 'pH', value: 8.4 });
      const first = found.ok ? found.doses[0] : undefined;
      return first ? { dose: first.doseMgL, index: indicesOf(first.water).langelier ?? NaN } : null;
    };
    const { results } = accepted(howSure(riverWater, dose, { seed: 4, draws: 60 }));
    const { low = NaN, high = NaN } = results['dose']?.band ?? {};
    expect(low).toBeGreaterThan(0);
    expect(high).toBeGreaterThan(low);
  });

  it('can be stopped, and reports how far it is', () => {
    const shares: number[] = [];
    const stopped = howSure(riverWater, index, {
      seed: 1,
      draws: 1000,
      onProgress: (share) => {
        shares.push(share);
        return shares.length < 3;
      },
    });
    expect(stopped).toMatchObject({ ok: false });
    expect(shares).toHaveLength(3);
  });

  it.each([
    [{ seed: -1 }, 'seed'],
    [{ seed: 1, draws: 1 }, 'draws'],
    [{ seed: 1, draws: NaN }, 'draws'],
  ])('refuses %j', (sampling, path) => {
    expect(howSure(riverWater, index, sampling)).toMatchObject({ ok: false, path });
  });
});
