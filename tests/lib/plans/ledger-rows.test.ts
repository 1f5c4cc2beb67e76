import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatChange, formatNumber } from '@/lib/format';
import { sharedDecimals, writeRow } from '@/lib/plans/ledger-rows';

const asNumber = (text: string) => Number(text.replace('\u2212', '-').replace('+', ''));

describe('a written ledger row', () => {
  it('closes to the last digit shown: before + change = at equilibrium', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -500, max: 500, noNaN: true }),
        fc.double({ min: -500, max: 500, noNaN: true }),
        fc.integer({ min: 0, max: 6 }),
        (before, equilibrium, decimals) => {
          const row = writeRow(before, equilibrium, decimals);
          const scale = 10 ** decimals;
          const shown = [
            formatNumber(row.before, decimals),
            formatChange(row.change, decimals),
            formatNumber(row.equilibrium, decimals),
          ].map((text) => Math.round(asNumber(text) * scale));
          expect((shown[0] ?? NaN) + (shown[1] ?? NaN)).toBe(shown[2]);
          expect(Math.abs(row.before - before)).toBeLessThanOrEqual(0.5000001 / scale);
        },
      ),
    );
  });

  it.each([
    [0, 0, 0],
    [0.1, 0.004, 4],
    [123.4, 5600, 0],
    [12.5, 1, 2],
    [1e-9, 0, 8],
  ])('%d and %d share %d decimals', (before, equilibrium, decimals) => {
    expect(sharedDecimals(before, equilibrium)).toBe(decimals);
  });
});
