import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { fnv1a64 } from '@/lib/engine/numeric/hash';
import { factorise, substitute } from '@/lib/engine/numeric/lu';
import { findRoot } from '@/lib/engine/numeric/root';

describe('LU', () => {
  it('solves well-conditioned systems of any size in a wider stride', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 1, max: 9 }),
        fc.array(fc.double({ min: -1, max: 1, noNaN: true }), { minLength: 110, maxLength: 110 }),
        (n, pool) => {
          const stride = n + 3;
          const a = new Float64Array(stride * stride);
          const x = Float64Array.from({ length: n }, (_, i) => (pool[i] ?? 0) + 2);
          for (let i = 0; i < n; i++) {
            for (let j = 0; j < n; j++) {
              a[i * stride + ((j + 1) % n)] = (pool[10 + i * 9 + j] ?? 0) + (i === j ? 12 : 0);
            }
          }
          const b = new Float64Array(n);
          for (let i = 0; i < n; i++) {
            for (let j = 0; j < n; j++) {
              b[i] = (b[i] ?? 0) + (a[i * stride + j] ?? 0) * (x[j] ?? 0);
            }
          }
          const pivots = new Int32Array(n);
          expect(factorise(a, n, stride, pivots)).toBe(true);
          substitute(a, n, stride, pivots, b);
          for (let i = 0; i < n; i++) expect(b[i]).toBeCloseTo(x[i] ?? NaN, 10);
        },
      ),
      { numRuns: 100, seed: 4 },
    );
  });

  it.each([
    ['singular', [1, 2, 2, 4]],
    ['not finite', [Infinity, 1, 1, 1]],
    ['not a number', [NaN, 1, NaN, 1]],
  ])('says so when the matrix is %s', (_, values) => {
    expect(factorise(Float64Array.from(values), 2, 2, new Int32Array(2))).toBe(false);
  });
});

describe('a bracketed root', () => {
  it.each([
    ['a line', (x: number) => 3 * x - 1, 0, 1, 1 / 3],
    ['a cube root', (x: number) => x ** 3 - 2, 0, 2, Math.cbrt(2)],
    ['a steep exponential', (x: number) => Math.exp(30 * x) - 1e6, 0, 1, Math.log(1e6) / 30],
    ['a flat ninth power', (x: number) => (x - 0.3) ** 9, 0, 1, 0.3],
    ['a step', (x: number) => (x < 0.7 ? -1 : 1), 0, 1, 0.7],
    ['a bracket the other way round', (x: number) => x - 0.2, 1, 0, 0.2],
  ])('of %s is found', (_, f, a, b, root) => {
    const found = findRoot(f, { a, fa: f(a), b, fb: f(b) }, 1e-12);
    if (!found.ok) throw new Error(found.reason);
    // A ninth power is zero to rounding over a wide span.
    expect(Math.abs(found.x - root)).toBeLessThan(_.includes('ninth') ? 0.03 : 1e-10);
    expect(found.evaluations).toBeLessThan(100);
  });

  it('is refused without a change of sign, and when the function gives no number', () => {
    const none = findRoot((x) => x * x + 1, { a: 0, fa: 1, b: 1, fb: 2 }, 1e-9);
    expect(none).toEqual({ ok: false, reason: 'noSignChange' });
    const broken = findRoot(() => NaN, { a: 0, fa: -1, b: 1, fb: 1 }, 1e-9);
    expect(broken).toEqual({ ok: false, reason: 'notFinite' });
  });
});

it('hashes by FNV-1a: the empty text is the offset basis', () => {
  expect(fnv1a64('')).toBe('cbf29ce484222325');
  expect(fnv1a64('a')).not.toBe(fnv1a64('b'));
});
