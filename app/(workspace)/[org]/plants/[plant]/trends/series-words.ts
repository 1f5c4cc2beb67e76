import { formatNumber } from '@/lib/format';
import { judge } from '@/lib/plants/judge';
import type { Series } from '@/lib/trends/schema';

export const isMissed = (value: number, target: Series['target']): boolean =>
  target !== null && judge(value, target) !== 'within';

/** `365 samples, 7.42 to 8.91, half of them below 8.12. Target 7.80 to 8.60, missed 12 times.` */
export function summaryWords({ summary, count, decimals, target }: Series): string {
  const write = (value: number) => formatNumber(value, decimals);
  if (summary === null) return 'No sample in these days.';
  const spread =
    count === 1
      ? `One sample, ${write(summary.median)}.`
      : `${count} samples, ${write(summary.lowest)} to ${write(summary.highest)}, median ${write(summary.median)}.`;
  if (target === null) return `${spread} No target is set.`;
  return `${spread} Target ${targetWords(target, write)}; ${missedWords(summary.missed)}`;
}

function targetWords(
  { lowest, highest }: NonNullable<Series['target']>,
  write: (value: number) => string,
): string {
  if (lowest !== null && highest !== null) return `${write(lowest)} to ${write(highest)}`;
  if (lowest !== null) return `at least ${write(lowest)}`;
  return highest === null ? 'open' : `at most ${write(highest)}`;
}

function missedWords(missed: number): string {
  if (missed === 0) return 'never missed.';
  return missed === 1 ? 'missed once.' : `missed ${missed} times.`;
}
