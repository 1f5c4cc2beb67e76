import 'server-only';
import { getServerSession } from 'next-auth';
import { notFound as nextNotFound, redirect } from 'next/navigation';
import { cache } from 'react';
import { AppError } from '@/lib/errors';
import { paths } from '@/lib/paths';
import { enter, type Actor } from './door';
import type { Permission } from './permissions';
import { authOptions } from './options';

/** The signed-in person's id, or null. Read once per request. */
export const signedInPersonId = cache(async (): Promise<string | null> => {
  const session = await getServerSession(authOptions);
  return session?.personId ?? null;
});

/** The actor of this request, for actions and route handlers. Throws `AppError` when the door stays shut. */
export const actorFor = cache(
  async (organisationSlug: string, permission: Permission): Promise<Actor> =>
    enter(await signedInPersonId(), organisationSlug, permission),
);

/** The actor of this page: signed out goes to sign in, what is not theirs is not found. */
export async function pageActor(organisationSlug: string, permission: Permission): Promise<Actor> {
  try {
    return await actorFor(organisationSlug, permission);
  } catch (error) {
    if (error instanceof AppError && error.code === 'signedOut') redirect(paths.signIn);
    if (error instanceof AppError && error.code === 'notFound') nextNotFound();
    // A page that a role may not open is not there for it; its links are not shown either.
    if (error instanceof AppError && error.code === 'forbidden') nextNotFound();
    throw error;
  }
}
