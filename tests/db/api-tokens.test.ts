import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { readApiToken } from '@/lib/auth/api-token';
import { enter, type Actor } from '@/lib/auth/door';
import type { TokenScope } from '@/lib/auth/permissions';
import { readPlants } from '@/lib/plants/read-plants';
import { makeToken, readTokens, revokeToken } from '@/lib/tokens/manage-tokens';
import { sessionOf } from '../support/session-of';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;
let manager: Actor;
const DAY_MS = 86_400_000;

beforeAll(async () => {
  database = await createTestDatabase();
  process.env.DATABASE_URL = database.url;
  admin = knex(ownerKnexConfig(database.adminUrl));
  await insertSmallWorks(admin);
  await insertSmallWorks(admin, '-2');
  await admin('memberships').update({ role: 'manager' });
  manager = await enter(await sessionOf(SMALL_WORKS.personId), 'small', 'token.write');
});
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
});

const make = (scopes: TokenScope[], plantIds: string[] | null = null) =>
  makeToken(manager, { name: 'Logger', scopes, plantIds, days: 30 });
const bring = async (text: string, now = new Date()) => ({
  kind: 'token' as const,
  ...(await readApiToken(text, now)),
});

describe('an API token', () => {
  it('opens what it was given, for its own organisation, and says who acts', async () => {
    const { text, tokenId } = await make(['plant.read']);
    const actor = await enter(await bring(text), 'small', 'plant.read');
    expect(actor).toMatchObject({
      personId: SMALL_WORKS.personId,
      token: { id: tokenId, name: 'Logger' },
    });
    await expect(enter(await bring(text), 'small-2', 'plant.read')).rejects.toMatchObject({
      code: 'notFound',
    });
    await expect(enter(await bring(text), 'small', 'sample.read')).rejects.toMatchObject({
      code: 'forbidden',
    });
  });

  it('never does more than its maker may now', async () => {
    const { text } = await make(['audit.read', 'plant.read']);
    await admin('memberships')
      .where({ person_id: SMALL_WORKS.personId })
      .update({ role: 'operator' });
    await expect(enter(await bring(text), 'small', 'audit.read')).rejects.toMatchObject({
      code: 'forbidden',
    });
    await expect(enter(await bring(text), 'small', 'plant.read')).resolves.toBeDefined();
    await admin('memberships')
      .where({ person_id: SMALL_WORKS.personId })
      .update({ left_at: new Date() });
    await expect(enter(await bring(text), 'small', 'plant.read')).rejects.toMatchObject({
      code: 'notFound',
    });
    await admin('memberships').update({ role: 'manager', left_at: null });
  });

  it('is narrowed to its plants', async () => {
    const { text } = await make(['plant.read'], [SMALL_WORKS.plantId]);
    await admin('plants').insert({
      ...(await admin('plants').where({ id: SMALL_WORKS.plantId }).first<object>()),
      id: 'plt_new',
      slug: 'new',
    });
    const actor = await enter(await bring(text), 'small', 'plant.read');
    expect((await readPlants(actor)).map(({ id }) => id)).toEqual([SMALL_WORKS.plantId]);
    await expect(make(['plant.read'], [`${SMALL_WORKS.plantId}-2`])).rejects.toMatchObject({
      code: 'badInput',
    });
  });

  it.each([
    ['nothing', ''],
    ['another shape', 'mwk_not_a_token'],
    ['a secret of nobody', `mwk_0a0a0a_${'A'.repeat(43)}`],
  ])('is not %s', async (_what, text) => {
    await expect(readApiToken(text, new Date())).rejects.toMatchObject({ code: 'signedOut' });
  });

  it('ends when it expires, and at once when it is revoked', async () => {
    const { text, tokenId } = await make(['plant.read']);
    await expect(readApiToken(text, new Date(Date.now() + 31 * DAY_MS))).rejects.toMatchObject({
      code: 'signedOut',
    });
    await revokeToken(manager, tokenId);
    await expect(readApiToken(text, new Date())).rejects.toMatchObject({ code: 'signedOut' });
    await expect(revokeToken(manager, tokenId)).rejects.toMatchObject({ code: 'notFound' });
  });

  it('is kept as a hash with its prefix, remembers its last use, and stands in the trail', async () => {
    const { text, tokenId } = await make(['plant.read']);
    await readApiToken(text, new Date());
    const listed = (await readTokens(manager)).find(({ id }) => id === tokenId);
    expect(listed?.prefix).toBe(text.slice(0, 10));
    expect(listed?.lastUsedAt).not.toBeNull();
    const kept = JSON.stringify([await admin('api_tokens'), await admin('audit_entries')]);
    expect(kept).not.toContain(text.slice(11));
    expect(kept).toContain('token.made');
  });
});
