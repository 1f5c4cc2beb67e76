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

export interface AuditFilter {
  action?: string;
  actorId?: string;
  from?: Date;
  before?: Date;
}

const filtered = (db: Database, organisationId: string, filter: AuditFilter) => {
  const query = db<AuditEntryRow>('audit_entries').where({ organisation_id: organisationId });
  if (filter.action !== undefined) void query.where({ action: filter.action });
  if (filter.actorId !== undefined) void query.where({ actor_id: filter.actorId });
  if (filter.from !== undefined) void query.where('at', '>=', filter.from);
  if (filter.before !== undefined) void query.where('at', '<', filter.before);
  return query;
};

/** The newest entries that pass the filter, newest first. */
export async function listAuditEntries(
  db: Database,
  organisationId: string,
  filter: AuditFilter & { limit: number; offset: number },
): Promise<{ entries: AuditEntry[]; total: number }> {
  const rows = await filtered(db, organisationId, filter)
    .orderBy('position', 'desc')
    .limit(filter.limit)
    .offset(filter.offset);
  const [counted] = await filtered(db, organisationId, filter).count<{ count: number }[]>(
    '* as count',
  );
  return { entries: rows.map(toEntry), total: counted?.count ?? 0 };
}

/** Entries older than a position, newest first, for pages by cursor. */
export async function listAuditBefore(
  db: Database,
  organisationId: string,
  filter: AuditFilter,
  position: number | null,
  limit: number,
): Promise<AuditEntry[]> {
  const query = filtered(db, organisationId, filter).orderBy('position', 'desc').limit(limit);
  if (position !== null) void query.where('position', '<', position);
  return (await query).map(toEntry);
}

/** Everyone who stands in a trail, by name: whom it can be filtered by. */
export async function listAuditActors(
  db: Database,
  organisationId: string,
): Promise<{ id: string; name: string }[]> {
  const rows = await db<AuditEntryRow>('audit_entries')
    .where({ organisation_id: organisationId })
    .groupBy('actor_id')
    .select<{ actor_id: string; name: string }[]>('actor_id', db.raw('min(actor_name) as name'))
    .orderBy('name');
  return rows.map(({ actor_id, name }) => ({ id: actor_id, name }));
}
