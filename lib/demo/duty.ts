import { DAY_MS, HOUR_MS } from './calendar';

const SHIFT_MS = 8 * HOUR_MS;
const FIRST_SHIFT_BEGINS_MS = 5.5 * HOUR_MS;
const DAYS_TO_NEXT_SHIFT = 4;

/** Who is on duty at a works at a moment: three shifts a day, and everyone moves on a shift every few days. */
export const dutyRota =
  (people: readonly string[], worksPosition: number) =>
  (momentMs: number): string => {
    const shift = Math.floor((momentMs - FIRST_SHIFT_BEGINS_MS) / SHIFT_MS);
    const block = Math.floor(momentMs / (DAYS_TO_NEXT_SHIFT * DAY_MS));
    return people[(shift + block + worksPosition) % people.length] ?? '';
  };
