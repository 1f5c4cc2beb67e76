import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { database } from './client';

/** How often something may be tried: `points` within `withinS` seconds, then none for `blockS` seconds. */
export interface RateLimit {
  readonly name: string;
  readonly points: number;
  readonly withinS: number;
  readonly blockS: number;
}

const limiters = new Map<string, RateLimiterPostgres>();

function limiterOf({ name, points, withinS, blockS }: RateLimit): RateLimiterPostgres {
  const known = limiters.get(name);
  if (known !== undefined) return known;
  const made = new RateLimiterPostgres({
    storeClient: database(),
    storeType: 'knex',
    tableName: 'rate_limits',
    tableCreated: true,
    clearExpiredByTimeout: false,
    keyPrefix: name,
    points,
    duration: withinS,
    blockDuration: blockS,
  });
  limiters.set(name, made);
  return made;
}

/** Seconds until this key may try again; 0 when it may now. Counts nothing. */
export async function secondsBlocked(limit: RateLimit, key: string): Promise<number> {
  const state = await limiterOf(limit).get(key);
  if (state === null || state.consumedPoints <= limit.points) return 0;
  return Math.max(0, Math.ceil(state.msBeforeNext / 1000));
}

/** Counts one try; the one beyond the limit starts the block. */
export async function countTry(limit: RateLimit, key: string): Promise<void> {
  try {
    await limiterOf(limit).consume(key);
  } catch (refused) {
    if (!(refused instanceof RateLimiterRes)) throw refused;
  }
}

/** Forgets the tries of a key: it has proven itself. */
export async function forgetTries(limit: RateLimit, key: string): Promise<void> {
  await limiterOf(limit).delete(key);
}
