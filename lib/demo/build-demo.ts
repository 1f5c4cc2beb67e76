import { CONSTANTS_HASH, ENGINE_VERSION } from '@/lib/engine';
import { calendarUpTo, MINUTE_MS } from './calendar';
import { describeWorks } from './describe-works';
import { demoId } from './ids';
import { DEMO_ORGANISATION, demoPeople } from './people';
import { createRandom } from './random';
import { dailyRainMm } from './rain';
import { visitsOf } from './rounds';
import { sampleRows } from './sample-rows';
import type { DemoData, DemoFeedSetting, DemoShiftNote } from './schema';
import { notesOf } from './shift-notes';
import { simulateWorks } from './simulate-works';
import { DEMO_WORKS } from './works/all';

export interface DemoOptions {
  readonly now: Date;
  /** Another seed, another two years. */
  readonly seed?: string;
  readonly days?: number;
}

/** Two years and the day that ends them. */
const DAYS = 731;
const SEED = 'calverdine';
/** Shifts change every few days. */
const DAYS_ON_DUTY = 4;
/** Rain falls a little differently on each catchment. */
const LOCAL_RAIN_SPREAD = 0.22;

/** The whole demo as rows: the same moment and seed always give the same. */
export function buildDemo({ now, seed = SEED, days = DAYS }: DemoOptions): DemoData {
  const random = createRandom(seed);
  const people = demoPeople();
  const operators = people.filter(({ role }) => role === 'operator');
  const regionalRainMm = new Map<string, number[]>();
  const works = DEMO_WORKS.map(({ definition, process }, index) => {
    const own = random.fork(definition.slug);
    const described = describeWorks(definition, index + 1, random);
    const calendar = calendarUpTo(now, days, definition.timeZone);
    const rainMm =
      regionalRainMm.get(definition.timeZone) ??
      dailyRainMm(
        calendar.map(({ dayOfYear }) => dayOfYear),
        random.fork('rain'),
      );
    regionalRainMm.set(definition.timeZone, rainMm);
    const local = own.fork('local rain');
    const localRainMm = rainMm.map((mm) => mm * Math.exp(LOCAL_RAIN_SPREAD * local.normal()));
    const history = simulateWorks(definition, process, calendar, localRainMm, own);
    const onDuty = (daysBeforeEnd: number): string =>
      operators[(Math.floor(daysBeforeEnd / DAYS_ON_DUTY) + index) % operators.length]?.id ?? '';
    const { plantId, pointIds, dosingIds } = described;
    const nowMs = now.getTime();
    const dayOf = (ms: number) => Math.max(0, Math.floor((nowMs - ms) / 86_400_000));
    const feedSettings = history.feed.map(({ dosingKey, doseMgL, atMs }): DemoFeedSetting => {
      const setAt = new Date(Math.min(Math.floor(atMs / MINUTE_MS) * MINUTE_MS, nowMs));
      return {
        id: demoId(own, 'feedSetting', `${dosingKey} ${setAt.toISOString()}`),
        dosingPointId: dosingIds.get(dosingKey) ?? '',
        doseMgPerL: doseMgL,
        setBy: onDuty(dayOf(atMs)),
        setAt,
      };
    });
    const shiftNotes = notesOf(definition.slug, history).map(({ atMs, body }): DemoShiftNote => {
      const writtenAt = new Date(Math.min(atMs, nowMs - 20 * MINUTE_MS));
      const id = demoId(own, 'shiftNote', `${atMs}`);
      return { id, plantId, writtenBy: onDuty(dayOf(atMs)), writtenAt, body };
    });
    const visits = visitsOf(definition, history, now, own.fork('rounds'));
    const book = { worksSlug: definition.slug, plantId, pointIds, now, onDuty };
    return {
      ...described.rows,
      feedSettings,
      shiftNotes,
      samples: sampleRows(visits, book, own.fork('sampling')),
    };
  });
  return {
    organisation: {
      id: demoId(random, 'organisation', DEMO_ORGANISATION.slug),
      ...DEMO_ORGANISATION,
    },
    people,
    plants: works.flatMap((each) => each.plants),
    points: works.flatMap((each) => each.points),
    pointQuantities: works.flatMap((each) => each.pointQuantities),
    targets: works.flatMap((each) => each.targets),
    trainSteps: works.flatMap((each) => each.trainSteps),
    dosingPoints: works.flatMap((each) => each.dosingPoints),
    feedSettings: works.flatMap((each) => each.feedSettings),
    shiftNotes: works.flatMap((each) => each.shiftNotes),
    samples: works.flatMap((each) => each.samples),
    engineVersion: ENGINE_VERSION,
    constantsHash: CONSTANTS_HASH,
  };
}
