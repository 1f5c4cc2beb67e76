import type * as z from 'zod';
import type { Actor } from '@/lib/auth/door';
import type { TokenScope } from '@/lib/auth/permissions';

export type Method = 'get' | 'post' | 'put';

/** What a handler is given: everything parsed, nothing raw. */
export interface Asked<Query, Body> {
  readonly params: Readonly<Record<string, string>>;
  readonly query: Query;
  readonly body: Body;
  /** Of a creating operation: one per idempotency key, a UUID. */
  readonly clientKey: string;
  /** Of an operation that needs it: the entity tag the caller saw, without its quotes. */
  readonly ifMatch: string;
}

export interface Answered<Answer> {
  readonly answer: Answer;
  /** Entity tag without quotes; left out, the hash of the answer serves. */
  readonly tag?: string;
}

/** One operation of the public API: all that its route, its documentation and its tests need to know. */
export interface Operation<Query = unknown, Body = unknown, Answer = unknown> {
  readonly id: string;
  readonly method: Method;
  /** Below `/api/v1`, with `{org}` and further parameters in braces. */
  readonly path: `/{org}${string}`;
  readonly summary: string;
  readonly description?: string;
  readonly permission: TokenScope;
  readonly query: z.ZodType<Query>;
  readonly body?: z.ZodType<Body>;
  /** What leaves the product: fields not named here do not. */
  readonly answer: z.ZodType<Answer>;
  readonly contentType?: 'application/json' | 'text/csv';
  /** Makes something: needs an Idempotency-Key, answers 201. */
  readonly creates?: boolean;
  /** Changes something: needs If-Match. */
  readonly needsMatch?: boolean;
  readonly run: (actor: Actor, asked: Asked<Query, Body>) => Promise<Answered<unknown>>;
}

/** Checks an operation's parts against each other, and forgets their types for the list of all. */
export const operation = <Query, Body, Answer>(
  definition: Operation<Query, Body, Answer>,
): Operation => definition as unknown as Operation;
