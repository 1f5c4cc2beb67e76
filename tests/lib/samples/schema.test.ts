import { describe, expect, it } from 'vitest';
import { sampleInput, type SampleInput } from '@/lib/samples/schema';

const sheet = (results: SampleInput['results']): SampleInput => ({
  plantSlug: 'quarrel-hill',
  pointSlug: 'raw',
  clientKey: '3f0a5e0e-6f5f-4c7e-9f0a-111111111111',
  takenAtLocal: '2026-12-01T06:30',
  comment: '',
  results,
});

describe('a sample sheet', () => {
  it('keeps figures as typed, moves a typed qualifier out of the text and leaves empty fields out', () => {
    const kept = sampleInput.parse(
      sheet([
        { quantity: 'pH', text: '7.10', unit: 'pH', qualifier: '' },
        { quantity: 'iron', text: '<0.010', unit: 'mg/L', qualifier: '' },
        { quantity: 'turbidity', text: ' ', unit: 'NTU', qualifier: '' },
      ]),
    );
    expect(kept.results).toEqual([
      { quantity: 'pH', text: '7.10', unit: 'pH', qualifier: '', value: 7.1 },
      { quantity: 'iron', text: '0.010', unit: 'mg/L', qualifier: '<', value: 0.01 },
    ]);
  });

  it('names the field of every problem at once', () => {
    const parsed = sampleInput.safeParse(
      sheet([
        { quantity: 'pH', text: '71', unit: 'pH', qualifier: '' },
        { quantity: 'alkalinity', text: '12,5', unit: 'mg/L as CaCO₃', qualifier: '' },
        { quantity: 'temperature', text: '-3', unit: '°C', qualifier: '' },
        { quantity: 'calcium', text: '-', unit: 'mg/L as Ca', qualifier: '' },
      ]),
    );
    expect(parsed.error?.issues.map(({ path }) => path.join('.'))).toEqual([
      'results.0.text',
      'results.1.text',
      'results.2.text',
      'results.3.text',
    ]);
  });

  it('is not kept without a single result', () => {
    const parsed = sampleInput.safeParse(
      sheet([{ quantity: 'pH', text: '', unit: 'pH', qualifier: '' }]),
    );
    expect(parsed.error?.issues[0]?.message).toMatch(/at least one result/);
  });

  it.each(['2026-12-01', '2026-12-01 06:30', 'yesterday'])(
    'refuses %j as a time',
    (takenAtLocal) => {
      const parsed = sampleInput.safeParse({
        ...sheet([{ quantity: 'pH', text: '7', unit: 'pH', qualifier: '' }]),
        takenAtLocal,
      });
      expect(parsed.error?.issues[0]?.path).toEqual(['takenAtLocal']);
    },
  );
});
