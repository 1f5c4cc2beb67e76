import {
  listAuditActors,
  listAuditBefore,
  listAuditEntries,
  listAuditTrail,
  type AuditFilter,
} from '@/db/queries/audit';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { csvLine } from '@/lib/csv';
import { canonicalJson } from './chain';
import type { AuditEntry, AuditQuery } from './schema';

export const AUDIT_PAGE_SIZE = 50;
const DAY_MS = 86_400_000;

/** A query's UTC days as the moments they begin and end at. */
export const auditFilter = ({ action, person, from, to }: AuditQuery): AuditFilter => ({
  ...(action === undefined ? {} : { action }),
  ...(person === undefined ? {} : { actorId: person }),
  ...(from === undefined ? {} : { from: new Date(`${from}T00:00:00Z`) }),
  ...(to === undefined ? {} : { before: new Date(Date.parse(`${to}T00:00:00Z`) + DAY_MS) }),
});

/** One page of the actor's trail, newest first, and whom it can be filtered by. */
export const readAudit = (
  actor: Actor,
  query: AuditQuery,
  page: number,
): Promise<{ entries: AuditEntry[]; total: number; people: { id: string; name: string }[] }> =>
  inTenant(actor, async (db) => ({
    ...(await listAuditEntries(db, actor.organisation.id, {
      ...auditFilter(query),
      limit: AUDIT_PAGE_SIZE,
      offset: (page - 1) * AUDIT_PAGE_SIZE,
    })),
    people: await listAuditActors(db, actor.organisation.id),
  }));

/** Entries older than a position, newest first. */
export const readAuditFrom = (
  actor: Actor,
  query: AuditQuery,
  position: number | null,
  limit: number,
): Promise<AuditEntry[]> =>
  inTenant(actor, (db) =>
    listAuditBefore(db, actor.organisation.id, auditFilter(query), position, limit),
  );

const COLUMNS = [
  'position',
  'at',
  'person',
  'action',
  'subject',
  'detail',
  'previous_hash',
  'hash',
];

/** The filtered trail as CSV, first entry first, with the hashes that chain it. */
export async function exportAudit(actor: Actor, query: AuditQuery): Promise<string> {
  const { action, actorId, from, before } = auditFilter(query);
  const trail = await inTenant(actor, (db) => listAuditTrail(db, actor.organisation.id));
  const kept = trail.filter(
    (entry) =>
      (action === undefined || entry.action === action) &&
      (actorId === undefined || entry.actorId === actorId) &&
      (from === undefined || entry.at >= from) &&
      (before === undefined || entry.at < before),
  );
  const lines = kept.map((entry) =>
    csvLine([
      entry.position,
      entry.at.toISOString(),
      entry.actorName,
      entry.action,
      entry.subjectId,
      canonicalJson(entry.detail),
      entry.previousHash,
      entry.hash,
    ]),
  );
  return [csvLine(COLUMNS), ...lines].join('');
}
