import { randomUUID } from 'node:crypto';

export interface ApiAnswer {
  readonly status: number;
  readonly headers: Headers;
  readonly body: unknown;
}

export interface ApiRequest {
  readonly method?: 'GET' | 'POST' | 'PUT';
  readonly body?: unknown;
  readonly headers?: Readonly<Record<string, string>>;
}

/** Requests as one holder of a token, of a cookie or of nothing. */
export function apiClient(
  baseUrl: string,
  held: { readonly token?: string; readonly cookie?: string } = {},
) {
  return async (
    path: string,
    { method = 'GET', body, headers = {} }: ApiRequest = {},
  ): Promise<ApiAnswer> => {
    const answer = await fetch(`${baseUrl}/api/v1${path}`, {
      method,
      redirect: 'manual',
      headers: {
        ...(held.token === undefined ? {} : { authorization: `Bearer ${held.token}` }),
        ...(held.cookie === undefined ? {} : { cookie: held.cookie, origin: baseUrl }),
        ...(body === undefined ? {} : { 'content-type': 'application/json' }),
        ...headers,
      },
      ...(body === undefined
        ? {}
        : { body: typeof body === 'string' ? body : JSON.stringify(body) }),
    });
    const text = await answer.text();
    const isJson = answer.headers.get('content-type')?.includes('json') === true;
    return {
      status: answer.status,
      headers: answer.headers,
      body: isJson ? (JSON.parse(text) as unknown) : text,
    };
  };
}

/** A field of an answer's object, as text. */
export function textIn(body: unknown, field: string): string {
  const value = (body as Readonly<Record<string, unknown>>)[field];
  return typeof value === 'string' || typeof value === 'number' ? String(value) : '';
}

/** The items of a page. */
export const itemsIn = (body: unknown): Readonly<Record<string, unknown>>[] =>
  (body as { items: Readonly<Record<string, unknown>>[] }).items;

export const onceKey = (): Record<string, string> => ({ 'idempotency-key': randomUUID() });
