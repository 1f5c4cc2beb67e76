import * as z from 'zod';
import { REAGENTS, type ReagentKey, type TargetQuantity } from '@/lib/engine';
import { readMeasurement } from '@/lib/samples/read-measurement';
import { TARGET_KEYS } from './quantities';

const reagentKeys = Object.keys(REAGENTS) as [ReagentKey, ...ReagentKey[]];

export const planInput = z.object({
  plantSlug: z.string(),
  sampleId: z.string(),
  clientKey: z.uuid(),
  reagent: z.enum(reagentKeys, { error: 'Choose what to feed.' }),
  doseMgL: z
    .number({ error: 'Write the dose as a number.' })
    .min(0, 'A dose cannot be negative.')
    .max(5000, 'A dose above 5000 mg/L is no drinking-water dose.'),
  target: z.object({
    quantity: z.enum(TARGET_KEYS as [TargetQuantity, ...TargetQuantity[]]),
    value: z.number(),
  }),
  /** What the browser showed when the person saved; the server's own answer must agree. */
  previewedPH: z.number().optional(),
  reason: z.string().trim().max(2000, 'A reason has at most 2000 characters.'),
});

export type PlanInput = z.infer<typeof planInput>;

/** A number in a plan's field (target or dose), by the same reading rules as a sample's. */
export function readPlanNumber(
  text: string,
): { ok: true; value: number } | { ok: false; message: string } {
  const read = readMeasurement(text);
  if (read.kind === 'empty') return { ok: false, message: 'Write a number here.' };
  if (read.kind === 'problem') return { ok: false, message: read.message };
  if (read.qualifier !== '') return { ok: false, message: 'A plain number is needed here.' };
  return { ok: true, value: read.value };
}
