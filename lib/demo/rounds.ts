import { clockMs, HOUR_MS, MINUTE_MS, roundMs } from './calendar';
import type { Random } from './random';
import type { Values } from './raw-water';
import type { WorksDay, WorksHistory } from './simulate-works';
import type { PointDefinition, WorksDefinition } from './works/definition';

/** A tap visited: which, when, and the water that was there. */
export interface Visit {
  readonly point: PointDefinition;
  readonly worksDay: WorksDay;
  readonly takenMs: number;
  readonly water: Values;
}

const DAY_H = 24;
const WEEK_DAYS = 7;
/** Shift sampling of the river began this many days ago; before, once a day. */
const SHIFT_SAMPLING_DAYS = 60;
const SHIFT_H = 8;
/** The week in which nobody went out into the network. */
export const NETWORK_GAP_DAYS_BEFORE_END = 77;

/** Every visit of a works up to `now`, in the order they were made. */
export function visitsOf(
  works: WorksDefinition,
  history: WorksHistory,
  now: Date,
  random: Random,
): Visit[] {
  const visits = history.days.flatMap((worksDay, index) =>
    works.points.flatMap((point, order) => {
      const { daysBeforeEnd } = worksDay.day;
      const isWeekly = point.everyH > DAY_H;
      if (isWeekly && daysBeforeEnd % WEEK_DAYS !== 0) return [];
      if (isWeekly && daysBeforeEnd === NETWORK_GAP_DAYS_BEFORE_END) return [];
      const delayMs = random.between(-10, 14) * MINUTE_MS;
      const plannedMs =
        (isWeekly ? clockMs(worksDay.day, 10, 15) : clockMs(worksDay.day, 6, 30 + 9 * order)) +
        delayMs;
      const takenMs = roundMs(worksDay.day, plannedMs, now, 150 - 16 * order);
      const water = worksDay.treated[point.slug] ?? {};
      const morning: Visit = { point, worksDay, takenMs, water };
      if (point.everyH >= DAY_H || daysBeforeEnd > SHIFT_SAMPLING_DAYS) return [morning];
      const next = history.days[index + 1];
      const later = [1, 2].map((shift) => ({
        point,
        worksDay,
        takenMs: plannedMs + shift * SHIFT_H * HOUR_MS + random.between(-8, 8) * MINUTE_MS,
        water: between(water, next?.treated[point.slug] ?? water, (shift * SHIFT_H) / DAY_H),
      }));
      // On the last day the moved round stands for the shift it falls in.
      const isMade = (visit: Visit) =>
        next !== undefined && visit.takenMs < now.getTime() && visit.takenMs > takenMs;
      return [morning, ...later.filter(isMade)];
    }),
  );
  return visits.sort((a, b) => a.takenMs - b.takenMs);
}

/** Water on its way from one state to another. */
function between(from: Values, to: Values, share: number): Values {
  return Object.fromEntries(
    (Object.entries(from) as [keyof Values, number][]).map(([key, value]) => [
      key,
      value + ((to[key] ?? value) - value) * share,
    ]),
  );
}
