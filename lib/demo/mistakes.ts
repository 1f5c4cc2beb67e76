import type { QuantityKey } from '@/lib/samples/quantities';
import { asWritten } from './sampling';
import type { DemoResult } from './schema';

/** A slip of the pen: what was written instead, or null when this result does not lend itself to it. */
interface Mistake {
  readonly worksSlug: string;
  readonly pointSlug: string;
  readonly quantity: QuantityKey;
  /** Made on the first sheet at least this old that lends itself, going back in time. */
  readonly daysBeforeEnd: number;
  readonly slip: (result: DemoResult) => string | null;
}

const CACO3_PER_CALCIUM = 100.086 / 40.078;

const decimalsOf = (text: string): number => text.split('.')[1]?.length ?? 0;

const scaledBy =
  (factor: number) =>
  ({ text }: DemoResult): string =>
    (Number(text) * factor).toFixed(decimalsOf(text));

/** The last two digits change places, where that makes a difference worth seeing. */
function lastDigitsSwapped({ text }: DemoResult): string | null {
  const [a, b] = [text.at(-2), text.at(-1)];
  if (a === undefined || b === undefined || Math.abs(Number(a) - Number(b)) < 3) return null;
  return `${text.slice(0, -2)}${b}${a}`;
}

/** °F written where °C is asked: passes only on a cold day, when it looks like a hot one. */
function fahrenheit({ text }: DemoResult): string | null {
  const degreesF = Number(text) * 1.8 + 32;
  return degreesF <= 44 ? degreesF.toFixed(1) : null;
}

export const MISTAKES: readonly Mistake[] = [
  {
    worksSlug: 'quarrel-hill',
    pointSlug: 'raw',
    quantity: 'calcium',
    daysBeforeEnd: 613,
    slip: scaledBy(CACO3_PER_CALCIUM),
  },
  {
    worksSlug: 'sallow-wells',
    pointSlug: 'raw',
    quantity: 'calcium',
    daysBeforeEnd: 402,
    slip: scaledBy(1 / CACO3_PER_CALCIUM),
  },
  {
    worksSlug: 'otterbank',
    pointSlug: 'raw',
    quantity: 'temperature',
    daysBeforeEnd: 230,
    slip: fahrenheit,
  },
  {
    worksSlug: 'otterbank',
    pointSlug: 'finished',
    quantity: 'turbidity',
    daysBeforeEnd: 288,
    slip: scaledBy(10),
  },
  {
    worksSlug: 'sallow-wells',
    pointSlug: 'finished',
    quantity: 'alkalinity',
    daysBeforeEnd: 96,
    slip: lastDigitsSwapped,
  },
  {
    worksSlug: 'quarrel-hill',
    pointSlug: 'network',
    quantity: 'freeChlorine',
    daysBeforeEnd: 217,
    slip: scaledBy(10),
  },
];

/** Makes each mistake of a works once. `sheets` come newest first. */
export function withMistakes<
  Sheet extends { pointSlug: string; daysBeforeEnd: number; results: readonly DemoResult[] },
>(worksSlug: string, sheets: readonly Sheet[]): Sheet[] {
  const spoiled = new Map<Sheet, readonly DemoResult[]>();
  for (const mistake of MISTAKES.filter((candidate) => candidate.worksSlug === worksSlug)) {
    for (const sheet of sheets) {
      if (sheet.pointSlug !== mistake.pointSlug || sheet.daysBeforeEnd < mistake.daysBeforeEnd) {
        continue;
      }
      const right = sheet.results.find(({ quantity }) => quantity === mistake.quantity);
      const text = right?.qualifier === '' ? mistake.slip(right) : null;
      if (right === undefined || text === null) continue;
      const wrong = asWritten(right.quantity, text, right.unit, '');
      const results = spoiled.get(sheet) ?? sheet.results;
      spoiled.set(
        sheet,
        results.map((result) => (result === right ? wrong : result)),
      );
      break;
    }
  }
  return sheets.map((sheet) => ({ ...sheet, results: spoiled.get(sheet) ?? sheet.results }));
}
