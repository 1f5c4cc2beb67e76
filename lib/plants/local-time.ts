import { TZDate } from '@date-fns/tz';
import { format } from 'date-fns';

/** Plant-local wall-clock text `2026-12-01T06:30` as a moment, by the plant's zone and its rules on that day. */
export function momentFromLocal(local: string, timeZone: string): Date | null {
  const match = /^(\d{4})-(\d{2})-(\d{2})T(\d{2}):(\d{2})$/.exec(local);
  if (match === null) return null;
  const [year = 0, month = 1, day = 1, hour = 0, minute = 0] = match.slice(1).map(Number);
  const moment = new Date(new TZDate(year, month - 1, day, hour, minute, timeZone).getTime());
  // A 31 June rolls over and a skipped hour moves on: neither is what was written.
  return Number.isNaN(moment.getTime()) || localFromMoment(moment, timeZone) !== local
    ? null
    : moment;
}

export const localFromMoment = (moment: Date, timeZone: string): string =>
  format(new TZDate(moment, timeZone), "yyyy-MM-dd'T'HH:mm");
