import { describe, expect, it } from 'vitest';
import { localFromMoment, momentFromLocal } from '@/lib/plants/local-time';

describe('plant-local time', () => {
  it.each([
    ['2026-12-01T06:30', 'Europe/London', '2026-12-01T06:30:00.000Z'],
    ['2026-07-01T06:30', 'Europe/London', '2026-07-01T05:30:00.000Z'],
    ['2026-07-01T06:30', 'America/Denver', '2026-07-01T12:30:00.000Z'],
    ['2026-07-01T06:30', 'Asia/Kolkata', '2026-07-01T01:00:00.000Z'],
  ])('%s in %s is %s', (local, zone, utc) => {
    const moment = momentFromLocal(local, zone);
    expect(moment?.toISOString()).toBe(utc);
    expect(moment && localFromMoment(moment, zone)).toBe(local);
  });

  it.each([
    ['2026-06-31T06:30', 'a day that does not exist'],
    ['2026-03-29T01:30', 'an hour the spring change skips (Europe/London)'],
    ['2026-13-01T06:30', 'a thirteenth month'],
    ['soon', 'no time at all'],
  ])('%s is %s and gives null', (local) => {
    expect(momentFromLocal(local, 'Europe/London')).toBeNull();
  });
});
