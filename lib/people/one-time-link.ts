import type { Database } from '@/db/client';
import {
  findOneTimeToken,
  replaceOneTimeToken,
  spendOneTimeToken,
} from '@/db/queries/one-time-tokens';
import { inContext } from '@/db/tenant';
import { hashOfSecret, newSecret } from '@/lib/auth/secret';
import type { Clock } from '@/lib/clock';
import { AppError } from '@/lib/errors';

export type LinkPurpose = 'verify-email' | 'reset-password';

const SPENT =
  'This link does not work any more: it was used, it is too old, or a newer one was sent. Ask for another.';

/** A secret for a letter, and how to keep its hash: in the person's context, ending earlier ones. */
export function newLink(personId: string, purpose: LinkPurpose, clock: Clock, lifeMs: number) {
  const secret = newSecret();
  return {
    secret,
    keep: (db: Database): Promise<void> =>
      replaceOneTimeToken(
        db,
        {
          tokenHash: hashOfSecret(secret),
          personId,
          purpose,
          expiresAt: new Date(clock().getTime() + lifeMs),
        },
        clock(),
      ),
  };
}

/**
 * Uses a link up and does its work in the person's context, both or neither. Throws `notFound` for a link that is spent,
 * too old or unknown, all alike.
 */
export async function spendLink<T>(
  secret: string,
  purpose: LinkPurpose,
  clock: Clock,
  work: (db: Database, personId: string) => Promise<T>,
): Promise<T> {
  const tokenHash = hashOfSecret(secret);
  const personId = await inContext({ tokenHash }, (db) =>
    findOneTimeToken(db, tokenHash, purpose, clock()),
  );
  if (personId === undefined) throw new AppError('notFound', SPENT);
  return inContext({ personId }, async (db) => {
    if (!(await spendOneTimeToken(db, personId, tokenHash, clock()))) {
      throw new AppError('notFound', SPENT);
    }
    return work(db, personId);
  });
}
