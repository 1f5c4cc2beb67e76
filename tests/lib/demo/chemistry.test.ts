import { describe, expect, it } from 'vitest';
import { aerated, doseToReach, fed, settledCalcite, valuesOf, waterOf } from '@/lib/demo/chemistry';
import { conductivityUsPerCm } from '@/lib/demo/conductivity';
import { createRandom } from '@/lib/demo/random';
import { createSource } from '@/lib/demo/raw-water';
import { chlorineDoses } from '@/lib/demo/treated-water';
import { DEMO_WORKS } from '@/lib/demo/works/all';
import { indicesOf } from '@/lib/engine';

const HARD = {
  temperature: 11,
  pH: 7.3,
  alkalinity: 280,
  calcium: 95,
  magnesium: 18,
  sodium: 20,
  potassium: 3,
  chloride: 28,
  sulfate: 38,
};
const LIMED = fed(waterOf(HARD), [{ reagent: 'calcium-hydroxide', doseMgL: 130 }]);

describe('raw water', () => {
  it.each(DEMO_WORKS)('of $definition.name balances in charge on every day', ({ process }) => {
    const next = createSource(process.source, createRandom('balance'));
    const balances = Array.from({ length: 100 }, (_, day) =>
      waterOf(next(day * 3.65, day % 10 === 0 ? 1 : 0.1)),
    ).map(({ chargeBalancePercent }) => Math.abs(chargeBalancePercent));
    expect(Math.max(...balances)).toBeLessThan(1.5);
  });

  it('conducts as potassium chloride of 0.01 mol/L does: 1413 µS/cm (standard solution, common practice)', () => {
    const found = conductivityUsPerCm({ potassium: 390.98, chloride: 354.5 });
    expect(Math.abs(found / 1413 - 1)).toBeLessThan(0.02);
  });
});

describe('treatment', () => {
  it('blows out carbon dioxide and leaves alkalinity and calcium alone', () => {
    const before = waterOf(HARD);
    const after = aerated(before, 0.6);
    expect(after.carbonDioxideMgLCO2).toBeLessThan(0.5 * before.carbonDioxideMgLCO2);
    expect(after.pH).toBeGreaterThan(before.pH);
    expect(after.alkalinityMgLCaCO3).toBeCloseTo(280, 6);
    expect(valuesOf(after).calcium).toBeCloseTo(95, 6);
  });

  it('settles calcite mole for mole, until little can still come out', () => {
    const before = valuesOf(LIMED);
    const settled = settledCalcite(LIMED, 1);
    const after = valuesOf(settled);
    const calciumLostMmol = ((before.calcium ?? 0) - (after.calcium ?? 0)) / 40.078;
    const alkalinityLostMmol = ((before.alkalinity ?? 0) - (after.alkalinity ?? 0)) / 100.086;
    expect(calciumLostMmol).toBeGreaterThan(1);
    expect(alkalinityLostMmol).toBeCloseTo(calciumLostMmol, 9);
    expect(Math.abs(indicesOf(settled).calciteIndex ?? NaN)).toBeLessThan(0.01);
  });

  it('settles nothing out of a water that would dissolve calcite', () => {
    const aggressive = waterOf({ ...HARD, pH: 6.5 });
    expect(settledCalcite(aggressive, 1).pH).toBeCloseTo(6.5, 6);
  });

  it('writes out the water it was made from', () => {
    expect(valuesOf(waterOf(HARD))).toMatchObject(
      Object.fromEntries(
        Object.entries(HARD).map(([key, value]) => [key, expect.closeTo(value, 6) as number]),
      ),
    );
  });

  it('reaches the pH it was asked for', () => {
    const water = waterOf(HARD);
    const doseMgL = doseToReach(water, 'sodium-hydroxide', { quantity: 'pH', value: 8 });
    expect(fed(water, [{ reagent: 'sodium-hydroxide', doseMgL }]).pH).toBeCloseTo(8, 3);
  });

  it.each([
    ['sodium-hypochlorite', 0, 0.01],
    // 2 × 50.043 / 70.9 mg as CaCO3 per mg of Cl2 that is used up.
    ['chlorine', 2 * 1.4117, 0.01],
  ] as const)('%s used up takes alkalinity %f mg/L for 2 mg/L', (reagent, takenMgL, within) => {
    const water = waterOf(HARD);
    const after = fed(water, chlorineDoses(reagent, 2, 0));
    expect(Math.abs(280 - after.alkalinityMgLCaCO3 - takenMgL)).toBeLessThan(within);
  });

  it('throws where the engine refuses: an invented water must be a possible one', () => {
    expect(() => waterOf({ temperature: 10, pH: 7 })).toThrow(/The demo asked for a raw water/);
  });
});
