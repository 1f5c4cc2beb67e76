import 'server-only';
import type { z } from 'zod';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';
import { actorFor } from './actor';
import type { Actor } from './door';
import type { Permission } from './permissions';

/** One sentence at one field; `path` is the form's own name for it. */
export interface FieldProblem {
  readonly path: string;
  readonly message: string;
}

export type ActionResult<Value> =
  | { readonly ok: true; readonly value: Value }
  | { readonly ok: false; readonly message: string; readonly problems: readonly FieldProblem[] };

/**
 * A server action in one line: who may, what comes in, what happens. The permission is required; input is parsed
 * before the use case sees it; what went wrong comes back as a sentence, what is unknown says nothing internal.
 */
export function memberAction<Schema extends z.ZodType, Value>(
  permission: Permission,
  schema: Schema,
  useCase: (actor: Actor, input: z.output<Schema>) => Promise<Value>,
) {
  return async (organisationSlug: string, input: z.input<Schema>): Promise<ActionResult<Value>> => {
    try {
      const actor = await actorFor(organisationSlug, permission);
      const parsed = schema.safeParse(input);
      if (!parsed.success) return refused('Some fields need another look.', parsed.error.issues);
      return { ok: true, value: await useCase(actor, parsed.data) };
    } catch (error) {
      if (error instanceof AppError) return refused(error.userMessage, []);
      logger.error({ err: error, permission }, 'an action failed');
      return refused('Something went wrong on our side. Nothing was saved; please try again.', []);
    }
  };
}

const refused = (
  message: string,
  issues: readonly { path: readonly PropertyKey[]; message: string }[],
): ActionResult<never> => ({
  ok: false,
  message,
  problems: issues.map((issue) => ({ path: issue.path.join('.'), message: issue.message })),
});
