export interface Due {
  readonly state: 'done' | 'soon' | 'overdue';
  /** When the next sample is due; null where none was ever taken. */
  readonly dueAt: Date | null;
}

const HOUR_MS = 3_600_000;
/** Due within a sixth of its interval counts as soon: 4 h of a day, 80 min of a shift (working value). */
const SOON_SHARE = 1 / 6;

/** Whether a point's next sample is due, from its last one and its interval. */
export function dueState(lastTakenAt: Date | null, everyH: number, now: Date): Due {
  if (lastTakenAt === null) return { state: 'overdue', dueAt: null };
  const dueAt = new Date(lastTakenAt.getTime() + everyH * HOUR_MS);
  if (dueAt.getTime() <= now.getTime()) return { state: 'overdue', dueAt };
  const soon = dueAt.getTime() - everyH * HOUR_MS * SOON_SHARE <= now.getTime();
  return { state: soon ? 'soon' : 'done', dueAt };
}
