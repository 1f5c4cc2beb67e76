import { findMembership, type Membership } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { AppError, notFound } from '@/lib/errors';
import type { Organisation } from '@/lib/organisations/schema';
import type { ApiTokenHolder } from './api-token';
import { roleMay, type Permission, type Role } from './permissions';

/** What someone brings to the door: a browser's session, an API token, or nothing. */
export type Credential =
  | { readonly kind: 'session'; readonly personId: string; readonly epoch: number }
  | ({ readonly kind: 'token' } & ApiTokenHolder)
  | null;

/** Who acts, for which organisation, in which role, at which plants. Made only by `enter`. */
export interface Actor {
  readonly personId: string;
  readonly personName: string;
  readonly role: Role;
  readonly organisation: Organisation;
  /** The plants this actor sees; null for all of the organisation's. */
  readonly plantIds: readonly string[] | null;
  /** The API token acting for the person, if one does. */
  readonly token: { readonly id: string; readonly name: string } | null;
}

/**
 * The one door: pages, actions, route handlers and API tokens all come through it. Membership is read at every request,
 * so a removed person is out at once; an organisation that is not theirs does not exist for them. A token may do what
 * its maker may do now, narrowed by its scopes and plants.
 */
export async function enter(
  credential: Credential,
  organisationSlug: string,
  permission: Permission,
): Promise<Actor> {
  if (credential === null) throw new AppError('signedOut', 'Sign in to go on.');
  const personId = credential.kind === 'session' ? credential.personId : credential.madeBy;
  const membership = await inContext({ personId }, (db) =>
    findMembership(db, personId, organisationSlug),
  );
  if (credential.kind === 'session') return throughSession(credential, membership, permission);
  return throughToken(credential, membership, permission);
}

function throughSession(
  { epoch }: { readonly epoch: number },
  membership: Membership | undefined,
  permission: Permission,
): Actor {
  if (membership === undefined) throw notFound('organisation');
  if (membership.sessionEpoch !== epoch) {
    throw new AppError('signedOut', 'You were signed out everywhere. Sign in to go on.');
  }
  return checked(membership, permission, { plantIds: membership.plantIds, token: null });
}

function throughToken(
  token: ApiTokenHolder,
  membership: Membership | undefined,
  permission: Permission,
): Actor {
  if (membership === undefined || membership.organisation.id !== token.organisationId) {
    throw notFound('organisation');
  }
  if (!(token.scopes as readonly Permission[]).includes(permission)) {
    throw new AppError('forbidden', `This API token was not given ${permission}.`);
  }
  return checked(membership, permission, {
    plantIds: narrower(membership.plantIds, token.plantIds),
    token: { id: token.tokenId, name: token.tokenName },
  });
}

function checked(
  { role, personId, personName, organisation }: Membership,
  permission: Permission,
  rest: Pick<Actor, 'plantIds' | 'token'>,
): Actor {
  if (!roleMay(role, permission)) {
    throw new AppError('forbidden', `A person with the role ${role} may not do this here.`);
  }
  return { personId, personName, role, organisation, ...rest };
}

/** Plants in both lists, null standing for all. */
function narrower(
  first: readonly string[] | null,
  second: readonly string[] | null,
): readonly string[] | null {
  if (first === null) return second;
  return second === null ? first : first.filter((id) => second.includes(id));
}
