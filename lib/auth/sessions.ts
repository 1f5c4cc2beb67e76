import {
  endSessions,
  findSession,
  insertSession,
  listSessions,
  touchSession,
  type KeptSession,
} from '@/db/queries/sessions';
import { inContext, setContext } from '@/db/tenant';
import type { Database } from '@/db/client';
import { systemClock, type Clock } from '@/lib/clock';
import { logger } from '@/lib/logger';
import { hashOfSecret, newSecret } from './secret';

const HOUR_MS = 3_600_000;
/** A session ends with the shift, whatever happens. */
export const LONGEST_SESSION_MS = 12 * HOUR_MS;
/** A tablet left lying ends its session after this. */
export const IDLE_SESSION_MS = 4 * HOUR_MS;
const BROWSER_CHARACTERS = 160;

const limitsAt = (now: Date) => ({
  startedAfter: new Date(now.getTime() - LONGEST_SESSION_MS),
  seenAfter: new Date(now.getTime() - IDLE_SESSION_MS),
});

/** Begins a session; the secret goes into the browser's cookie, its hash into the database. */
export async function beginSession(
  personId: string,
  browser = '',
  clock: Clock = systemClock,
): Promise<string> {
  const secret = newSecret();
  await inContext({ personId }, (db) =>
    insertSession(db, {
      sessionHash: hashOfSecret(secret),
      personId,
      browser: browser.slice(0, BROWSER_CHARACTERS),
      now: clock(),
    }),
  );
  logger.info({ event: 'session-begun', personId }, 'a session began');
  return secret;
}

/**
 * Runs `work` for the person whose session this secret opens, in their row context; undefined when the session ended,
 * ran out, lay idle too long or never was.
 */
export function withSession<T>(
  secret: string,
  work: (db: Database, session: KeptSession) => Promise<T>,
  clock: Clock = systemClock,
): Promise<T | undefined> {
  const tokenHash = hashOfSecret(secret);
  return inContext({ tokenHash }, async (db) => {
    const session = await findSession(db, tokenHash, limitsAt(clock()));
    if (session === undefined) return undefined;
    await setContext(db, { personId: session.personId });
    await touchSession(db, session, clock());
    return work(db, session);
  });
}

/** Ends the session of a browser that signs out. */
export async function endSession(secret: string, clock: Clock = systemClock): Promise<void> {
  await withSession(
    secret,
    (db, { personId, sessionHash }) => endSessions(db, personId, clock(), sessionHash),
    clock,
  );
}

/** Ends every session of a person, at the next request of each. */
export async function endAllSessions(personId: string, clock: Clock = systemClock): Promise<void> {
  await inContext({ personId }, (db) => endSessions(db, personId, clock()));
  logger.info({ event: 'sessions-ended', personId }, 'all sessions ended');
}

/** Ends one of a person's sessions, named by its hash. */
export const endSessionNamed = (
  personId: string,
  sessionHash: string,
  clock: Clock = systemClock,
): Promise<void> =>
  inContext({ personId }, (db) => endSessions(db, personId, clock(), sessionHash));

/** A person's sessions in force, the latest used first. */
export const readSessions = (
  personId: string,
  clock: Clock = systemClock,
): Promise<KeptSession[]> =>
  inContext({ personId }, (db) => listSessions(db, personId, limitsAt(clock())));
