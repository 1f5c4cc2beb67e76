import { createHash } from 'node:crypto';
import { countTry, forgetTries, secondsBlocked, type RateLimit } from '@/db/rate-limits';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';

const MINUTE_S = 60;
const HOUR_S = 60 * MINUTE_S;

/** What may be tried how often (OWASP ASVS V2.4.1, V6.3.1). Counted in PostgreSQL, so that all web processes share it. */
export const LIMITS = {
  /** Wrong passwords or codes for one address. */
  'sign-in': { points: 10, withinS: 15 * MINUTE_S, blockS: 15 * MINUTE_S },
  /** Links to a new password sent to one address. */
  reset: { points: 3, withinS: HOUR_S, blockS: HOUR_S },
  /** Accounts asked for with one address. */
  'sign-up': { points: 5, withinS: HOUR_S, blockS: HOUR_S },
  /** Invitations sent by one organisation. */
  invitation: { points: 30, withinS: HOUR_S, blockS: HOUR_S },
  /** Wrong present passwords or codes given by someone signed in. */
  account: { points: 10, withinS: 15 * MINUTE_S, blockS: 15 * MINUTE_S },
} as const satisfies Record<string, Omit<RateLimit, 'name'>>;

export type LimitName = keyof typeof LIMITS;

const limitOf = (name: LimitName): RateLimit => ({ name, ...LIMITS[name] });

/** Names and addresses are kept out of the table. Known and unknown ones are counted alike. */
const keyOf = (subject: string): string => createHash('sha256').update(subject).digest('hex');

/** Throws `tooMany` while the subject is closed. Counts nothing. */
export async function refuseWhenClosed(name: LimitName, subject: string): Promise<void> {
  const seconds = await secondsBlocked(limitOf(name), keyOf(subject));
  if (seconds === 0) return;
  logger.warn({ event: 'limit-exceeded', limit: name }, 'tried too often');
  throw tooMany(seconds);
}

export const countTryOf = (name: LimitName, subject: string): Promise<void> =>
  countTry(limitOf(name), keyOf(subject));

/** Counts a try and throws `tooMany` when it was one too many. */
export async function takeTry(name: LimitName, subject: string): Promise<void> {
  await refuseWhenClosed(name, subject);
  await countTryOf(name, subject);
  await refuseWhenClosed(name, subject);
}

export const forgetTriesOf = (name: LimitName, subject: string): Promise<void> =>
  forgetTries(limitOf(name), keyOf(subject));

function tooMany(seconds: number): AppError {
  const minutes = Math.ceil(seconds / MINUTE_S);
  return new AppError(
    'tooMany',
    `That was tried too often. Wait ${minutes === 1 ? 'a minute' : `${minutes} minutes`} and try again.`,
  );
}
