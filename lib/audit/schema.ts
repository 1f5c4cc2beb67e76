import * as z from 'zod';

/** The closed list of what is written down, each with what it tells. */
export const auditChange = z.discriminatedUnion('action', [
  z.object({
    action: z.literal('plan.saved'),
    subjectId: z.string(),
    detail: z.object({
      sampleId: z.string(),
      target: z.object({ quantity: z.string(), value: z.number() }),
      doses: z.array(z.object({ reagent: z.string(), doseMgL: z.number() })),
      engineVersion: z.string(),
      reason: z.string(),
    }),
  }),
]);

export type AuditChange = z.infer<typeof auditChange>;
export type AuditAction = AuditChange['action'];

export const AUDIT_WORDS: Readonly<Record<AuditAction, string>> = {
  'plan.saved': 'Plan saved',
};

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
