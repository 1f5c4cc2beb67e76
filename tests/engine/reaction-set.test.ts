import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { accepted } from './support';
import { solveReactions, type GivenReaction } from '@/lib/engine';

const acid = (K: number): GivenReaction => ({ coefficients: { HA: -1, H: 1, A: 1 }, K });

describe('the table of one acid', () => {
  it.each([
    [0.1, 1.8e-5],
    [0.001, 1.8e-5],
    [1e-6, 1e-3],
    [2, 1e-14],
    [0.5, 1e9],
  ])('at %d mol/L with K %d is the root of its quadratic', (amount, K) => {
    const { rows, extents, quotients } = accepted(solveReactions([acid(K)], { HA: amount }));
    // x² + Kx − KC = 0, in the form that does not cancel.
    const root = (2 * K * amount) / (K + Math.sqrt(K * K + 4 * K * amount));
    expect(Math.abs((extents[0] ?? NaN) / root - 1)).toBeLessThan(1e-9);
    expect((quotients[0] ?? NaN) / K).toBeCloseTo(1, 8);
    for (const row of rows) {
      expect(Math.abs(row.before + row.change - row.equilibrium)).toBeLessThan(1e-12 * amount);
      expect(row.equilibrium).toBeGreaterThan(0);
    }
  });

  // Initial over K above 500: neglecting the change against the initial amount is safe within 5 % (common practice).
  it('agrees with the neglect of the change within 5 % where that is allowed', () => {
    fc.assert(
      fc.property(
        fc.double({ min: -8, max: -2, noNaN: true }),
        fc.double({ min: 500, max: 1e6, noNaN: true }),
        (logK, ratio) => {
          const K = 10 ** logK;
          const { extents } = accepted(solveReactions([acid(K)], { HA: ratio * K }));
          const shortcut = Math.sqrt(K * ratio * K);
          expect(Math.abs(shortcut / (extents[0] ?? NaN) - 1)).toBeLessThan(0.05);
        },
      ),
      { numRuns: 100, seed: 9 },
    );
  });
});

describe('any set of reactions', () => {
  it('meets its quotients and conserves atoms, from either side', () => {
    const carbonate = (k1: number, k2: number): GivenReaction[] => [
      { coefficients: { CO2: -1, H: 1, HCO3: 1 }, K: k1 },
      { coefficients: { HCO3: -1, H: 1, CO3: 1 }, K: k2 },
      { coefficients: { H: 1, OH: 1 }, K: 1e-14 },
    ];
    fc.assert(
      fc.property(
        fc.double({ min: -8, max: -5, noNaN: true }),
        fc.double({ min: -12, max: -9, noNaN: true }),
        fc.double({ min: -5, max: -1, noNaN: true }),
        fc.double({ min: -5, max: -1, noNaN: true }),
        (p1, p2, carbon, base) => {
          const reactions = carbonate(10 ** p1, 10 ** p2);
          const initial = { CO2: 10 ** carbon, OH: 10 ** base };
          const result = accepted(solveReactions(reactions, initial));
          const amount = (key: string) =>
            result.rows.find((row) => row.key === key)?.equilibrium ?? NaN;
          const total = amount('CO2') + amount('HCO3') + amount('CO3');
          expect(Math.abs(total / initial.CO2 - 1)).toBeLessThan(1e-10);
          reactions.forEach((reaction, i) => {
            expect((result.quotients[i] ?? NaN) / reaction.K).toBeCloseTo(1, 8);
          });
        },
      ),
      { numRuns: 100, seed: 10 },
    );
  });

  it('runs backwards from products', () => {
    const { extents } = accepted(
      solveReactions([{ coefficients: { Ag: 1, Cl: 1 }, K: 1.8e-10 }], { Ag: 0.01, Cl: 0.02 }),
    );
    expect(extents[0]).toBeLessThan(0);
  });

  it('takes fractional coefficients and huge constants', () => {
    const { rows } = accepted(
      solveReactions([{ coefficients: { H2: -1, O2: -0.5, W: 1 }, K: 1e40 }], { H2: 2, O2: 2 }),
    );
    expect(rows.find((row) => row.key === 'W')?.equilibrium).toBeCloseTo(2, 9);
    expect(rows.find((row) => row.key === 'O2')?.equilibrium).toBeCloseTo(1, 9);
  });
});

describe('refused', () => {
  it.each([
    ['no reaction', [], { A: 1 }, 'reactions'],
    ['a negative K', [acid(-1)], { HA: 1 }, 'reactions.0.K'],
    ['K zero', [acid(0)], { HA: 1 }, 'reactions.0.K'],
    ['an endless K', [acid(Infinity)], { HA: 1 }, 'reactions.0.K'],
    ['a negative amount', [acid(1)], { HA: -1 }, 'initial.HA'],
    ['an amount as text', [acid(1)], { HA: '1' }, 'initial.HA'],
    ['no amounts', [acid(1)], null, 'initial'],
    ['nothing there at all', [acid(1)], {}, 'initial'],
    [
      'a reactant that cannot come to be',
      [{ coefficients: { A: -1, B: -1, C: 1 }, K: 2 }],
      { A: 1 },
      'initial',
    ],
    ['the same reaction twice', [acid(1), acid(1)], { HA: 1 }, 'reactions'],
    [
      'a coefficient that is none',
      [{ coefficients: { A: 0 }, K: 1 }],
      { A: 1 },
      'reactions.0.coefficients.A',
    ],
    ['no coefficients', [{ K: 1 }], { A: 1 }, 'reactions.0'],
  ])('%s', (_, reactions, initial, path) => {
    expect(solveReactions(reactions as never, initial as never)).toMatchObject({ ok: false, path });
  });
});
