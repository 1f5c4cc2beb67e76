import knex, { type Knex } from 'knex';
import { randomBytes } from 'node:crypto';
import { hashOfSecret } from '@/lib/auth/secret';
import { TOKEN_SCOPES, type TokenScope } from '@/lib/auth/permissions';

export interface TokenWish {
  readonly organisationId: string;
  readonly madeBy: string;
  readonly scopes?: readonly TokenScope[];
  readonly plantIds?: readonly string[] | null;
  readonly expiresAt?: Date;
  readonly revokedAt?: Date | null;
}

/** The administrator's connection to the running server's database, which sees every row. */
export const adminOf = (adminUrl: string): Knex =>
  knex({ client: 'pg', connection: adminUrl, pool: { min: 0, max: 2 } });

/** A token put straight into the database, so that tests can have expired and revoked ones. */
export async function insertToken(admin: Knex, wish: TokenWish): Promise<string> {
  const text = `mwk_${randomBytes(3).toString('hex')}_${randomBytes(32).toString('base64url')}`;
  await admin('api_tokens').insert({
    id: `tok_${randomBytes(16).toString('hex')}`,
    organisation_id: wish.organisationId,
    name: 'Test',
    prefix: text.slice(0, 10),
    token_hash: hashOfSecret(text),
    scopes: wish.scopes ?? TOKEN_SCOPES,
    plant_ids: wish.plantIds ?? null,
    made_by: wish.madeBy,
    expires_at: wish.expiresAt ?? new Date(Date.now() + 3_600_000),
    revoked_at: wish.revokedAt ?? null,
  });
  return text;
}
