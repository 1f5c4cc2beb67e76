import * as z from 'zod';
import {
  createDocument,
  type ZodOpenApiOperationObject,
  type ZodOpenApiPathsObject,
} from 'zod-openapi';
import { errorAnswer } from '@/lib/api/error-to-json';
import type { Operation } from '@/lib/api/operation';
import { OPERATIONS } from './operations';

const errorContent = { 'application/json': { schema: errorAnswer } } as const;

/** What can go wrong with an operation, by status. */
export function errorsOf(operation: Operation): Readonly<Record<string, string>> {
  return {
    '401': 'No token or session, or one that is expired or revoked.',
    '403': 'The role, or the token’s scopes, do not reach this far.',
    '404': 'There is no such thing here: not at all, or not of yours.',
    ...(operation.needsMatch === true
      ? {
          '412': 'Someone changed it since you read it; the message says what stands now.',
          '428': 'If-Match is missing.',
        }
      : {}),
    ...(operation.body === undefined
      ? {}
      : { '413': 'The body is too large.', '415': 'The body is no uncompressed JSON.' }),
    '422': 'Something in the request is wrong; the message names it.',
  };
}

const parametersIn = (path: string): string[] =>
  [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => name ?? '');

function toOpenApi(operation: Operation): ZodOpenApiOperationObject {
  const { id, summary, description, permission, query, body, answer, path } = operation;
  const headers = {
    ...(operation.creates === true ? { 'Idempotency-Key': z.string().min(1).max(255) } : {}),
    ...(operation.needsMatch === true ? { 'If-Match': z.string() } : {}),
  };
  const type = operation.contentType ?? 'application/json';
  return {
    operationId: id,
    summary,
    description: [description, `Scope: ${permission}.`].filter(Boolean).join(' '),
    requestParams: {
      path: z.object(Object.fromEntries(parametersIn(path).map((name) => [name, z.string()]))),
      ...(query instanceof z.ZodObject ? { query } : {}),
      ...(Object.keys(headers).length === 0 ? {} : { header: z.object(headers) }),
    },
    ...(body === undefined
      ? {}
      : { requestBody: { content: { 'application/json': { schema: body } } } }),
    responses: {
      [operation.creates === true ? '201' : '200']: {
        description: 'Done.',
        content: { [type]: { schema: answer } },
      },
      ...Object.fromEntries(
        Object.entries(errorsOf(operation)).map(([status, words]) => [
          status,
          { description: words, content: errorContent },
        ]),
      ),
    },
  };
}

/** The OpenAPI 3.1 document of the public API, from the same schemas that its routes parse with. */
export function openApiDocument() {
  const paths: ZodOpenApiPathsObject = {};
  for (const operation of OPERATIONS) {
    paths[operation.path] = { ...paths[operation.path], [operation.method]: toOpenApi(operation) };
  }
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Marlwick',
      version: '1',
      description:
        'Plants, points, targets, samples, plans, feed log, series and audit of an organisation. A dose is a suggestion: the licensed operator in charge decides.',
    },
    servers: [{ url: '/api/v1' }],
    security: [{ token: [] }],
    components: {
      securitySchemes: {
        token: { type: 'http', scheme: 'bearer', description: 'An API token, mwk_…' },
      },
    },
    paths,
  });
}
