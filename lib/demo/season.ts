const DAYS_PER_YEAR = 365.25;

/** Day of the year (1 … 366) of a plant-local date `2026-12-01`. */
export function dayOfYear(localDate: string): number {
  const year = localDate.slice(0, 4);
  const elapsedMs = Date.parse(`${localDate}T00:00:00Z`) - Date.parse(`${year}-01-01T00:00:00Z`);
  return elapsedMs / 86_400_000 + 1;
}

/** The year's wave: +1 on the peak day, −1 half a year from it. */
export const yearlyWave = (day: number, peakDay: number): number =>
  Math.cos((2 * Math.PI * (day - peakDay)) / DAYS_PER_YEAR);
