import type { Target } from './schema';

export type Verdict = 'within' | 'below' | 'above';

/** A value against its target, both in the canonical unit. An open end is never missed. */
export function judge(value: number, target: Pick<Target, 'lowest' | 'highest'>): Verdict {
  if (target.lowest !== null && value < target.lowest) return 'below';
  if (target.highest !== null && value > target.highest) return 'above';
  return 'within';
}
