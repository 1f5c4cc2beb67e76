import { calendarUpTo, MINUTE_MS, type CalendarDay } from './calendar';
import { describeWorks } from './describe-works';
import { dutyRota } from './duty';
import { demoId } from './ids';
import type { Random } from './random';
import { visitsOf } from './rounds';
import { sampleRows } from './sample-rows';
import type { DemoData, DemoFeedSetting, DemoShiftNote } from './schema';
import { notesOf } from './shift-notes';
import { simulateWorks } from './simulate-works';
import type { DemoWorks } from './works/all';

/** What every works of one demo shares. */
export interface Common {
  readonly now: Date;
  readonly days: number;
  readonly random: Random;
  readonly operatorIds: readonly string[];
  readonly regionalRainMm: (days: readonly CalendarDay[]) => readonly number[];
}

export type WorksRows = Omit<
  DemoData,
  'organisation' | 'people' | 'engineVersion' | 'constantsHash'
>;

/** Rain falls a little differently on each catchment: standard deviation of the logarithm of its share. */
const LOCAL_RAIN_SPREAD = 0.22;
const LAST_NOTE_BEFORE_NOW_MS = 20 * MINUTE_MS;

/** Everything of one works, `position` being its place among them. */
export function worksRows(
  { definition, process }: DemoWorks,
  position: number,
  { now, days, random, operatorIds, regionalRainMm }: Common,
): WorksRows {
  const nowMs = now.getTime();
  const own = random.fork(definition.slug);
  const { plantId, pointIds, dosingIds, rows } = describeWorks(definition, position, random);
  const calendar = calendarUpTo(now, days, definition.timeZone);
  const local = own.fork('local rain');
  const rainMm = regionalRainMm(calendar).map(
    (mm) => mm * Math.exp(LOCAL_RAIN_SPREAD * local.normal()),
  );
  const history = simulateWorks(definition, process, calendar, rainMm, own);
  const onDuty = dutyRota(operatorIds, position);

  const feedSettings = history.feed.map(({ dosingKey, doseMgL, atMs }): DemoFeedSetting => {
    const setAt = new Date(Math.min(Math.floor(atMs / MINUTE_MS) * MINUTE_MS, nowMs));
    return {
      id: demoId(own, 'feedSetting', `${dosingKey} ${setAt.toISOString()}`),
      dosingPointId: dosingIds.get(dosingKey) ?? '',
      doseMgPerL: doseMgL,
      setBy: onDuty(atMs),
      setAt,
    };
  });
  const shiftNotes = notesOf(definition.slug, history).map(({ atMs, body }): DemoShiftNote => {
    const writtenAt = new Date(Math.min(atMs, nowMs - LAST_NOTE_BEFORE_NOW_MS));
    const id = demoId(own, 'shiftNote', `${atMs}`);
    return { id, plantId, writtenBy: onDuty(writtenAt.getTime()), writtenAt, body };
  });
  const visits = visitsOf(definition, history, now, own.fork('rounds'));
  const book = { worksSlug: definition.slug, plantId, pointIds, now, onDuty };
  const samples = sampleRows(visits, book, own.fork('sampling'));
  return { ...rows, feedSettings, shiftNotes, samples };
}
