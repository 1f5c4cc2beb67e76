import type { Database } from '../client';
import type { ApiTokenRow, PersonRow } from '../tables/rows';

export interface KeptApiToken {
  id: string;
  organisationId: string;
  name: string;
  prefix: string;
  scopes: string[];
  plantIds: string[] | null;
  madeBy: string;
  createdAt: Date;
  expiresAt: Date;
  lastUsedAt: Date | null;
  revokedAt: Date | null;
}

const toToken = (row: ApiTokenRow): KeptApiToken => ({
  id: row.id,
  organisationId: row.organisation_id,
  name: row.name,
  prefix: row.prefix,
  scopes: row.scopes,
  plantIds: row.plant_ids,
  madeBy: row.made_by,
  createdAt: row.created_at,
  expiresAt: row.expires_at,
  lastUsedAt: row.last_used_at,
  revokedAt: row.revoked_at,
});

/** The token with this hash; call in the hash's own context, before any organisation is known. */
export async function findApiToken(
  db: Database,
  tokenHash: string,
): Promise<KeptApiToken | undefined> {
  const row = await db<ApiTokenRow>('api_tokens').where({ token_hash: tokenHash }).first();
  return row && toToken(row);
}

/** Notes the use of a token, at most once a minute. */
export async function touchApiToken(
  db: Database,
  organisationId: string,
  id: string,
  now: Date,
): Promise<void> {
  await db<ApiTokenRow>('api_tokens')
    .where({ organisation_id: organisationId, id })
    .whereRaw(`(last_used_at is null or last_used_at < ?::timestamptz - interval '1 minute')`, [
      now,
    ])
    .update({ last_used_at: now });
}

export async function insertApiToken(
  db: Database,
  token: Omit<KeptApiToken, 'createdAt' | 'lastUsedAt' | 'revokedAt'> & { tokenHash: string },
): Promise<void> {
  await db<ApiTokenRow>('api_tokens').insert({
    id: token.id,
    organisation_id: token.organisationId,
    name: token.name,
    prefix: token.prefix,
    token_hash: token.tokenHash,
    scopes: token.scopes,
    plant_ids: token.plantIds,
    made_by: token.madeBy,
    expires_at: token.expiresAt,
  });
}

/** All tokens of an organisation, newest first, with their maker's name. */
export async function listApiTokens(
  db: Database,
  organisationId: string,
): Promise<(KeptApiToken & { madeByName: string })[]> {
  const rows = await db<ApiTokenRow>('api_tokens')
    .leftJoin<PersonRow>('people', 'people.id', 'api_tokens.made_by')
    .where({ organisation_id: organisationId })
    .orderBy('api_tokens.created_at', 'desc')
    .select<(ApiTokenRow & { person_name: string | null })[]>(
      'api_tokens.*',
      'people.name as person_name',
    );
  return rows.map((row) => ({
    ...toToken(row),
    madeByName: row.person_name ?? 'someone who left',
  }));
}

/** The name of the token revoked, or nothing when there is none in force. */
export async function revokeApiToken(
  db: Database,
  organisationId: string,
  id: string,
  now: Date,
): Promise<string | undefined> {
  const [row] = await db<ApiTokenRow>('api_tokens')
    .where({ organisation_id: organisationId, id, revoked_at: null })
    .update({ revoked_at: now })
    .returning<{ name: string }[]>('name');
  return row?.name;
}
