import { randomBytes } from 'node:crypto';
import { findApiToken, touchApiToken } from '@/db/queries/api-tokens';
import { inContext } from '@/db/tenant';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';
import { isTokenScope, type TokenScope } from './permissions';
import { hashOfSecret, newSecret } from './secret';

/** `mwk_` and six characters that name the token, then its secret. */
const SHAPE = /^mwk_[a-z0-9]{6}_[A-Za-z0-9_-]{43}$/;
const PREFIX_CHARACTERS = 10;

export interface NewApiToken {
  /** Shown once, never kept. */
  readonly text: string;
  readonly prefix: string;
  readonly hash: string;
}

export function newApiToken(): NewApiToken {
  const name = randomBytes(3).toString('hex');
  const text = `mwk_${name}_${newSecret()}`;
  return { text, prefix: text.slice(0, PREFIX_CHARACTERS), hash: hashOfSecret(text) };
}

export interface ApiTokenHolder {
  readonly tokenId: string;
  readonly tokenName: string;
  readonly organisationId: string;
  readonly madeBy: string;
  readonly scopes: readonly TokenScope[];
  /** Null: as far as its maker sees. */
  readonly plantIds: readonly string[] | null;
}

const NOT_GOOD = 'This API token is not good here: it is unknown, expired or revoked.';

/**
 * Whose token this text is. Throws `signedOut` for one that is malformed, unknown, expired or revoked; all alike, and
 * all at the cost of one look-up by hash, so that nothing can be learned by trying.
 */
export async function readApiToken(text: string, now: Date): Promise<ApiTokenHolder> {
  const tokenHash = hashOfSecret(text);
  const token = SHAPE.test(text)
    ? await inContext({ tokenHash }, (db) => findApiToken(db, tokenHash))
    : undefined;
  if (token === undefined || token.revokedAt !== null || token.expiresAt <= now) {
    logger.warn({ event: 'token-refused', tokenId: token?.id }, 'an API token was refused');
    throw new AppError('signedOut', NOT_GOOD);
  }
  await inContext({ organisationId: token.organisationId }, (db) =>
    touchApiToken(db, token.organisationId, token.id, now),
  );
  return {
    tokenId: token.id,
    tokenName: token.name,
    organisationId: token.organisationId,
    madeBy: token.madeBy,
    scopes: token.scopes.filter(isTokenScope),
    plantIds: token.plantIds,
  };
}
