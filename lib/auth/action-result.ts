import type * as z from 'zod';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';

/** One sentence at one field; `path` is the form's own name for it. */
export interface FieldProblem {
  readonly path: string;
  readonly message: string;
}

export type ActionResult<Value> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly message: string; readonly problems: readonly FieldProblem[] };

/**
 * The common end of every action: input is parsed before the use case sees it; what went wrong comes back as a sentence,
 * what is unknown says nothing internal. `who` opens the door first.
 */
export async function answerAction<Schema extends z.ZodType, Who, Value>(
  name: string,
  who: () => Promise<Who>,
  schema: Schema,
  input: z.input<Schema>,
  work: (who: Who, input: z.output<Schema>) => Promise<Value>,
): Promise<ActionResult<Value>> {
  try {
    const actor = await who();
    const parsed = schema.safeParse(input);
    if (!parsed.success) return refused('Some fields need another look.', parsed.error.issues);
    return { ok: true, value: await work(actor, parsed.data) };
  } catch (error) {
    if (error instanceof AppError) {
      return refused(error.userMessage, []);
    }
    logger.error({ err: error, name }, 'an action failed');
    return refused('Something went wrong on our side. Nothing was saved; please try again.', []);
  }
}

const refused = (
  message: string,
  issues: readonly { path: readonly PropertyKey[]; message: string }[],
): ActionResult<never> => ({
  ok: false,
  message,
  problems: issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message })),
});
