import { describe, expect, it } from 'vitest';
import { createRandom, createWander } from '@/lib/demo/random';

const draws = (name: string, count = 20): number[] => {
  const random = createRandom(name);
  return Array.from({ length: count }, () => random.uniform());
};
const mean = (values: readonly number[]) => values.reduce((sum, x) => sum + x, 0) / values.length;
const deviation = (values: readonly number[]) => {
  const middle = mean(values);
  return Math.sqrt(mean(values.map((x) => (x - middle) ** 2)));
};

describe('the demo’s own chance', () => {
  it('gives the same numbers for the same name', () => {
    expect(draws('weir')).toEqual(draws('weir'));
  });

  it.each(['weir ', 'Weir', 'wier', 'weir/'])('gives other numbers for %o', (name) => {
    expect(draws(name)).not.toEqual(draws('weir'));
  });

  it('leaves a stream where it was when another is drawn from it', () => {
    const forked = createRandom('weir');
    forked.fork('sluice').uniform();
    expect(forked.uniform()).toBe(draws('weir')[0]);
  });

  it('gives unlike streams to unlike names of children', () => {
    const random = createRandom('weir');
    expect(random.fork('a').uniform()).not.toBe(random.fork('b').uniform());
  });

  it('fills [0, 1) evenly', () => {
    const values = draws('even', 20_000);
    const counts = Array.from(
      { length: 10 },
      (_, tenth) => values.filter((x) => Math.floor(x * 10) === tenth).length,
    );
    expect(counts.reduce((sum, count) => sum + count, 0)).toBe(values.length);
    // 2000 expected, standard deviation 42: five of them either way.
    expect(Math.min(...counts)).toBeGreaterThan(1790);
    expect(Math.max(...counts)).toBeLessThan(2210);
  });

  it('has normal deviates of mean 0 and standard deviation 1', () => {
    const random = createRandom('normal');
    const values = Array.from({ length: 20_000 }, () => random.normal());
    expect(Math.abs(mean(values))).toBeLessThan(0.04);
    expect(deviation(values)).toBeCloseTo(1, 1);
    expect(values.filter((x) => Math.abs(x) < 1.96).length / values.length).toBeCloseTo(0.95, 1);
  });

  it('wanders: tomorrow resembles today, and the long run has unit deviation', () => {
    const wander = createWander(createRandom('wander'), 0.9);
    const values = Array.from({ length: 20_000 }, wander);
    const steps = values.slice(1).map((x, index) => x - (values[index] ?? 0));
    expect(Math.abs(deviation(values) - 1)).toBeLessThan(0.12);
    // Standard deviation of a step: the square root of 2 (1 − memory).
    expect(deviation(steps)).toBeCloseTo(Math.sqrt(0.2), 1);
  });

  it('keeps bytes in their range and uses all of it', () => {
    const bytes = [...createRandom('bytes').bytes(20_000)];
    expect(Math.min(...bytes)).toBe(0);
    expect(Math.max(...bytes)).toBe(255);
  });
});
