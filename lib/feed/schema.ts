import * as z from 'zod';

/** What was fed at a dosing point over a time. */
export const feedEntryInput = z
  .object({
    plantSlug: z.string(),
    clientKey: z.uuid(),
    dosingPointId: z.string().min(1),
    from: z.iso.datetime({ offset: true, error: 'write a moment like 2026-12-01T06:00:00Z' }),
    to: z.iso.datetime({ offset: true, error: 'write a moment like 2026-12-01T18:00:00Z' }),
    /** Product as delivered. */
    productKg: z.number().min(0).max(1e6),
    waterTreatedMl: z.number().positive().max(1e5).nullable().default(null),
    note: z.string().trim().max(2000).default(''),
  })
  .refine(({ from, to }) => Date.parse(from) < Date.parse(to), {
    error: 'must lie after “from”',
    path: ['to'],
  });
export type FeedEntryInput = z.output<typeof feedEntryInput>;
