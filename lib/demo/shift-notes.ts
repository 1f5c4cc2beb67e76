import { formatNumber } from '@/lib/format';
import { clockMs } from './calendar';
import { MIS_FED_WEEK } from './mis-fed';
import type { WorksDay, WorksHistory } from './simulate-works';
import type { QuantityKey } from '@/lib/samples/quantities';

export interface Note {
  readonly daysBeforeEnd: number;
  readonly atMs: number;
  readonly body: string;
}

/** What the log says of a day, written at an hour of it. */
interface Entry {
  readonly hour: number;
  readonly minute: number;
  readonly body: (day: WorksDay) => string;
}

const at = (hour: number, minute: number, body: Entry['body']): Entry => ({ hour, minute, body });

const read = (day: WorksDay, point: string, quantity: QuantityKey, decimals: number): string =>
  formatNumber(day.treated[point]?.[quantity] ?? 0, decimals);

const dose = (day: WorksDay, key: string, decimals = 1): string =>
  formatNumber(day.doses[key] ?? 0, decimals);

/** The last days of every works, by days before the end. */
const LAST_DAYS: Readonly<Record<string, Readonly<Record<number, Entry>>>> = {
  'quarrel-hill': {
    3: at(13, 40, () => 'Filter 3 washed 12:50, back in service 13:30. Others on hours.'),
    2: at(
      21,
      30,
      (day) =>
        `Lime slurry line flushed and drawdown checked, within 2 % of setting. Finished pH ${read(day, 'finished', 'pH', 1)} after.`,
    ),
    1: at(
      13,
      45,
      (day) =>
        `Jar test on raw colour ${read(day, 'raw', 'colour', 0)}: best settled water at the present alum, ${dose(day, 'alum')} mg/L. Left as it is.`,
    ),
    0: at(
      5,
      50,
      (day) =>
        `Finished pH down to ${read(day, 'finished', 'pH', 1)} with the caustic trim unchanged at ${dose(day, 'caustic')} mg/L; drawdown falls short, strainer suspected. For the day shift to put right and review.`,
    ),
  },
  'sallow-wells': {
    3: at(10, 20, () => 'Well 2 rested for level readings, wells 1 and 3 on duty meanwhile.'),
    2: at(14, 10, () => 'Pellets drawn from the lime reactor, bed topped up with seed sand.'),
    1: at(
      9,
      15,
      (day) =>
        `Fluoride day tank filled. Use since the last filling agrees with the dose. Finished ${read(day, 'finished', 'fluoride', 2)} mg/L.`,
    ),
    0: at(
      5,
      40,
      (day) =>
        `Nothing to report. Softened hardness steady, lime ${dose(day, 'lime')} mg/L, CO2 ${dose(day, 'carbon-dioxide')} mg/L.`,
    ),
  },
  otterbank: {
    3: at(21, 45, () => 'Filters 2 and 5 washed. Chlorine drum changed over, leak check clear.'),
    2: at(
      13,
      50,
      (day) =>
        `${riverWords(day)} Ferric ${dose(day, 'ferric')} mg/L, settled turbidity ${read(day, 'clarified', 'turbidity', 1)} NTU.`,
    ),
    1: at(
      21,
      40,
      (day) =>
        `${riverWords(day)} Sludge drawn from basin 1. Free chlorine at the contact tank ${read(day, 'contact', 'freeChlorine', 1)} mg/L before ammonia.`,
    ),
    0: at(
      5,
      55,
      (day) =>
        `${riverWords(day)} Ferric ${dose(day, 'ferric')} mg/L, polymer ${dose(day, 'polymer', 2)} mg/L. Basin 2 due for desludging on days.`,
    ),
  },
};

function riverWords(day: WorksDay): string {
  const turbidityNtu = day.raw.turbidity ?? 0;
  const reading = `raw ${formatNumber(turbidityNtu, turbidityNtu < 20 ? 1 : 0)} NTU`;
  return turbidityNtu > 40 ? `River up and brown, ${reading}.` : `River quiet, ${reading}.`;
}

/** How the mis-fed week reads in the log: noticed, doubted, found. */
const MIS_FED_NOTES: Readonly<Record<number, Entry>> = {
  [MIS_FED_WEEK.firstDaysBeforeEnd - 1]: at(
    7,
    50,
    (day) =>
      `Finished grab pH ${read(day, 'finished', 'pH', 1)}, analyser still shows 8.2. Bench meter to be checked with fresh buffers.`,
  ),
  [MIS_FED_WEEK.firstDaysBeforeEnd - 4]: at(
    8,
    5,
    (day) =>
      `Bench meter agrees with buffers. Grab pH ${read(day, 'finished', 'pH', 1)} again, analyser 8.2. Instrument visit asked for.`,
  ),
  [MIS_FED_WEEK.lastDaysBeforeEnd]: at(
    15,
    20,
    (day) =>
      `Caustic trim pump found air-locked: drawdown gave about an eighth of the ${dose(day, 'caustic')} mg/L it is set to. Analyser had held its last value. Pump bled and primed, drawdown as set, probe changed. Zone told of a week of low pH.`,
  ),
  [MIS_FED_WEEK.lastDaysBeforeEnd - 1]: at(
    8,
    0,
    (day) =>
      `Finished grab pH ${read(day, 'finished', 'pH', 1)}, analyser agrees. Grab against analyser every shift from now on.`,
  ),
};

/** A river this turbid is worth a note on the day it rises there, NTU. */
const SPATE_NTU = 120;

/** The shift notes of a works, oldest first. */
export function notesOf(worksSlug: string, { days }: WorksHistory): Note[] {
  return days.flatMap((day, index) => {
    const { daysBeforeEnd } = day.day;
    const entries: Entry[] = [];
    const before = days[index - 1]?.raw.turbidity ?? 0;
    if ((day.raw.turbidity ?? 0) > SPATE_NTU && before <= SPATE_NTU) entries.push(spateEntry);
    const misFed = worksSlug === MIS_FED_WEEK.worksSlug ? MIS_FED_NOTES[daysBeforeEnd] : undefined;
    if (misFed !== undefined) entries.push(misFed);
    const last = LAST_DAYS[worksSlug]?.[daysBeforeEnd];
    if (last !== undefined) entries.push(last);
    return entries.map(({ hour, minute, body }) => ({
      daysBeforeEnd,
      atMs: clockMs(day.day, hour, minute),
      body: body(day),
    }));
  });
}

/** What else the shift saw to; a different thing from one spate to the next. */
const SPATE_ENDINGS = [
  'Jar test agrees.',
  'Screens raked twice.',
  'Basins desludged early, filters watched.',
  'Caustic followed the ferric up.',
] as const;

const spateEntry = at(7, 40, (day) => {
  const ending = SPATE_ENDINGS[day.day.dayOfYear % SPATE_ENDINGS.length] ?? SPATE_ENDINGS[0];
  const rawNtu = formatNumber(day.raw.turbidity ?? 0, 0);
  return `River in spate, raw ${rawNtu} NTU on the morning round. Ferric at ${dose(day, 'ferric')} mg/L and polymer at ${dose(day, 'polymer', 2)} mg/L since the night. ${ending}`;
});
