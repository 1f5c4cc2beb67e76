import { CONSTANTS_HASH, ENGINE_VERSION } from '@/lib/engine';
import { DEMO_ORGANISATION, demoPeople } from './people';
import { createRandom } from './random';
import { dailyRainMm } from './rain';
import type { DemoData } from './schema';
import { DEMO_WORKS } from './works/all';
import { worksRows } from './works-rows';

export interface DemoOptions {
  readonly now: Date;
  /** Another seed, another two years. */
  readonly seed?: string;
  readonly days?: number;
}

/** Two years and the day that ends them. */
const DAYS = 731;
const SEED = 'calverdine';

/** The whole demo as rows: the same moment and seed always give the same. */
export function buildDemo({ now, seed = SEED, days = DAYS }: DemoOptions): DemoData {
  const random = createRandom(seed);
  const people = demoPeople();
  const common = {
    now,
    days,
    random,
    operatorIds: people.filter(({ role }) => role === 'operator').map(({ id }) => id),
    regionalRainMm: (calendar: readonly { dayOfYear: number }[]) =>
      dailyRainMm(
        calendar.map(({ dayOfYear }) => dayOfYear),
        random.fork('rain'),
      ),
  };
  const works = DEMO_WORKS.map((each, index) => worksRows(each, index + 1, common));
  return {
    organisation: DEMO_ORGANISATION,
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
