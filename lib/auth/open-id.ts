import type { OAuthConfig } from 'next-auth/providers/oauth';
import { findIdentity, linkIdentity } from '@/db/queries/external-identities';
import { findPersonByEmail, findPersonById } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { env } from '@/lib/env';
import { logger } from '@/lib/logger';
import { hashOfSecret } from './secret';

interface Claims {
  readonly sub?: string;
  readonly iss?: string;
  readonly email?: string;
  readonly email_verified?: boolean;
  readonly name?: string;
}

interface SignedInUser {
  readonly id: string;
  readonly name: string;
  readonly email: string;
}

/** What people call the provider, or null when none is set. */
export const openIdName = (): string | null =>
  env().OIDC_ISSUER === undefined ? null : env().OIDC_NAME;

/** The organisation's own OpenID Connect provider, when the environment names one; null otherwise. */
export function openIdProvider(): {
  readonly provider: OAuthConfig<Claims>;
  readonly personOf: (profile: unknown) => Promise<SignedInUser | null>;
} | null {
  const { OIDC_ISSUER, OIDC_CLIENT_ID, OIDC_CLIENT_SECRET, OIDC_NAME } = env();
  if (OIDC_ISSUER === undefined) return null;
  return {
    provider: {
      id: 'openid',
      name: OIDC_NAME,
      type: 'oauth',
      wellKnown: `${OIDC_ISSUER.replace(/\/$/, '')}/.well-known/openid-configuration`,
      issuer: OIDC_ISSUER,
      clientId: OIDC_CLIENT_ID,
      clientSecret: OIDC_CLIENT_SECRET,
      authorization: { params: { scope: 'openid email profile' } },
      checks: ['pkce', 'state', 'nonce'],
      idToken: true,
      // Replaced by the person of this product in the sign-in callback.
      profile: ({ sub = '', name = '', email = '' }) => ({ id: sub, name, email }),
    },
    personOf: (profile) => personOf(OIDC_ISSUER, profile as Claims | undefined),
  };
}

/**
 * The person of an identity: the one linked to it, or, the first time, the one whose address the provider has verified.
 * An address the provider has not verified proves nothing and links nobody.
 */
export async function personOf(
  issuer: string,
  claims: Claims | undefined,
): Promise<SignedInUser | null> {
  if (claims?.sub === undefined || claims.sub === '') return null;
  const identityHash = hashOfSecret(JSON.stringify([issuer, claims.sub]));
  const linked = await inContext({ tokenHash: identityHash }, (db) =>
    findIdentity(db, identityHash),
  );
  if (linked !== undefined) {
    const person = await inContext({ personId: linked }, (db) => findPersonById(db, linked));
    return person === undefined ? null : { id: person.id, name: person.name, email: person.email };
  }
  const email = claims.email_verified === true ? claims.email?.trim().toLowerCase() : undefined;
  if (email === undefined) return null;
  const person = await inContext({ signInEmail: email }, (db) => findPersonByEmail(db, email));
  // An unconfirmed address here could have been claimed by someone else before its owner came.
  if (person === undefined || person.emailVerifiedAt === null) return null;
  await inContext({ personId: person.id }, (db) =>
    linkIdentity(db, { identityHash, personId: person.id, provider: issuer }),
  );
  logger.info({ event: 'identity-linked', personId: person.id }, 'a provider identity was linked');
  return { id: person.id, name: person.name, email: person.email };
}
