import type { Database } from '../client';
import type { AuditEntryRow } from '../tables/rows';
import type { AuditEntry } from '@/lib/audit/schema';

const toEntry = (row: AuditEntryRow): AuditEntry => ({
  position: row.position,
  at: row.at,
  actorId: row.actor_id,
  actorName: row.actor_name,
  action: row.action,
  subjectId: row.subject_id,
  detail: row.detail,
  previousHash: row.previous_hash,
  hash: row.hash,
});

/**
 * The last entry of a trail, with the trail held until the transaction ends: two changes at once take turns, so that
 * each follows from the one before. Call inside a transaction.
 */
export async function lockLastAuditEntry(
  db: Database,
  organisationId: string,
): Promise<AuditEntry | undefined> {
  await db.raw('select pg_advisory_xact_lock(hashtextextended(?, 7))', [`audit ${organisationId}`]);
  const row = await db<AuditEntryRow>('audit_entries')
    .where({ organisation_id: organisationId })
    .orderBy('position', 'desc')
    .first();
  return row && toEntry(row);
}

export async function insertAuditEntry(
  db: Database,
  organisationId: string,
  entry: AuditEntry,
): Promise<void> {
  await db<AuditEntryRow>('audit_entries').insert({
    organisation_id: organisationId,
    position: entry.position,
    at: entry.at,
    actor_id: entry.actorId,
    actor_name: entry.actorName,
    action: entry.action,
    subject_id: entry.subjectId,
    detail: JSON.stringify(entry.detail),
    previous_hash: entry.previousHash,
    hash: entry.hash,
  });
}

/** A whole trail, first entry first. */
export async function listAuditTrail(db: Database, organisationId: string): Promise<AuditEntry[]> {
  const rows = await db<AuditEntryRow>('audit_entries')
    .where({ organisation_id: organisationId })
    .orderBy('position');
  return rows.map(toEntry);
}

/** The newest entries, newest first, of one action or of all. */
export async function listAuditEntries(
  db: Database,
  organisationId: string,
  filter: { action?: string; limit: number; offset: number },
): Promise<{ entries: AuditEntry[]; total: number }> {
  const filtered = () => {
    const query = db<AuditEntryRow>('audit_entries').where({ organisation_id: organisationId });
    return filter.action === undefined ? query : query.where({ action: filter.action });
  };
  const rows = await filtered()
    .orderBy('position', 'desc')
    .limit(filter.limit)
    .offset(filter.offset);
  const [counted] = await filtered().count<{ count: number }[]>('* as count');
  return { entries: rows.map(toEntry), total: counted?.count ?? 0 };
}
