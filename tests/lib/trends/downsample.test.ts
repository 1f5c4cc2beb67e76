import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { downsample, segmentsOf, type TimedValue } from '@/lib/trends/downsample';

const HOUR = 3_600_000;
const GAP = 4 * HOUR;

/** A series with gaps, oldest first, strictly in time. */
const series = fc
  .array(
    fc.record({
      step: fc.oneof(
        { weight: 9, arbitrary: fc.integer({ min: 1, max: GAP }) },
        { weight: 1, arbitrary: fc.integer({ min: GAP + 1, max: 50 * GAP }) },
      ),
      value: fc.double({ min: -50, max: 50, noNaN: true }),
    }),
    { maxLength: 600 },
  )
  .map((steps) => {
    let at = 0;
    return steps.map(({ step, value }) => ({ at: (at += step), value }));
  });

const isMissed = ({ value }: TimedValue) => value > 45 || value < -45;

describe('thinning a series', () => {
  it('keeps every missed value, both ends of every segment, the extremes, and the order', () => {
    fc.assert(
      fc.property(series, fc.integer({ min: 4, max: 200 }), (values, limit) => {
        const thinned = downsample(values, limit, GAP, isMissed);
        const kept = new Set(thinned);
        expect(values.filter(isMissed).every((value) => kept.has(value))).toBe(true);
        for (const segment of segmentsOf(values, GAP)) {
          expect(kept.has(segment[0] ?? { at: 0, value: 0 })).toBe(true);
          expect(kept.has(segment.at(-1) ?? { at: 0, value: 0 })).toBe(true);
        }
        if (values.length > 0) {
          const of = (list: readonly TimedValue[]) => list.map(({ value }) => value);
          expect(Math.max(...of(thinned))).toBe(Math.max(...of(values)));
          expect(Math.min(...of(thinned))).toBe(Math.min(...of(values)));
        }
        expect(thinned).toEqual([...thinned].sort((a, b) => a.at - b.at));
        expect(thinned.every((value) => values.includes(value))).toBe(true);
      }),
      { numRuns: 300 },
    );
  });

  it('sends no more than the limit of an unbroken series that misses nothing', () => {
    const values = Array.from({ length: 50_000 }, (_, hour) => ({
      at: hour * HOUR,
      value: Math.sin(hour / 500) + 0.3 * Math.sin(hour * 7),
    }));
    const thinned = downsample(values, 2_500, GAP, () => false);
    expect(thinned.length).toBeLessThanOrEqual(2_500);
    expect(thinned.length).toBeGreaterThan(1_500);
  });

  it('returns a short series as it is', () => {
    const values = [
      { at: 0, value: 1 },
      { at: HOUR, value: 2 },
    ];
    expect(downsample(values, 2, GAP, () => false)).toEqual(values);
  });
});

describe('segments', () => {
  it('break where a pause is longer than the gap', () => {
    const times = [0, HOUR, 2 * HOUR, 20 * HOUR, 21 * HOUR];
    const lengths = segmentsOf(
      times.map((at) => ({ at, value: 0 })),
      GAP,
    ).map((segment) => segment.length);
    expect(lengths).toEqual([3, 2]);
  });
});
