import { findMembership } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { AppError, notFound } from '@/lib/errors';
import type { Organisation } from '@/lib/organisations/schema';
import { roleMay, type Permission, type Role } from './permissions';

/** Who acts, for which organisation, in which role. Made only by `enter`. */
export interface Actor {
  readonly personId: string;
  readonly personName: string;
  readonly role: Role;
  readonly organisation: Organisation;
}

/**
 * The one door: pages, actions and route handlers all come through it. Membership is read at every request, so a
 * removed person is out at once; an organisation that is not theirs does not exist for them.
 */
export async function enter(
  personId: string | null,
  organisationSlug: string,
  permission: Permission,
): Promise<Actor> {
  if (personId === null) throw new AppError('signedOut', 'Sign in to go on.');
  const membership = await inContext({ personId }, (db) =>
    findMembership(db, personId, organisationSlug),
  );
  if (membership === undefined) throw notFound('organisation');
  if (!roleMay(membership.role, permission)) {
    throw new AppError('forbidden', `A ${membership.role} may not do this here.`);
  }
  return {
    personId,
    personName: membership.personName,
    role: membership.role,
    organisation: membership.organisation,
  };
}
