import { findMembership, type Membership } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { AppError, notFound } from '@/lib/errors';
import { logger } from '@/lib/logger';
import type { Organisation } from '@/lib/organisations/schema';
import type { ApiTokenHolder } from './api-token';
import { roleMay, type Permission, type Role } from './permissions';
import { withSession } from './sessions';

/** What someone brings to the door: a browser's session, an API token, or nothing. */
export type Credential =
  | { readonly kind: 'session'; readonly secret: string }
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
  try {
    return credential.kind === 'session'
      ? await throughSession(credential.secret, organisationSlug, permission)
      : await throughToken(credential, organisationSlug, permission);
  } catch (error) {
    if (error instanceof AppError) {
      const by = credential.kind === 'token' ? { tokenId: credential.tokenId } : {};
      logger.warn(
        { event: 'door-shut', why: error.code, permission, ...by },
        'the door stayed shut',
      );
    }
    throw error;
  }
}

async function throughSession(
  secret: string,
  organisationSlug: string,
  permission: Permission,
): Promise<Actor> {
  const found = await withSession(secret, async (db, { personId }) => ({
    membership: await findMembership(db, personId, organisationSlug),
  }));
  if (found === undefined)
    throw new AppError('signedOut', 'Your session has ended. Sign in to go on.');
  if (found.membership === undefined) throw notFound('organisation');
  const { membership } = found;
  return checked(membership, permission, { plantIds: membership.plantIds, token: null });
}

async function throughToken(
  token: ApiTokenHolder,
  organisationSlug: string,
  permission: Permission,
): Promise<Actor> {
  const personId = token.madeBy;
  const membership = await inContext({ personId }, (db) =>
    findMembership(db, personId, organisationSlug),
  );
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
