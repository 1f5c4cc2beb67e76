import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { checkSignIn } from '@/lib/auth/check-sign-in';
import { hashPassword } from '@/lib/auth/passwords';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;

const EMAIL = 'operator@small.example';
const PASSWORD = 'correct horse, wet battery';

beforeAll(async () => {
  database = await createTestDatabase();
  process.env.DATABASE_URL = database.url;
  admin = knex(ownerKnexConfig(database.adminUrl));
  await insertSmallWorks(admin);
  await admin('people')
    .where({ id: SMALL_WORKS.personId })
    .update({ password_hash: await hashPassword(PASSWORD) });
});
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
});

const wrong = (email: string) => checkSignIn({ email, password: 'not it' });

describe('signing in', () => {
  it('knows a person by e-mail, in any case, and password', async () => {
    expect(await checkSignIn({ email: ' Operator@Small.Example ', password: PASSWORD })).toEqual({
      id: SMALL_WORKS.personId,
      name: 'Operator',
      email: EMAIL,
    });
  });

  it.each([
    [{ email: EMAIL, password: 'not it' }],
    [{ email: 'nobody@small.example', password: PASSWORD }],
    [{ email: 'no address', password: PASSWORD }],
    [{ email: EMAIL }],
    [null],
  ])('knows nobody by %j', async (credentials) => {
    expect(await checkSignIn(credentials)).toBeNull();
  });

  it('forgets wrong passwords once the right one came', async () => {
    for (let i = 0; i < 8; i++) await wrong(EMAIL);
    expect(await checkSignIn({ email: EMAIL, password: PASSWORD })).not.toBeNull();
    for (let i = 0; i < 8; i++) expect(await wrong(EMAIL)).toBeNull();
    expect(await checkSignIn({ email: EMAIL, password: PASSWORD })).not.toBeNull();
  });

  it('closes an address after too many wrong passwords, known or unknown alike, and no other', async () => {
    for (const email of [EMAIL, 'stranger@small.example']) {
      for (let i = 0; i < 11; i++) await wrong(email);
      await expect(checkSignIn({ email, password: PASSWORD })).rejects.toMatchObject({
        code: 'tooMany',
      });
    }
    expect(await wrong('another@small.example')).toBeNull();
  });

  it('keeps no address in the table of tries', async () => {
    const kept = JSON.stringify(await admin('rate_limits'));
    expect(kept).not.toContain('small.example');
    expect(kept).toMatch(/sign-in/);
  });
});
