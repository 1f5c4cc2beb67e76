import * as z from 'zod';

const role = z.string();
const plants = z.array(z.string()).nullable();
const bound = z.number().nullable();
const bounds = z.object({ lowest: bound, highest: bound, preferred: bound, basis: z.string() });

/** One kind of change: what it is called, and what is written down of it. */
const change = <Action extends string, Detail extends z.ZodRawShape>(
  action: Action,
  detail: Detail,
) => z.object({ action: z.literal(action), subjectId: z.string(), detail: z.object(detail) });

/** The closed list of what is written down, each with what it tells. */
export const auditChange = z.discriminatedUnion('action', [
  change('plan.saved', {
    sampleId: z.string(),
    target: z.object({ quantity: z.string(), value: z.number() }),
    doses: z.array(z.object({ reagent: z.string(), doseMgL: z.number() })),
    engineVersion: z.string(),
    reason: z.string(),
  }),
  change('target.changed', {
    quantity: z.string(),
    before: bounds,
    after: bounds,
    version: z.number(),
    reason: z.string(),
  }),
  change('feed.logged', {
    dosingPointId: z.string(),
    from: z.string(),
    to: z.string(),
    productKg: z.number(),
  }),
  change('organisation.made', { name: z.string(), slug: z.string() }),
  change('member.invited', { email: z.string(), role, plantIds: plants }),
  change('invitation.revoked', { email: z.string() }),
  change('member.joined', { role, plantIds: plants }),
  change('member.changed', {
    before: z.object({ role, plantIds: plants }),
    after: z.object({ role, plantIds: plants }),
  }),
  change('member.removed', { role }),
  change('member.signed-out', { role }),
  change('token.made', {
    name: z.string(),
    prefix: z.string(),
    scopes: z.array(z.string()),
    plantIds: plants,
    expiresAt: z.string(),
  }),
  change('token.revoked', { name: z.string() }),
]);

export type AuditChange = z.infer<typeof auditChange>;
export type AuditAction = AuditChange['action'];

export const AUDIT_WORDS: Readonly<Record<AuditAction, string>> = {
  'plan.saved': 'Plan saved',
  'target.changed': 'Target changed',
  'feed.logged': 'Feed logged',
  'organisation.made': 'Organisation opened',
  'member.invited': 'Person invited',
  'invitation.revoked': 'Invitation revoked',
  'member.joined': 'Person joined',
  'member.changed': 'Role or plants changed',
  'member.removed': 'Person removed',
  'member.signed-out': 'Person signed out everywhere',
  'token.made': 'API token made',
  'token.revoked': 'API token revoked',
};

export const isAuditAction = (text: string): text is AuditAction => text in AUDIT_WORDS;

/** Which part of the trail to read: by kind, by person, by UTC day. */
export const auditQuery = z.object({
  action: z.string().refine(isAuditAction, 'is no kind of change').optional(),
  person: z.string().min(1).max(60).optional(),
  from: z.iso.date({ error: 'write a day as YYYY-MM-DD' }).optional(),
  to: z.iso.date({ error: 'write a day as YYYY-MM-DD' }).optional(),
});
export type AuditQuery = z.output<typeof auditQuery>;

/** The filter in a page's address; a part that makes no sense, or is empty, filters nothing. */
export function auditQueryIn(asked: Readonly<Record<string, unknown>>): AuditQuery {
  const parts = Object.entries(auditQuery.shape).map(([name, schema]) => [
    name,
    schema.safeParse(asked[name]).data,
  ]);
  return Object.fromEntries(parts) as AuditQuery;
}

/** One line of the trail. */
export interface AuditEntry {
  readonly position: number;
  readonly at: Date;
  readonly actorId: string;
  readonly actorName: string;
  readonly action: string;
  readonly subjectId: string;
  readonly detail: unknown;
  readonly previousHash: string;
  readonly hash: string;
}
