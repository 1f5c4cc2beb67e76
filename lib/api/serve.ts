import 'server-only';
import { createHash } from 'node:crypto';
import type * as z from 'zod';
import { sessionCredential } from '@/lib/auth/actor';
import { readApiToken } from '@/lib/auth/api-token';
import { enter, type Credential } from '@/lib/auth/door';
import { AppError } from '@/lib/errors';
import { checkOrigin } from './check-origin';
import { errorToJson } from './error-to-json';
import { idempotencyKeyOf, once } from './idempotency';
import type { Operation } from './operation';
import { readJsonBody } from './request-body';

type Context = { readonly params: Promise<Readonly<Record<string, string>>> };

/** The route handler of an operation: door, schemas, preconditions, use case, answer; errors in the one form. */
export function serve(operation: Operation) {
  return async (request: Request, context: Context): Promise<Response> => {
    try {
      return await answer(operation, request, await context.params);
    } catch (error) {
      return errorToJson(error);
    }
  };
}

async function answer(
  operation: Operation,
  request: Request,
  params: Readonly<Record<string, string>>,
): Promise<Response> {
  const credential = await credentialOf(request);
  const isSafe = operation.method === 'get';
  if (!isSafe && credential?.kind === 'session') checkOrigin(request);
  const actor = await enter(credential, params['org'] ?? '', operation.permission);
  const query = parse(operation.query, Object.fromEntries(new URL(request.url).searchParams));
  const ifMatch = operation.needsMatch === true ? ifMatchOf(request) : '';
  const key = operation.creates === true ? idempotencyKeyOf(request) : '';
  const body = operation.body && parse(operation.body, await readJsonBody(request));
  if (operation.creates === true) {
    const path = new URL(request.url).pathname;
    const kept = await once(
      actor,
      key,
      { operation: operation.id, path, body },
      201,
      async (clientKey) => {
        const asked = { params, query, body, clientKey, ifMatch };
        return operation.answer.parse((await operation.run(actor, asked)).answer);
      },
    );
    return send(operation, request, kept.answer, undefined, 201, kept.isRepeat);
  }
  const asked = { params, query, body, clientKey: '', ifMatch };
  const done = await operation.run(actor, asked);
  return send(operation, request, operation.answer.parse(done.answer), done.tag, 200, false);
}

/** A token where one is sent, whatever cookie comes with it; else the browser's session. */
async function credentialOf(request: Request): Promise<Credential> {
  const authorization = request.headers.get('authorization');
  if (authorization === null) return sessionCredential();
  const text = /^Bearer (\S+)$/i.exec(authorization)?.[1] ?? '';
  return { kind: 'token', ...(await readApiToken(text, new Date())) };
}

function parse<Output>(schema: z.ZodType<Output>, value: unknown): Output {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const sentences = parsed.error.issues.map(({ path, message }) =>
    path.length === 0 ? message : `${path.join('.')}: ${message}`,
  );
  throw new AppError('badInput', sentences.join(' '));
}

function ifMatchOf(request: Request): string {
  const header = request.headers.get('if-match');
  if (header === null) {
    throw new AppError(
      'preconditionRequired',
      'Send If-Match with the ETag you read, so that nobody’s change is overwritten unseen.',
    );
  }
  return header.trim().replace(/^W\//, '').replaceAll('"', '');
}

function send(
  operation: Operation,
  request: Request,
  value: unknown,
  tag: string | undefined,
  status: number,
  isRepeat: boolean,
): Response {
  const isText = operation.contentType === 'text/csv';
  const text = isText ? String(value) : JSON.stringify(value);
  const etag = `"${tag ?? createHash('sha256').update(text).digest('base64url').slice(0, 27)}"`;
  const headers: Record<string, string> = {
    'cache-control': 'private, no-store',
    'content-type': isText ? 'text/csv; charset=utf-8' : 'application/json',
    etag,
    ...(isText ? { 'content-disposition': `attachment; filename="${operation.id}.csv"` } : {}),
    ...(isRepeat ? { 'idempotency-replayed': 'true' } : {}),
  };
  if (request.method === 'GET' && request.headers.get('if-none-match') === etag) {
    return new Response(null, { status: 304, headers: { etag } });
  }
  return new Response(text, { status, headers });
}
