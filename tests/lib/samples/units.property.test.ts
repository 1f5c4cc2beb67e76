import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fromCanonical, QUANTITIES, QUANTITY_KEYS, toCanonical } from '@/lib/samples/quantities';

const pairs = QUANTITY_KEYS.flatMap((quantity) =>
  QUANTITIES[quantity].units.map(({ label }) => [quantity, label] as const),
);

describe('a value through its canonical unit and back', () => {
  it.each(pairs)('%s in %s returns to what was written', (quantity, unit) => {
    fc.assert(
      fc.property(fc.double({ min: 1e-3, max: 1e4, noNaN: true }), (written) => {
        const back = fromCanonical(quantity, toCanonical(quantity, written, unit), unit);
        expect(Math.abs(back - written)).toBeLessThanOrEqual(1e-12 * Math.max(written, 32));
      }),
    );
  });

  it('refuses a unit that is not the quantity’s', () => {
    expect(() => toCanonical('pH', 7, 'mg/L')).toThrow(/pH cannot be written in mg\/L/);
  });
});
