import { describe, expect, it } from 'vitest';
import { judge } from '@/lib/plants/judge';
import { dueState } from '@/lib/today/rules';

describe('a value against its target', () => {
  it.each([
    [7.7, { lowest: 7.8, highest: 8.6 }, 'below'],
    [7.8, { lowest: 7.8, highest: 8.6 }, 'within'],
    [8.6, { lowest: 7.8, highest: 8.6 }, 'within'],
    [8.61, { lowest: 7.8, highest: 8.6 }, 'above'],
    [99, { lowest: 7.8, highest: null }, 'within'],
    [-99, { lowest: null, highest: 1 }, 'within'],
  ] as const)('%d in %j is %s', (value, target, verdict) => {
    expect(judge(value, target)).toBe(verdict);
  });
});

describe('the next sample', () => {
  const now = new Date('2026-12-01T12:00:00Z');
  it.each([
    ['2026-12-01T06:30:00Z', 24, 'done'],
    ['2026-11-30T15:00:00Z', 24, 'soon'],
    ['2026-11-30T12:00:00Z', 24, 'overdue'],
    ['2026-12-01T05:00:00Z', 8, 'soon'],
    ['2026-11-20T06:30:00Z', 168, 'overdue'],
  ])('last at %s, every %d h, is %s', (last, everyH, state) => {
    expect(dueState(new Date(last), everyH, now).state).toBe(state);
  });

  it('is overdue where none was ever taken', () => {
    expect(dueState(null, 24, now)).toEqual({ state: 'overdue', dueAt: null });
  });
});
