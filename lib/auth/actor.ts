import 'server-only';
import { getServerSession } from 'next-auth';
import { notFound as nextNotFound, redirect } from 'next/navigation';
import { cache } from 'react';
import { AppError } from '@/lib/errors';
import { paths } from '@/lib/paths';
import { enter, type Actor, type Credential } from './door';
import { authOptions } from './options';
import type { Permission } from './permissions';
import { findSignedIn, type SignedInPerson } from './signed-in';

/** What this request's cookie says, unchecked. Read once per request. */
export const sessionCredential = cache(async (): Promise<Credential> => {
  const session = await getServerSession(authOptions());
  return session?.secret ? { kind: 'session', secret: session.secret } : null;
});

/** The signed-in person, checked against the database: null when signed out, or signed out everywhere since. */
export const signedInPerson = cache(async (): Promise<SignedInPerson | null> =>
  findSignedIn(await sessionCredential()),
);

/** The person of a page that belongs to them alone; anyone signed out goes to sign in. */
export async function pagePerson(): Promise<SignedInPerson> {
  return (await signedInPerson()) ?? redirect(paths.signIn);
}

/** The actor of this request's session, for pages and actions. Throws `AppError` when the door stays shut. */
export const actorFor = cache(
  async (organisationSlug: string, permission: Permission): Promise<Actor> =>
    enter(await sessionCredential(), organisationSlug, permission),
);

/** The actor of this page: signed out goes to sign in, what is not theirs is not found. */
export async function pageActor(organisationSlug: string, permission: Permission): Promise<Actor> {
  try {
    return await actorFor(organisationSlug, permission);
  } catch (error) {
    if (error instanceof AppError && error.code === 'signedOut') redirect(paths.signIn);
    if (error instanceof AppError && ['notFound', 'badInput'].includes(error.code)) nextNotFound();
    // A page that a role may not open is not there for it; its links are not shown either.
    if (error instanceof AppError && error.code === 'forbidden') nextNotFound();
    throw error;
  }
}
