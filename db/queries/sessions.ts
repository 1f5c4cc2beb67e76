import type { Database } from '../client';
import type { SessionRow } from '../tables/rows';

export interface KeptSession {
  sessionHash: string;
  personId: string;
  startedAt: Date;
  lastSeenAt: Date;
  browser: string;
}

const toSession = (row: SessionRow): KeptSession => ({
  sessionHash: row.session_hash,
  personId: row.person_id,
  startedAt: row.started_at,
  lastSeenAt: row.last_seen_at,
  browser: row.browser,
});

export interface SessionLimits {
  startedAfter: Date;
  seenAfter: Date;
}

const inForce = (db: Database, { startedAfter, seenAfter }: SessionLimits) =>
  db<SessionRow>('sessions')
    .whereNull('ended_at')
    .where('started_at', '>', startedAfter)
    .where('last_seen_at', '>', seenAfter);

export async function insertSession(
  db: Database,
  session: { sessionHash: string; personId: string; browser: string; now: Date },
): Promise<void> {
  await db<SessionRow>('sessions').insert({
    session_hash: session.sessionHash,
    person_id: session.personId,
    started_at: session.now,
    last_seen_at: session.now,
    browser: session.browser,
  });
}

/** The session in force with this hash; call in the hash's own context, before any person is known. */
export async function findSession(
  db: Database,
  sessionHash: string,
  limits: SessionLimits,
): Promise<KeptSession | undefined> {
  const row = await inForce(db, limits).where({ session_hash: sessionHash }).first();
  return row && toSession(row);
}

/** Notes that a session is in use, at most once a minute; call in the person's context. */
export async function touchSession(db: Database, session: KeptSession, now: Date): Promise<void> {
  const MINUTE_MS = 60_000;
  if (now.getTime() - session.lastSeenAt.getTime() < MINUTE_MS) return;
  await db<SessionRow>('sessions')
    .where({ session_hash: session.sessionHash })
    .update({ last_seen_at: now });
}

/** A person's sessions in force, the latest used first; call in the person's context. */
export async function listSessions(
  db: Database,
  personId: string,
  limits: SessionLimits,
): Promise<KeptSession[]> {
  const rows = await inForce(db, limits)
    .where({ person_id: personId })
    .orderBy('last_seen_at', 'desc');
  return rows.map(toSession);
}

/** Ends all of a person's sessions, or one; call in the person's context. */
export async function endSessions(
  db: Database,
  personId: string,
  now: Date,
  sessionHash?: string,
): Promise<void> {
  const query = db<SessionRow>('sessions').where({ person_id: personId }).whereNull('ended_at');
  if (sessionHash !== undefined) void query.where({ session_hash: sessionHash });
  await query.update({ ended_at: now });
}
