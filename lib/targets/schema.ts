import * as z from 'zod';

const bound = z.number({ error: 'Write a number, or leave it open.' }).nullable();

/** The bounds of a target, in the quantity's canonical unit; null leaves one open. */
export const targetBounds = z
  .object({
    lowest: bound,
    highest: bound,
    preferred: bound,
    basis: z.string().trim().max(300, 'At most 300 characters.'),
    reason: z.string().trim().min(1, 'Say in a few words why.').max(500, 'At most 500 characters.'),
  })
  .superRefine(({ lowest, highest, preferred }, context) => {
    const issue = (path: string, message: string) =>
      context.addIssue({ code: 'custom', path: [path], message });
    if (lowest === null && highest === null)
      issue('lowest', 'A target needs a lowest or a highest.');
    if (lowest !== null && highest !== null && lowest > highest) {
      issue('highest', 'The highest must not lie below the lowest.');
    }
    if (preferred === null) return;
    if (preferred < (lowest ?? -Infinity) || preferred > (highest ?? Infinity)) {
      issue('preferred', 'The preferred value must lie between lowest and highest.');
    }
  });
export type TargetBounds = z.output<typeof targetBounds>;

export const changeTargetInput = z.object({
  plantSlug: z.string(),
  targetId: z.string(),
  /** The version the person saw. */
  version: z.int().positive(),
  bounds: targetBounds,
});
export type ChangeTargetInput = z.output<typeof changeTargetInput>;
