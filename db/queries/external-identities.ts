import type { Database } from '../client';
import type { ExternalIdentityRow } from '../tables/rows';

/** The person linked to an identity of an outside provider; call in the identity's own context. */
export async function findIdentity(
  db: Database,
  identityHash: string,
): Promise<string | undefined> {
  const row = await db<ExternalIdentityRow>('external_identities')
    .where({ identity_hash: identityHash })
    .first('person_id');
  return row?.person_id;
}

export async function linkIdentity(
  db: Database,
  identity: { identityHash: string; personId: string; provider: string },
): Promise<void> {
  await db<ExternalIdentityRow>('external_identities').insert({
    identity_hash: identity.identityHash,
    person_id: identity.personId,
    provider: identity.provider,
  });
}
