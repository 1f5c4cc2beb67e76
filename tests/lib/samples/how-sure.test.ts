import { describe, expect, it } from 'vitest';
import { howSureOfSample } from '@/lib/samples/how-sure';
import type { MeasuredValues } from '@/lib/samples/solve-sample';

const measured = (value: number) => ({ value, qualifier: '' as const });
const values: MeasuredValues = {
  temperature: measured(12),
  pH: measured(7.7),
  alkalinity: measured(92),
  calcium: measured(38),
  chloride: measured(21),
};

describe('how sure a sample is', () => {
  it('puts the solved value inside the band and names the inputs that matter most', () => {
    const answer = howSureOfSample(values, ['calciteIndex', 'carbonDioxide'], 1000);
    if (!answer.ok) throw new Error(answer.message);
    const [index] = answer.bands;
    expect(index?.key).toBe('calciteIndex');
    expect(index?.low).toBeLessThan(index?.median ?? NaN);
    expect(index?.median).toBeLessThan(index?.high ?? NaN);
    expect(index?.matters[0]?.quantity).toBe('pH');
  });

  // The saturation index moves one for one with pH (its definition), and pH is uncertain by 0.05 (one sigma).
  it('is at least as wide as pH alone makes it', () => {
    const answer = howSureOfSample(values, ['calciteIndex'], 4000);
    if (!answer.ok) throw new Error(answer.message);
    const [index] = answer.bands;
    const width = (index?.high ?? NaN) - (index?.low ?? NaN);
    expect(width).toBeGreaterThan(2 * 1.645 * 0.05 * 0.95);
    expect(width).toBeLessThan(2 * 1.645 * 0.08);
  });

  it('is the same each time, tells its progress and stops when asked', () => {
    const shares: number[] = [];
    const keep = (share: number) => shares.push(share) > 0;
    const first = howSureOfSample(values, ['langelier'], 200, keep);
    expect(howSureOfSample(values, ['langelier'], 200)).toEqual(first);
    expect(shares.length).toBeGreaterThan(3);
    expect(howSureOfSample(values, ['langelier'], 200, () => false).ok).toBe(false);
  });

  it('says what is missing', () => {
    expect(howSureOfSample({ pH: measured(7) }, ['langelier'], 100)).toMatchObject({ ok: false });
  });
});
