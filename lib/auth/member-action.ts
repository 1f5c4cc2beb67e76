import 'server-only';
import type * as z from 'zod';
import { answerAction, type ActionResult } from './action-result';
import { actorFor, sessionCredential } from './actor';
import type { Actor } from './door';
import { AppError } from '@/lib/errors';
import type { Permission } from './permissions';
import { findSignedIn, type SignedInPerson } from './signed-in';

export type { ActionResult, FieldProblem } from './action-result';

/** A server action in one line: who may, what comes in, what happens. The permission is required. */
export const memberAction =
  <Schema extends z.ZodType, Value>(
    permission: Permission,
    schema: Schema,
    useCase: (actor: Actor, input: z.output<Schema>) => Promise<Value>,
  ) =>
  (organisationSlug: string, input: z.input<Schema>): Promise<ActionResult<Value>> =>
    answerAction(permission, () => actorFor(organisationSlug, permission), schema, input, useCase);

/** An action on one's own account: signed in, and nothing but one's own. */
export const personAction =
  <Schema extends z.ZodType, Value>(
    name: string,
    schema: Schema,
    useCase: (person: SignedInPerson, input: z.output<Schema>) => Promise<Value>,
  ) =>
  (input: z.input<Schema>): Promise<ActionResult<Value>> =>
    answerAction(name, signedIn, schema, input, useCase);

async function signedIn(): Promise<SignedInPerson> {
  const person = await findSignedIn(await sessionCredential());
  if (person === null) throw new AppError('signedOut', 'Sign in to go on.');
  return person;
}

/** An action that anyone may call: signing up, links from letters. Written out, so that none is so by oversight. */
export const publicAction =
  <Schema extends z.ZodType, Value>(
    name: string,
    schema: Schema,
    useCase: (person: SignedInPerson | null, input: z.output<Schema>) => Promise<Value>,
  ) =>
  (input: z.input<Schema>): Promise<ActionResult<Value>> =>
    answerAction(name, async () => findSignedIn(await sessionCredential()), schema, input, useCase);
