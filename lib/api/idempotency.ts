import { createHash } from 'node:crypto';
import {
  claimKey,
  freeKey,
  keepAnswer,
  type IdempotencyClaim,
} from '@/db/queries/idempotency-keys';
import { canonicalJson } from '@/lib/audit/chain';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { AppError } from '@/lib/errors';

const HEADER = 'idempotency-key';
const SHAPE = /^[\x21-\x7e]{1,255}$/;

/** Throws `badInput` without a usable key. */
export function idempotencyKeyOf(request: Request): string {
  const key = request.headers.get(HEADER);
  if (key === null || !SHAPE.test(key)) {
    throw new AppError(
      'badInput',
      'Send an Idempotency-Key of your own (1 to 255 characters), so that a repeat makes nothing twice.',
    );
  }
  return key;
}

const sha256 = (text: string): string => createHash('sha256').update(text).digest('hex');

/** One UUID per actor and key: what the use case keeps its record under, so that even a cut-off first try is found. */
function clientKeyFor(organisationId: string, actorId: string, key: string): string {
  const hex = sha256(JSON.stringify([organisationId, actorId, key]));
  // Version 8: made by the product's own rule (RFC 9562).
  return `${hex.slice(0, 8)}-${hex.slice(8, 12)}-8${hex.slice(13, 16)}-8${hex.slice(17, 20)}-${hex.slice(20, 32)}`;
}

/**
 * Runs a creating request under its key. The first that ends well leaves its answer; every repeat gets that, and nothing
 * happens twice: repeats that come while the first is at work, or after it was cut off, find its record by `clientKey`.
 * Throws `badInput` when the key came with another request before.
 */
export async function once(
  actor: Actor,
  key: string,
  request: { readonly operation: string; readonly path: string; readonly body: unknown },
  status: number,
  work: (clientKey: string) => Promise<unknown>,
): Promise<{ answer: unknown; isRepeat: boolean }> {
  const actorId = actor.token?.id ?? actor.personId;
  const claim: IdempotencyClaim = {
    organisationId: actor.organisation.id,
    actorId,
    key,
    requestHash: sha256(canonicalJson(request)),
  };
  const earlier = await inTenant(actor, (db) => claimKey(db, claim));
  if (earlier !== null && earlier.requestHash !== claim.requestHash) {
    throw new AppError('badInput', 'This Idempotency-Key came with another request before.');
  }
  if (earlier !== null && earlier.status !== null) return { answer: earlier.body, isRepeat: true };
  try {
    const answer = await work(clientKeyFor(claim.organisationId, actorId, key));
    await inTenant(actor, (db) => keepAnswer(db, claim, status, answer));
    return { answer, isRepeat: earlier !== null };
  } catch (error) {
    if (earlier === null && error instanceof AppError)
      await inTenant(actor, (db) => freeKey(db, claim));
    throw error;
  }
}
