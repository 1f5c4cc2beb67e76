import fc from 'fast-check';
import { describe, expect, expectTypeOf, it } from 'vitest';
import { accepted } from './support';
import { convert, UNITS, type QuantityKind, type UnitOf } from '@/lib/engine';
import factors from './published/alkalinity-factors.json';

const value = <K extends QuantityKind>(kind: K, x: number, from: UnitOf<K>, to: UnitOf<K>) =>
  accepted(convert(kind, x, from, to)).value;

describe('conversions plants use', () => {
  // Definitions, or factors of the conversion file (computed from atomic weights).
  it.each([
    [() => value('calcium', 1, 'mg/L', 'mg/L as CaCO3'), factors.as_CaCO3_multipliers.Ca, 1e-3],
    [() => value('magnesium', 1, 'mg/L', 'mg/L as CaCO3'), factors.as_CaCO3_multipliers.Mg, 1e-3],
    [() => value('chloride', 1, 'mg/L', 'mg/L as CaCO3'), factors.as_CaCO3_multipliers.Cl, 1e-3],
    [() => value('sulfate', 1, 'mg/L', 'mg/L as CaCO3'), factors.as_CaCO3_multipliers.SO4, 1e-3],
    [() => value('nitrate', 1, 'mg/L', 'mg/L as CaCO3'), factors.as_CaCO3_multipliers.NO3, 1e-3],
    [() => value('fluoride', 1, 'mg/L', 'mg/L as CaCO3'), factors.as_CaCO3_multipliers.F, 1e-3],
    [() => value('carbonDioxide', 1, 'mg/L as CO2', 'mg/L as CaCO3'), 2.2742, 1e-4],
    [() => value('alkalinity', 1, 'mg/L as HCO3', 'mg/L as CaCO3'), 0.82, 1e-3],
    [() => value('alkalinity', 1, 'meq/L', 'mg/L as CaCO3'), 50.043, 1e-9],
    [() => value('phosphate', 1, 'mg/L as P', 'mg/L as PO4'), 3.066, 1e-3],
    [() => value('nitrate', 1, 'mg/L as N', 'mg/L'), 4.4266, 1e-4],
    [() => value('ammonia', 1, 'mg/L as NH4', 'mg/L as N'), 0.7765, 1e-4],
    [() => value('hardness', 1, '°dH', 'mg/L as CaCO3'), 17.848, 1e-3],
    [() => value('hardness', 1, '°f', 'mg/L as CaCO3'), 10, 0],
    [() => value('hardness', 1, '°Clark', 'mg/L as CaCO3'), 14.254, 1e-3],
    [
      () => value('hardness', 1, 'gpg', 'mg/L as CaCO3'),
      factors.feed_conversions.grain_per_gal_mg_L,
      1e-3,
    ],
    [() => value('temperature', 60, '°F', '°C'), 15.5556, 1e-4],
    [() => value('temperature', 100, '°C', '°F'), 212, 0],
    [() => value('conductivity', 1.4, 'mS/cm', 'µS/cm'), 1400, 1e-9],
    [() => value('iron', 250, 'µg/L', 'mg/L'), 0.25, 0],
  ])('case %#', (found, expected, tolerance) => {
    expect(Math.abs(found() - expected)).toBeLessThanOrEqual(tolerance);
  });
});

describe('any unit and back', () => {
  const kinds = Object.keys(UNITS) as QuantityKind[];
  it.each(kinds)('%s comes back exactly', (kind) => {
    const units = Object.keys(UNITS[kind]) as UnitOf<typeof kind>[];
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 999_999_999 }),
        fc.constantFrom(...units),
        fc.constantFrom(...units),
        (digits, from, to) => {
          const x = digits / 1000;
          expect(value(kind, value(kind, x, from, to), to, from)).toBe(x);
        },
      ),
      { numRuns: 200, seed: 2 },
    );
  });
});

describe('a wrong pair', () => {
  it('does not compile', () => {
    expectTypeOf<UnitOf<'temperature'>>().toEqualTypeOf<'°C' | '°F'>();
    expectTypeOf<'°dH'>().not.toExtend<UnitOf<'chloride'>>();
    expectTypeOf<'mg/L as P'>().not.toExtend<UnitOf<'nitrate'>>();
  });

  it.each([
    ['chloride', '°dH', 'mg/L', 'from'],
    ['nitrate', 'mg/L as N', 'mg/L as P', 'to'],
    ['hardness', 'toString', 'mg/L as CaCO3', 'from'],
    ['taste', 'mg/L', 'mg/L', 'kind'],
    ['constructor', 'mg/L', 'mg/L', 'kind'],
  ])('%s from %s to %s is refused at run time', (kind, from, to, path) => {
    expect(convert(kind as 'hardness', 1, from as '°dH', to as '°dH')).toMatchObject({
      ok: false,
      reason: 'badInput',
      path,
    });
  });

  it('refuses what is not a number', () => {
    expect(convert('hardness', NaN, '°dH', '°f')).toMatchObject({ ok: false, path: 'value' });
    expect(convert('hardness', '5' as never, '°dH', '°f')).toMatchObject({ ok: false });
  });
});
