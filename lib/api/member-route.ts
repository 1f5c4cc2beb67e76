import 'server-only';
import type { z } from 'zod';
import { actorFor } from '@/lib/auth/actor';
import type { Actor } from '@/lib/auth/door';
import type { Permission } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import { errorToJson } from './error-to-json';

type Params = Readonly<Record<string, string>> & { readonly org: string };

/** A JSON route handler behind the door: permission, query schema, use case. The answer is the use case's value. */
export function memberRoute<Schema extends z.ZodType>(
  permission: Permission,
  querySchema: Schema,
  useCase: (actor: Actor, query: z.output<Schema>, params: Params) => Promise<object>,
) {
  return async (
    request: Request,
    context: { params: Promise<Readonly<Record<string, string>>> },
  ): Promise<Response> => {
    try {
      const params = await context.params;
      const { org } = params;
      if (org === undefined) throw new AppError('notFound', 'There is no such address.');
      const actor = await actorFor(org, permission);
      const query = querySchema.safeParse(
        Object.fromEntries(new URL(request.url).searchParams.entries()),
      );
      if (!query.success) {
        throw new AppError(
          'badInput',
          query.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`).join(' '),
        );
      }
      return Response.json(await useCase(actor, query.data, { ...params, org }), {
        headers: { 'cache-control': 'private, no-store' },
      });
    } catch (error) {
      return errorToJson(error);
    }
  };
}
