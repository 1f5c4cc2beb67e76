import type { Database } from '../client';
import type { OneTimeTokenRow } from '../tables/rows';

export interface NewOneTimeToken {
  tokenHash: string;
  personId: string;
  purpose: OneTimeTokenRow['purpose'];
  expiresAt: Date;
}

/** Keeps a token and ends the earlier ones of the same purpose; call in the person's context. */
export async function replaceOneTimeToken(
  db: Database,
  token: NewOneTimeToken,
  now: Date,
): Promise<void> {
  await db<OneTimeTokenRow>('one_time_tokens')
    .where({ person_id: token.personId, purpose: token.purpose, used_at: null })
    .update({ used_at: now });
  await db<OneTimeTokenRow>('one_time_tokens').insert({
    token_hash: token.tokenHash,
    person_id: token.personId,
    purpose: token.purpose,
    expires_at: token.expiresAt,
  });
}

/** Whose token in force this is; call in the token's own context. */
export async function findOneTimeToken(
  db: Database,
  tokenHash: string,
  purpose: OneTimeTokenRow['purpose'],
  now: Date,
): Promise<string | undefined> {
  const row = await db<OneTimeTokenRow>('one_time_tokens')
    .where({ token_hash: tokenHash, purpose, used_at: null })
    .where('expires_at', '>', now)
    .first('person_id');
  return row?.person_id;
}

/** Uses a token up; false when someone was faster. */
export async function spendOneTimeToken(
  db: Database,
  personId: string,
  tokenHash: string,
  now: Date,
): Promise<boolean> {
  const used = await db<OneTimeTokenRow>('one_time_tokens')
    .where({ token_hash: tokenHash, person_id: personId, used_at: null })
    .where('expires_at', '>', now)
    .update({ used_at: now });
  return used === 1;
}
