import { describe, expect, it } from 'vitest';
import {
  formatAge,
  formatFormula,
  formatChange,
  formatDayTime,
  formatNumber,
  formatSignificant,
} from '@/lib/format';

describe('numbers on the screen', () => {
  it.each([
    [-0.35, 2, '\u22120.35'],
    [-0.001, 2, '0.00'],
    [7.1, 2, '7.10'],
    [1234.5, 0, '1235'],
  ])('%d with %d decimals is %s', (value, decimals, text) => {
    expect(formatNumber(value, decimals)).toBe(text);
  });

  it.each([
    [0.5, '+0.5'],
    [-0.5, '\u22120.5'],
    [0.01, '0.0'],
  ])('a change of %d shows its sign: %s', (value, text) => {
    expect(formatChange(value, 1)).toBe(text);
  });

  it.each([
    [0, '0'],
    [0.012345, '0.0123'],
    [12.345, '12.3'],
    [1.2e-7, '1.20 × 10^\u22127'],
  ])('%d in three figures is %s', (value, text) => {
    expect(formatSignificant(value)).toBe(text);
  });
});

describe('times on the screen', () => {
  const now = new Date('2026-12-01T12:00:00Z');
  it.each([
    ['2026-12-01T11:40:00Z', '20 min ago'],
    ['2026-12-01T06:00:00Z', '6 h ago'],
    ['2026-11-28T12:00:00Z', '3 d ago'],
    ['2026-12-01T12:05:00Z', '0 min ago'],
  ])('%s is %s', (at, words) => {
    expect(formatAge(new Date(at), now)).toBe(words);
  });

  it('stands in the plant’s own zone', () => {
    expect(formatDayTime(new Date('2026-07-01T05:30:00Z'), 'Europe/London')).toBe(
      '1 Jul 2026, 06:30',
    );
  });
});

describe('chemical formulas', () => {
  it.each([
    ['as Ca(OH)2', 'as Ca(OH)₂'],
    ['Al2(SO4)3·14.3H2O', 'Al₂(SO₄)₃·14.3H₂O'],
    ['as Cl2', 'as Cl₂'],
    ['as product', 'as product'],
    ['as Ca(OH)₂', 'as Ca(OH)₂'],
  ])('%s is written %s', (ascii, written) => {
    expect(formatFormula(ascii)).toBe(written);
  });
});
