import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { csvLine } from '@/lib/csv';

describe('a CSV line', () => {
  // OWASP ASVS 5.0 V1.2.10: = + - @, tab and NUL at the start of a cell.
  it.each(['=1+1', '+1+1', '-1+1', '@SUM(A1)', '\t=1', '\0=1', '-', '+'])('disarms %j', (cell) => {
    expect(csvLine([cell]).replaceAll('"', '')[0]).toBe("'");
  });

  it.each([
    [-0.35, '-0.35'],
    ['-0.35', '-0.35'],
    ['-1e-7', '-1e-7'],
    [7.1, '7.1'],
    ['7.10', '7.10'],
    [null, ''],
  ])('leaves the number %j a number', (cell, text) => {
    expect(csvLine([cell])).toBe(`${text}\r\n`);
  });

  it('quotes as RFC 4180 says', () => {
    expect(csvLine(['a,b', 'say "x"', 'two\nlines', 'plain'])).toBe(
      '"a,b","say ""x""","two\nlines",plain\r\n',
    );
  });

  it('starts no formula, whatever the cell', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const cell = csvLine([text]).slice(0, -2).replace(/^"/, '');
        const isNumber = /^-?\d+(\.\d+)?([eE][+-]?\d+)?$/.test(text);
        expect(isNumber || !/^[=+\-@\t\0]/.test(cell)).toBe(true);
      }),
    );
  });
});
