import { createHash } from 'node:crypto';
import { countTry, forgetTries, secondsBlocked, type RateLimit } from '@/db/rate-limits';

const MINUTE_S = 60;

/** Ten wrong passwords for one address in a quarter of an hour close it for a quarter of an hour (OWASP ASVS V6.3.1). */
const SIGN_IN_LIMIT: RateLimit = {
  name: 'sign-in',
  points: 10,
  withinS: 15 * MINUTE_S,
  blockS: 15 * MINUTE_S,
};

/** The address itself is kept out of the table. Known and unknown addresses are counted alike. */
const keyOf = (email: string): string => createHash('sha256').update(email).digest('hex');

export const signInBlockedForS = (email: string): Promise<number> =>
  secondsBlocked(SIGN_IN_LIMIT, keyOf(email));

export const countWrongPassword = (email: string): Promise<void> =>
  countTry(SIGN_IN_LIMIT, keyOf(email));

export const forgetWrongPasswords = (email: string): Promise<void> =>
  forgetTries(SIGN_IN_LIMIT, keyOf(email));
