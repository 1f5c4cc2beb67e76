import { describe, expect, it } from 'vitest';
import { calendarUpTo, clockMs, roundMs } from '@/lib/demo/calendar';
import { dayOfYear, yearlyWave } from '@/lib/demo/season';
import { localFromMoment } from '@/lib/plants/local-time';

const LONDON = 'Europe/London';

describe('the demo’s calendar', () => {
  it('ends on the plant-local day of now, not on the day in UTC', () => {
    const days = calendarUpTo(new Date('2026-07-14T23:30:00Z'), 3, LONDON);
    expect(days.map(({ localDate }) => localDate)).toEqual([
      '2026-07-13',
      '2026-07-14',
      '2026-07-15',
    ]);
    expect(days.map(({ daysBeforeEnd }) => daysBeforeEnd)).toEqual([2, 1, 0]);
  });

  it('keeps the morning round at half past six through both changes of the clocks', () => {
    const days = calendarUpTo(new Date('2026-12-01T12:00:00Z'), 365, LONDON);
    const times = days.map((day) => localFromMoment(new Date(clockMs(day, 6, 30)), LONDON));
    expect(times).toEqual(days.map(({ localDate }) => `${localDate}T06:30`));
  });

  it.each([
    ['2026-01-01', 1],
    ['2026-12-31', 365],
    ['2024-02-29', 60],
    ['2024-12-31', 366],
  ])('%s is day %i of its year', (date, day) => {
    expect(dayOfYear(date)).toBe(day);
  });

  it('has its wave highest on the peak day and lowest half a year away', () => {
    expect(yearlyWave(217, 217)).toBe(1);
    expect(yearlyWave(217 - 182.625, 217)).toBeCloseTo(-1, 12);
  });
});

describe('the round of the last day', () => {
  it.each([
    ['half a minute into the day', '2026-12-01T00:00:40Z'],
    ['in the night', '2026-12-01T03:00:00Z'],
    ['just before the round', '2026-12-01T06:29:00Z'],
    ['in the evening', '2026-12-01T21:00:00Z'],
    ['in summer time', '2026-07-01T22:50:00Z'],
    ['on the short day', '2026-03-29T02:30:00Z'],
    ['on the long day', '2026-10-25T01:30:00Z'],
  ])('is past, on the day itself and fresh when now is %s', (_, iso) => {
    const now = new Date(iso);
    const day = calendarUpTo(now, 1, LONDON)[0];
    if (day === undefined) throw new Error('no day');
    const takenMs = roundMs(day, clockMs(day, 6, 30), now, 120);
    expect(takenMs).toBeLessThan(now.getTime());
    expect(takenMs).toBeGreaterThan(now.getTime() - 4 * 3_600_000);
    expect(localFromMoment(new Date(takenMs), LONDON).slice(0, 10)).toBe(day.localDate);
  });

  it('stays where it was planned while that is fresh', () => {
    const now = new Date('2026-12-01T08:00:00Z');
    const day = calendarUpTo(now, 1, LONDON)[0];
    if (day === undefined) throw new Error('no day');
    const plannedMs = clockMs(day, 6, 30);
    expect(roundMs(day, plannedMs, now, 120)).toBe(plannedMs);
  });

  it('is left alone on any earlier day', () => {
    const now = new Date('2026-12-01T21:00:00Z');
    const yesterday = calendarUpTo(now, 2, LONDON)[0];
    if (yesterday === undefined) throw new Error('no day');
    const plannedMs = clockMs(yesterday, 6, 30);
    expect(roundMs(yesterday, plannedMs, now, 120)).toBe(plannedMs);
  });
});
