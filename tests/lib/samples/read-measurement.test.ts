import { describe, expect, it } from 'vitest';
import { readMeasurement } from '@/lib/samples/read-measurement';

describe('a typed figure', () => {
  it.each([
    ['7.10', 7.1, '', '7.10'],
    [' 12 ', 12, '', '12'],
    ['.5', 0.5, '', '.5'],
    ['\u22120.35', -0.35, '', '-0.35'],
    ['<0.05', 0.05, '<', '0.05'],
    ['< 0.05', 0.05, '<', '0.05'],
    ['> 2000', 2000, '>', '2000'],
    ['ND 0.01', 0.01, 'nd', '0.01'],
    ['nd <0.01', 0.01, '<', '0.01'],
    ['e 3.2', 3.2, 'e', '3.2'],
    ['~3.2', 3.2, 'e', '3.2'],
  ])('%j reads as %d with qualifier %j and keeps its figures', (typed, value, qualifier, text) => {
    expect(readMeasurement(typed)).toEqual({ kind: 'value', value, qualifier, text });
  });

  it.each(['', '   ', '\u00a0'])('%j is an empty field', (typed) => {
    expect(readMeasurement(typed)).toEqual({ kind: 'empty' });
  });

  it.each([
    ['-', /no figures yet/],
    ['<', /no figures yet/],
    ['12,5', /point for decimals here: 12\.5/],
    ['1,234', /two ways\. Write 1234 or 1\.234/],
    ['1,2,3', /more than one comma/],
    ['1.2.3', /not a number/],
    ['7e3', /not a number/],
    ['seven', /not a number/],
    ['0x10', /not a number/],
    ['NaN', /not a number/],
    ['9'.repeat(400), /too large/],
  ])('%j is explained, never guessed at', (typed, message) => {
    const read = readMeasurement(typed);
    expect(read.kind).toBe('problem');
    expect(read).toHaveProperty('message', expect.stringMatching(message));
  });

  it('takes the qualifier chosen beside it, unless one was typed', () => {
    expect(readMeasurement('0.05', 'e')).toMatchObject({ qualifier: 'e' });
    expect(readMeasurement('<0.05', 'e')).toMatchObject({ qualifier: '<' });
  });
});
