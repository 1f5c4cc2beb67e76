import * as z from 'zod';
import { checkResult } from './check-result';
import { QUANTITY_KEYS, type QuantityKey } from './quantities';
import { QUALIFIERS, type Qualifier } from './solve-sample';

/** A result ready to be kept: as written, and canonical. */
export interface ResultToKeep {
  readonly quantity: QuantityKey;
  readonly text: string;
  readonly unit: string;
  readonly qualifier: Qualifier;
  readonly value: number;
}

const resultInput = z
  .object({
    quantity: z.enum(QUANTITY_KEYS),
    text: z.string().max(40, 'A result has at most 40 characters.'),
    unit: z.string().max(40),
    qualifier: z.enum(QUALIFIERS),
  })
  .transform((result, context): ResultToKeep | null => {
    const checked = checkResult(result);
    if (checked.kind === 'empty') return null;
    if (checked.kind === 'problem') {
      context.addIssue({ code: 'custom', message: checked.message, path: ['text'] });
      return z.NEVER;
    }
    return { ...result, text: checked.text, qualifier: checked.qualifier, value: checked.value };
  });

export const sampleInput = z.object({
  plantSlug: z.string(),
  pointSlug: z.string().min(1, 'Choose the sampling point.'),
  /** Made once by the form: sending twice keeps one sample. */
  clientKey: z.uuid(),
  /** Plant-local wall-clock time. */
  takenAtLocal: z
    .string()
    .regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}$/, 'Write the day and time the sample was taken.'),
  comment: z.string().trim().max(2000, 'A comment has at most 2000 characters.'),
  results: z
    .array(resultInput)
    .max(60)
    .transform((results) => results.filter((result) => result !== null))
    .refine((results) => results.length > 0, 'Write at least one result before saving.'),
});

export type SampleInput = z.input<typeof sampleInput>;
export type SampleToKeep = z.output<typeof sampleInput>;
