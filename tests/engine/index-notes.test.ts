import { describe, expect, it } from 'vitest';
import { riverWater, waterOf } from './support';
import { INDEX_NOTES, indicesOf } from '@/lib/engine';

describe('the notes on the indices', () => {
  it('say formula, source, use and sign of every index the engine computes', () => {
    const computed = Object.keys(indicesOf(waterOf(riverWater))).sort();
    expect(Object.keys(INDEX_NOTES).sort()).toEqual(computed);
    for (const note of Object.values(INDEX_NOTES)) {
      for (const words of Object.values<string>({ ...note }))
        expect(words.length).toBeGreaterThan(5);
    }
  });

  it('promise nothing about lead or copper', () => {
    const promise = /\b(protects?|safe|prevents?)\b/i;
    expect(Object.values(INDEX_NOTES).filter((note) => promise.test(JSON.stringify(note)))).toEqual(
      [],
    );
  });
});
