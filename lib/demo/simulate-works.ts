import { clockMs, MINUTE_MS, type CalendarDay } from './calendar';
import { misFedOn } from './mis-fed';
import { createWander, type Random } from './random';
import { runoff } from './rain';
import { createSource, type Values } from './raw-water';
import type { Doses, WorksDefinition, WorksProcess } from './works/definition';

export interface FeedChange {
  readonly dosingKey: string;
  readonly doseMgL: number;
  readonly atMs: number;
}

export interface WorksDay {
  readonly day: CalendarDay;
  readonly raw: Values;
  /** In force at the morning round. */
  readonly doses: Doses;
  readonly treated: Readonly<Record<string, Values>>;
}

export interface WorksHistory {
  readonly days: readonly WorksDay[];
  readonly feed: readonly FeedChange[];
}

const WEEK_DAYS = 7;
/** How far a well-kept feeder strays from its setting, standard deviation as a share. */
const FEEDER_STRAY = 0.006;
const FEEDER_MEMORY = 0.8;
/** A settled morning's change is made at least this long before the round that shows it. */
const BEFORE_ROUND_MS = 45 * MINUTE_MS;

/**
 * Runs a works day by day: the raw water of the day, the doses in force, and the water they make of it. Doses are
 * reviewed every week on yesterday's raw water, and overnight when the water would leave the shift uneasy.
 */
export function simulateWorks(
  works: WorksDefinition,
  process: WorksProcess,
  days: readonly CalendarDay[],
  rainMm: readonly number[],
  random: Random,
): WorksHistory {
  const nextRaw = createSource(process.source, random.fork('source'));
  const wetness = runoff(rainMm, process.sourceMemory);
  const strays = new Map(
    works.dosing.map(({ key }) => [key, createWander(random.fork(`feeder ${key}`), FEEDER_MEMORY)]),
  );
  const clock = random.fork('clock');
  const feed: FeedChange[] = [];
  const history: WorksDay[] = [];
  let doses: Doses | null = null;

  const change = (chosen: Doses, atMs: number): Doses => {
    for (const { key } of works.dosing) {
      const doseMgL = chosen[key] ?? 0;
      if (doses === null || doses[key] !== doseMgL) feed.push({ dosingKey: key, doseMgL, atMs });
    }
    return chosen;
  };

  for (const [index, day] of days.entries()) {
    const raw = nextRaw(day.dayOfYear, wetness[index] ?? 0);
    const yesterday = history.at(-1);
    const overnightMs = clockMs(day, 0, 0) + clock.between(-150, 300) * MINUTE_MS;
    const fault = misFedOn(works.slug, day.daysBeforeEnd);
    if (doses === null || yesterday === undefined) {
      doses = change(process.chooseDoses(raw, null), clockMs(day, 0, 0));
    } else if (day.daysBeforeEnd % WEEK_DAYS === WEEK_DAYS - 1) {
      const afternoonMs = clockMs(yesterday.day, 14, Math.round(clock.between(0, 90)));
      doses = change(process.chooseDoses(yesterday.raw, doses), afternoonMs);
    }
    const stray = Object.fromEntries(
      [...strays].map(([key, next]) => [key, 1 + FEEDER_STRAY * next()]),
    );
    const given = (set: Doses): Doses =>
      Object.fromEntries(
        Object.entries(set).map(([key, dose]) => {
          const share = key === fault?.dosingKey ? fault.shareFed : 1;
          return [key, dose * share * (stray[key] ?? 1)];
        }),
      );
    const treat = (set: Doses) => {
      const scatter = random.fork(`scatter ${day.localDate}`);
      return process.treat(raw, given(set), () => scatter.normal());
    };
    let treated = treat(doses);
    if (fault === undefined && process.needsAttention(treated)) {
      const atMs = Math.min(overnightMs, clockMs(day, 6, 30) - BEFORE_ROUND_MS);
      doses = change(process.chooseDoses(raw, doses), atMs);
      treated = treat(doses);
    }
    history.push({ day, raw, doses, treated });
  }
  return { days: history, feed };
}
