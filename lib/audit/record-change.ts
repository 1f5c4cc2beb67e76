import type { Database } from '@/db/client';
import { insertAuditEntry, lockLastAuditEntry } from '@/db/queries/audit';
import type { Actor } from '@/lib/auth/door';
import { systemClock, type Clock } from '@/lib/clock';
import { FIRST_HASH, hashOf } from './chain';
import { auditChange, type AuditChange } from './schema';

/** Writes one entry into the trail, in the transaction of the change itself: both are kept, or neither. */
export async function recordChange(
  db: Database,
  actor: Actor,
  change: AuditChange,
  clock: Clock = systemClock,
): Promise<void> {
  const { action, subjectId, detail } = auditChange.parse(change);
  const last = await lockLastAuditEntry(db, actor.organisation.id);
  const entry = {
    position: (last?.position ?? 0) + 1,
    at: clock(),
    actorId: actor.personId,
    actorName:
      actor.token === null
        ? actor.personName
        : `${actor.personName}, by API token ${actor.token.name}`,
    action,
    subjectId,
    detail,
    previousHash: last?.hash ?? FIRST_HASH,
  };
  await insertAuditEntry(db, actor.organisation.id, {
    ...entry,
    hash: hashOf({ ...entry, organisationId: actor.organisation.id }),
  });
}
