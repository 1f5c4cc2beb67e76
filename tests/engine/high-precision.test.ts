import fc from 'fast-check';
import { expect, it } from 'vitest';
import { hardWater, riverWater, softWater, waterOf } from './support';
import { solvePrecisely } from './high-precision';
import { anyWater } from './waters';

it('agrees with an independent solve at 32 digits for 52 waters', { timeout: 60_000 }, () => {
  const analyses = [
    riverWater,
    softWater,
    hardWater,
    ...fc.sample(anyWater, { numRuns: 49, seed: 31 }),
  ];
  let worstPH = 0;
  let worstSpecies = 0;
  for (const analysis of analyses) {
    const water = waterOf(analysis);
    const precise = solvePrecisely(water);
    worstPH = Math.max(worstPH, Math.abs(precise.pH - water.pH));
    for (const [key, amount] of precise.speciesMolKg) {
      const found = water.speciesMolKg[key] ?? NaN;
      if (amount < 1e-200) continue;
      worstSpecies = Math.max(worstSpecies, Math.abs(found / amount - 1));
    }
    expect(precise.speciesMolKg.size).toBe(Object.keys(water.speciesMolKg).length);
  }
  expect(analyses).toHaveLength(52);
  expect(worstPH).toBeLessThan(1e-9);
  expect(worstSpecies).toBeLessThan(1e-8);
});
