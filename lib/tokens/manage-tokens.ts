import {
  insertApiToken,
  listApiTokens,
  revokeApiToken,
  type KeptApiToken,
} from '@/db/queries/api-tokens';
import { recordChange } from '@/lib/audit/record-change';
import { newApiToken } from '@/lib/auth/api-token';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { systemClock, type Clock } from '@/lib/clock';
import { notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { checkPlantIds } from '@/lib/people/plant-ids';
import type { TokenInput } from './schema';

const DAY_MS = 86_400_000;

export type ListedToken = KeptApiToken & { readonly madeByName: string };

/** Every token of the actor's organisation, newest first; never its secret, which nobody keeps. */
export const readTokens = (actor: Actor): Promise<ListedToken[]> =>
  inTenant(actor, (db) => listApiTokens(db, actor.organisation.id));

/** Makes a token that acts for the actor, narrowed. `text` is shown once and cannot be read again. */
export async function makeToken(
  actor: Actor,
  { name, scopes, plantIds, days }: TokenInput,
  clock: Clock = systemClock,
): Promise<{ tokenId: string; text: string }> {
  const secret = newApiToken();
  const id = newId('apiToken');
  const expiresAt = new Date(clock().getTime() + days * DAY_MS);
  await inTenant(actor, async (db) => {
    if (plantIds !== null) await checkPlantIds(db, actor, plantIds);
    await insertApiToken(db, {
      id,
      organisationId: actor.organisation.id,
      name,
      prefix: secret.prefix,
      tokenHash: secret.hash,
      scopes,
      plantIds,
      madeBy: actor.personId,
      expiresAt,
    });
    await recordChange(
      db,
      actor,
      {
        action: 'token.made',
        subjectId: id,
        detail: {
          name,
          prefix: secret.prefix,
          scopes,
          plantIds,
          expiresAt: expiresAt.toISOString(),
        },
      },
      clock,
    );
  });
  return { tokenId: id, text: secret.text };
}

/** Ends a token at once. Throws `notFound` when there is none in force. */
export async function revokeToken(
  actor: Actor,
  tokenId: string,
  clock: Clock = systemClock,
): Promise<void> {
  await inTenant(actor, async (db) => {
    const name = await revokeApiToken(db, actor.organisation.id, tokenId, clock());
    if (name === undefined) throw notFound('token in force');
    await recordChange(
      db,
      actor,
      { action: 'token.revoked', subjectId: tokenId, detail: { name } },
      clock,
    );
  });
}
