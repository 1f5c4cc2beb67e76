import knex, { type Knex } from 'knex';
import { generate } from 'otplib';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { checkSignIn } from '@/lib/auth/check-sign-in';
import { hashPassword } from '@/lib/auth/passwords';
import { beginSecondFactor, confirmSecondFactor, endSecondFactor } from '@/lib/auth/second-factor';
import { findSignedIn } from '@/lib/auth/signed-in';
import { requireProof } from '@/lib/people/require-proof';
import { sessionOf } from '../support/session-of';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;
const EMAIL = 'operator@small.example';
const PASSWORD = 'three quiet herons wade';
const START_S = 1_800_000_000;
/** A clock that stands `seconds` after the start. */
const at = (seconds: number) => () => new Date((START_S + seconds) * 1000);
const codeAt = (secret: string, seconds: number) => generate({ secret, epoch: START_S + seconds });

beforeAll(async () => {
  database = await createTestDatabase();
  process.env.DATABASE_URL = database.url;
  process.env.NEXTAUTH_SECRET = 'a-secret-for-tests-only-0123456789abcdef';
  admin = knex(ownerKnexConfig(database.adminUrl));
  await insertSmallWorks(admin);
  await admin('people')
    .where({ id: SMALL_WORKS.personId })
    .update({ password_hash: await hashPassword(PASSWORD) });
});
beforeEach(async () => {
  await admin('rate_limits').delete();
  await admin('recovery_codes').delete();
  await admin('people').update({ totp_secret: null, totp_confirmed_at: null, totp_last_step: 0 });
});
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
});

async function me() {
  const person = await findSignedIn(await sessionOf(SMALL_WORKS.personId));
  if (person === null) throw new Error('Not signed in.');
  return person;
}
async function turnedOn() {
  const { secret } = await beginSecondFactor(await me());
  const codes = await confirmSecondFactor(await me(), await codeAt(secret, 0), at(0));
  return { secret, codes };
}
const signInAt = (seconds: number, code?: string) =>
  checkSignIn(
    { email: EMAIL, password: PASSWORD, ...(code === undefined ? {} : { code }) },
    at(seconds),
  );

describe('the second factor', () => {
  it('is asked for only once a first code has confirmed it', async () => {
    const { secret } = await beginSecondFactor(await me());
    expect(await signInAt(0)).not.toBeNull();
    await expect(confirmSecondFactor(await me(), '000000', at(0))).rejects.toMatchObject({
      code: 'badInput',
    });
    await confirmSecondFactor(await me(), await codeAt(secret, 0), at(0));
    await expect(signInAt(30)).rejects.toMatchObject({ code: 'forbidden' });
  });

  it('opens with the code of now, each taken once', async () => {
    const { secret } = await turnedOn();
    const code = await codeAt(secret, 60);
    expect(await signInAt(60, code)).toMatchObject({ id: SMALL_WORKS.personId });
    await expect(signInAt(61, code)).rejects.toMatchObject({ code: 'forbidden' });
    await expect(signInAt(600, code)).rejects.toMatchObject({ code: 'forbidden' });
    expect(await signInAt(120, await codeAt(secret, 120))).not.toBeNull();
  });

  it('takes a code once even when it comes twice at the same moment', async () => {
    const { secret } = await turnedOn();
    const code = await codeAt(secret, 60);
    const both = await Promise.allSettled([signInAt(60, code), signInAt(60, code)]);
    expect(both.filter(({ status }) => status === 'fulfilled')).toHaveLength(1);
  });

  it('opens with each recovery code once, however it is written', async () => {
    const { codes } = await turnedOn();
    expect(codes).toHaveLength(10);
    const [first = ''] = codes;
    expect(await signInAt(90, first.replaceAll('-', '').toUpperCase())).not.toBeNull();
    await expect(signInAt(95, first)).rejects.toMatchObject({ code: 'forbidden' });
    expect(await signInAt(96, codes[1])).not.toBeNull();
  });

  it('says nothing to who does not know the password', async () => {
    const { secret } = await turnedOn();
    expect(
      await checkSignIn(
        { email: EMAIL, password: 'wrong', code: await codeAt(secret, 60) },
        at(60),
      ),
    ).toBeNull();
  });

  it('closes the address after ten wrong codes', async () => {
    await turnedOn();
    for (let i = 0; i < 11; i++) {
      await expect(signInAt(60, '123456')).rejects.toMatchObject({ code: 'forbidden' });
    }
    await expect(signInAt(60, '123456')).rejects.toMatchObject({ code: 'tooMany' });
  });

  it('keeps its secret encrypted and its recovery codes hashed', async () => {
    const { secret, codes } = await turnedOn();
    const kept = JSON.stringify([await admin('people'), await admin('recovery_codes')]);
    expect(kept).not.toContain(secret);
    for (const code of codes) expect(kept).not.toContain(code.replaceAll('-', ''));
  });

  it('is asked for, with the password, before the account’s locks are changed', async () => {
    const { secret } = await turnedOn();
    const proof = { password: PASSWORD, code: '' };
    await expect(requireProof(await me(), proof, at(90))).rejects.toMatchObject({
      code: 'badInput',
    });
    await requireProof(await me(), { ...proof, code: await codeAt(secret, 90) }, at(90));
  });

  it('is gone when it is turned off', async () => {
    await turnedOn();
    await endSecondFactor(await me());
    expect(await signInAt(60)).not.toBeNull();
  });
});

describe('the reference values of RFC 6238', () => {
  // RFC 6238, appendix B, SHA-1, last six of eight figures.
  it.each([
    [59, '287082'],
    [1_111_111_109, '081804'],
    [1_234_567_890, '005924'],
    [2_000_000_000, '279037'],
  ])('at %i s the code is %s', async (epoch, code) => {
    // "12345678901234567890" in base 32.
    const secret = 'GEZDGNBVGY3TQOJQGEZDGNBVGY3TQOJQ';
    expect(await generate({ secret, epoch })).toBe(code);
  });
});
