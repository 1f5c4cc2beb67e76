import * as z from 'zod';
import { page, pageOf, pageQuery, readCursor } from '@/lib/api/cursor';
import { operation } from '@/lib/api/operation';
import { exportAudit, readAuditFrom } from '@/lib/audit/read-audit';
import { auditQuery } from '@/lib/audit/schema';
import { auditAnswer } from './answers';

export const listAudit = operation({
  id: 'listAudit',
  method: 'get',
  path: '/{org}/audit',
  summary: 'The audit trail, newest first',
  permission: 'audit.read',
  query: z.strictObject({ ...auditQuery.shape, ...pageQuery }),
  answer: pageOf(auditAnswer),
  run: async (actor, { query }) => {
    const before = readCursor(query.cursor);
    const position = before === null ? null : Number(before[1]);
    const read = await readAuditFrom(actor, query, position, query.limit + 1);
    const { items, next } = page(read, query.limit, (entry) => [entry.at, `${entry.position}`]);
    return {
      answer: { items: items.map((item) => ({ ...item, at: item.at.toISOString() })), next },
    };
  },
});

export const exportAuditTrail = operation({
  id: 'audit',
  method: 'get',
  path: '/{org}/audit.csv',
  summary: 'The audit trail as CSV, first entry first, with the hashes that chain it',
  permission: 'audit.read',
  query: z.strictObject(auditQuery.shape),
  answer: z.string(),
  contentType: 'text/csv',
  run: async (actor, { query }) => ({ answer: await exportAudit(actor, query) }),
});
