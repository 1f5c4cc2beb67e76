import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accepted, hardWater, riverWater, softWater, waterOf } from './support';
import {
  applyDose,
  doseForTarget,
  indicesOf,
  type ReagentKey,
  type TargetQuantity,
} from '@/lib/engine';
import { quantityOf } from '@/lib/engine/planning/quantity';

const pairs: readonly (readonly [ReagentKey, TargetQuantity])[] = [
  ['calcium-hydroxide', 'pH'],
  ['calcium-hydroxide', 'alkalinity'],
  ['calcium-hydroxide', 'calcium'],
  ['sodium-hydroxide', 'pH'],
  ['sodium-hydroxide', 'calciteIndex'],
  ['sodium-hydroxide', 'langelier'],
  ['sodium-carbonate', 'inorganicCarbon'],
  ['carbon-dioxide', 'pH'],
  ['carbon-dioxide', 'inorganicCarbon'],
  ['sulfuric-acid', 'pH'],
  ['sulfuric-acid', 'alkalinity'],
  ['hydrochloric-acid', 'larson'],
  ['calcium-chloride', 'hardness'],
  ['calcium-chloride', 'chlorideSulfateMassRatio'],
  ['sodium-hydroxide', 'precipitationPotential'],
  ['aluminum-sulfate', 'pH'],
];

describe('one reagent for one target', () => {
  it.each(pairs)('%s for %s: dose, value, and the same dose back', (reagent, quantity) => {
    fc.assert(
      fc.property(
        fc.constantFrom(riverWater, softWater, hardWater),
        fc.double({ min: 0.5, max: 40, noNaN: true }),
        (analysis, doseMgL) => {
          const water = waterOf(analysis);
          const dosed = accepted(applyDose(water, { reagent, doseMgL })).water;
          const value = quantityOf(dosed, quantity);
          fc.pre(value !== null);
          const { doses } = accepted(
            doseForTarget(water, reagent, { quantity, value: value ?? NaN }, { maxDoseMgL: 60 }),
          );
          const nearest = Math.min(...doses.map((d) => Math.abs(d.doseMgL - doseMgL)));
          expect(nearest).toBeLessThan(1e-5);
          for (const found of doses) {
            expect(quantityOf(found.water, quantity)).toBeCloseTo(value ?? NaN, 6);
          }
        },
      ),
      { numRuns: 8, seed: 23 },
    );
  });

  it('returns both doses where the quantity turns', () => {
    // Caustic raises the index of a soft water until carbonate is used up; then hydroxide complexes take calcium away.
    const water = waterOf(softWater);
    const index = (doseMgL: number) =>
      accepted(applyDose(water, { reagent: 'sodium-hydroxide', doseMgL })).water.saturationIndex[
        'calcite'
      ] ?? NaN;
    for (const [value, maxDoseMgL] of [
      [0.615, 60],
      [0.6165, 90],
      [0.6179, 500],
    ] as const) {
      const { doses } = accepted(
        doseForTarget(
          water,
          'sodium-hydroxide',
          { quantity: 'calciteIndex', value },
          { maxDoseMgL },
        ),
      );
      expect(doses).toHaveLength(2);
      const [first = NaN, second = NaN] = doses.map((dose) => dose.doseMgL);
      expect(first).toBeLessThan(second);
      expect(index((first + second) / 2)).toBeGreaterThan(value);
      for (const dose of [first, second]) expect(index(dose)).toBeCloseTo(value, 7);
    }
    // The top of the turn is the most that can be reached.
    const above = doseForTarget(water, 'sodium-hydroxide', {
      quantity: 'calciteIndex',
      value: 0.7,
    });
    if (above.ok || !('reachable' in above)) throw new Error('expected a range');
    expect(above.reachable?.to).toBeCloseTo(0.61814, 3);
  });

  it('says which way a target fails and what can be reached', () => {
    const water = waterOf(riverWater);
    const up = doseForTarget(water, 'hydrochloric-acid', { quantity: 'pH', value: 9 });
    expect(up).toMatchObject({ ok: false, reason: 'targetUnreachable' });
    if (up.ok || !('reachable' in up)) throw new Error('expected a range');
    expect(up.message).toContain('cannot raise');
    expect(up.reachable?.to).toBeCloseTo(water.pH, 9);
    const down = doseForTarget(water, 'sodium-hydroxide', { quantity: 'pH', value: 5 });
    expect(down).toMatchObject({ ok: false, reason: 'targetUnreachable' });
    if (down.ok) throw new Error('expected a refusal');
    expect(down.message).toContain('cannot lower');
  });

  it('says when the reagent does not move the quantity at all', () => {
    const still = doseForTarget(waterOf(riverWater), 'carbon-dioxide', {
      quantity: 'alkalinity',
      value: 50,
    });
    expect(still).toMatchObject({ ok: false, reason: 'targetUnreachable' });
    if (still.ok) throw new Error('expected a refusal');
    expect(still.message).toContain('does not move alkalinity');
  });

  it('gives no dose when the water already meets the target', () => {
    const water = waterOf(riverWater);
    const { doses } = accepted(
      doseForTarget(water, 'sodium-hydroxide', { quantity: 'pH', value: water.pH }),
    );
    expect(doses[0]?.doseMgL).toBeCloseTo(0, 6);
  });
});

describe('indices', () => {
  it.each([
    ['hard', hardWater],
    ['river', riverWater],
    ['soft', softWater],
  ] as const)('of %s water hang together', (_, analysis) => {
    const water = waterOf(analysis);
    const indices = indicesOf(water);
    const potential = indices.precipitationPotentialMgLCaCO3 ?? NaN;
    expect(Math.sign(potential)).toBe(Math.sign(indices.calciteIndex ?? NaN));
    expect(indices.langelier).toBeCloseTo(water.pH - (indices.saturationPH ?? NaN), 12);
    expect(Math.abs((indices.langelier ?? NaN) - (indices.calciteIndex ?? NaN))).toBeLessThan(0.06);
    expect(indices.ryznar).toBeCloseTo(2 * (indices.saturationPH ?? NaN) - water.pH, 12);
    expect(indices.carbonateHardnessMgLCaCO3 + indices.nonCarbonateHardnessMgLCaCO3).toBeCloseTo(
      indices.totalHardnessMgLCaCO3,
      9,
    );
  });
});
