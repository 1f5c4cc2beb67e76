import { describe, expect, it } from 'vitest';
import { checkResult, unusualRemark } from '@/lib/samples/check-result';
import type { QuantityKey } from '@/lib/samples/quantities';

const written = (quantity: QuantityKey, text: string, unit: string) =>
  checkResult({ quantity, text, unit, qualifier: '' });

describe('a written result', () => {
  it.each([
    ['calcium', '100', 'mg/L as CaCO₃', 40.0436],
    ['magnesium', '100', 'mg/L as CaCO₃', 24.284],
    ['temperature', '50', '°F', 10],
    ['phosphate', '3.066', 'mg/L as PO₄', 1],
    ['nitrate', '1', 'mg/L as N', 4.427],
    ['iron', '300', 'µg/L', 0.3],
    ['conductivity', '14.12', 'mS/m', 141.2],
  ] as const)(
    '%s %s %s is kept as %d canonical (factors: IUPAC atomic weights)',
    (quantity, text, unit, value) => {
      const checked = written(quantity, text, unit);
      expect(checked).toMatchObject({ kind: 'value', text });
      expect(checked.kind === 'value' && checked.value).toBeCloseTo(value, 3);
    },
  );

  it.each([
    ['pH', '71', 'pH', /pH lies between 2 and 13\. Is it 7\.1\?/],
    ['temperature', '-3', '°C', /Temperature lies between 0 and 45 °C\./],
    ['alkalinity', '-1', 'mg/L as CaCO₃', /Total alkalinity cannot be negative\./],
    ['alkalinity', '12,5', 'mg/L as CaCO₃', /12\.5/],
    ['calcium', '12', 'mg/L as Fe', /Calcium cannot be written in mg\/L as Fe\./],
  ] as const)('%s %s %s stops with a sentence', (quantity, text, unit, message) => {
    const checked = written(quantity, text, unit);
    expect(checked.kind).toBe('problem');
    expect(checked).toHaveProperty('message', expect.stringMatching(message));
  });
});

describe('a value beside its usual range', () => {
  const usual = { usualLow: 6.3, usualHigh: 7, decimals: 1 };
  it.each([
    [6.2, 'below the usual 6.3 to 7.0'],
    [7.1, 'above the usual 6.3 to 7.0'],
    [6.3, null],
    [7, null],
  ])('%d is remarked on as %j', (value, remark) => {
    expect(unusualRemark(value, usual)).toBe(remark);
  });

  it('has no remark where the plant named no range', () => {
    expect(unusualRemark(99, { usualLow: null, usualHigh: null, decimals: 0 })).toBeNull();
  });
});
