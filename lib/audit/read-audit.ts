import { listAuditEntries } from '@/db/queries/audit';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import type { AuditEntry } from './schema';

export const AUDIT_PAGE_SIZE = 50;

/** One page of the actor's trail, newest first. */
export const readAudit = (
  actor: Actor,
  filter: { action?: string; page: number },
): Promise<{ entries: AuditEntry[]; total: number }> =>
  inTenant(actor, (db) =>
    listAuditEntries(db, actor.organisation.id, {
      action: filter.action,
      limit: AUDIT_PAGE_SIZE,
      offset: (filter.page - 1) * AUDIT_PAGE_SIZE,
    }),
  );
