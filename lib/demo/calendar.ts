import { localFromMoment, momentFromLocal } from '@/lib/plants/local-time';
import { dayOfYear } from './season';

export const MINUTE_MS = 60_000;
export const HOUR_MS = 3_600_000;
export const DAY_MS = 86_400_000;

export interface CalendarDay {
  /** 0 for the last day, 1 for the day before it. */
  readonly daysBeforeEnd: number;
  readonly localDate: string;
  readonly dayOfYear: number;
  /** Local noon less twelve hours: an hour beside local midnight on the days the clocks change. */
  readonly midnightMs: number;
  /** When the date really begins. */
  readonly beginsMs: number;
}

/** The plant-local days up to and including that of `now`, oldest first. */
export function calendarUpTo(now: Date, days: number, timeZone: string): CalendarDay[] {
  const lastDate = localFromMoment(now, timeZone).slice(0, 10);
  const lastUtcMs = Date.parse(`${lastDate}T00:00:00Z`);
  return Array.from({ length: days }, (_, index) => {
    const daysBeforeEnd = days - 1 - index;
    const localDate = new Date(lastUtcMs - daysBeforeEnd * DAY_MS).toISOString().slice(0, 10);
    const noon = momentFromLocal(`${localDate}T12:00`, timeZone);
    if (noon === null) throw new RangeError(`${localDate} has no noon in ${timeZone}.`);
    const midnightMs = noon.getTime() - 12 * HOUR_MS;
    return {
      daysBeforeEnd,
      localDate,
      dayOfYear: dayOfYear(localDate),
      midnightMs,
      beginsMs: momentFromLocal(`${localDate}T00:00`, timeZone)?.getTime() ?? midnightMs,
    };
  });
}

/** Local clock time of a day as a moment, in milliseconds. */
export const clockMs = (day: CalendarDay, hour: number, minute: number): number =>
  day.midnightMs + hour * HOUR_MS + minute * MINUTE_MS;

/**
 * When a round planned for `plannedMs` was really made. On the last day a round still ahead, or too long past for a
 * works that is being watched, is moved to `minutesBeforeNow` before now; no round is ever in the future.
 */
export function roundMs(
  day: CalendarDay,
  plannedMs: number,
  now: Date,
  minutesBeforeNow: number,
): number {
  const nowMs = now.getTime();
  const isFresh = plannedMs <= nowMs && plannedMs > nowMs - 4 * HOUR_MS;
  if (day.daysBeforeEnd > 0 || isFresh) return plannedMs;
  return Math.min(
    Math.max(nowMs - minutesBeforeNow * MINUTE_MS, day.beginsMs + MINUTE_MS),
    nowMs - MINUTE_MS / 2,
  );
}
