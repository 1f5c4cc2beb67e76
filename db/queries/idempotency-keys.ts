import type { Database } from '../client';
import type { IdempotencyKeyRow } from '../tables/rows';

export interface IdempotencyClaim {
  organisationId: string;
  actorId: string;
  key: string;
  requestHash: string;
}

export interface KeptAnswer {
  requestHash: string;
  /** Null while the first request is still at work, or was cut off. */
  status: number | null;
  body: unknown;
}

/** Claims a key for a request; returns what is kept under it when someone had claimed it before. */
export async function claimKey(
  db: Database,
  { organisationId, actorId, key, requestHash }: IdempotencyClaim,
): Promise<KeptAnswer | null> {
  const inserted = await db<IdempotencyKeyRow>('idempotency_keys')
    .insert({ organisation_id: organisationId, actor_id: actorId, key, request_hash: requestHash })
    .onConflict()
    .ignore()
    .returning('key');
  if (inserted.length > 0) return null;
  const row = await db<IdempotencyKeyRow>('idempotency_keys')
    .where({ organisation_id: organisationId, actor_id: actorId, key })
    .first();
  if (row === undefined) throw new Error('An idempotency key vanished.');
  return { requestHash: row.request_hash, status: row.status, body: row.body };
}

/** Keeps the answer that every repeat of the request is to get. */
export async function keepAnswer(
  db: Database,
  { organisationId, actorId, key }: IdempotencyClaim,
  status: number,
  body: unknown,
): Promise<void> {
  await db<IdempotencyKeyRow>('idempotency_keys')
    .where({ organisation_id: organisationId, actor_id: actorId, key })
    .update({ status, body: JSON.stringify(body) });
}

/** Frees a key whose request was refused: nothing happened, so a mended request may use it. */
export async function freeKey(
  db: Database,
  { organisationId, actorId, key }: IdempotencyClaim,
): Promise<void> {
  await db<IdempotencyKeyRow>('idempotency_keys')
    .where({ organisation_id: organisationId, actor_id: actorId, key, status: null })
    .delete();
}
