import { randomInt } from 'node:crypto';
import { generateSecret, generateURI, verify } from 'otplib';
import { takeTotpStep, updatePerson, type AccountPerson } from '@/db/queries/people';
import { replaceRecoveryCodes, spendRecoveryCode } from '@/db/queries/recovery-codes';
import { inContext } from '@/db/tenant';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError } from '@/lib/errors';
import { decrypt, encrypt } from './encryption';
import { hashOfSecret } from './secret';

const STEP_S = 30;
const CODES = 10;
/** No vowels and no look-alikes: easily read aloud, no words. */
const LETTERS = 'bcdfghjkmnpqrstvwxz23456789';
/** 24 of 27 letters are 114 bits: more than can be tried, so that a plain hash keeps them (OWASP ASVS V6.5.2). */
const CODE_LETTERS = 24;

/** A new secret for the authenticator, kept but not in force until a first code confirms it. */
export async function beginSecondFactor(
  person: AccountPerson,
): Promise<{ secret: string; uri: string }> {
  if (person.totpConfirmedAt !== null) {
    throw new AppError('conflict', 'The second factor is on already. Turn it off first.');
  }
  const secret = generateSecret();
  await inContext({ personId: person.id }, (db) =>
    updatePerson(db, person.id, { totpSecret: encrypt(secret) }),
  );
  return { secret, uri: generateURI({ issuer: 'Marlwick', label: person.email, secret }) };
}

/** Puts the second factor in force with its first code; returns the recovery codes, shown this once. */
export async function confirmSecondFactor(
  person: AccountPerson,
  code: string,
  clock: Clock = systemClock,
): Promise<readonly string[]> {
  if (person.totpConfirmedAt !== null || person.totpSecret === null) {
    throw new AppError('conflict', 'There is nothing to confirm. Begin again.');
  }
  if (!(await takeTotp(person, code, clock))) {
    throw new AppError(
      'badInput',
      'This code is not the one of now. Wait for the next, and try it.',
    );
  }
  const codes = Array.from({ length: CODES }, newRecoveryCode);
  await inContext({ personId: person.id }, async (db) => {
    await updatePerson(db, person.id, { totpConfirmedAt: clock() });
    await replaceRecoveryCodes(db, person.id, codes.map(hashOfCode));
  });
  return codes;
}

/** Turns it off; the caller has checked who asks. */
export async function endSecondFactor(person: AccountPerson): Promise<void> {
  await inContext({ personId: person.id }, async (db) => {
    await updatePerson(db, person.id, { totpSecret: null, totpConfirmedAt: null });
    await replaceRecoveryCodes(db, person.id, []);
  });
}

/** True for the authenticator's code of now, each taken once only, or for a recovery code not used before. */
export async function takeSecondFactor(
  person: AccountPerson,
  code: string,
  clock: Clock = systemClock,
): Promise<boolean> {
  if (/^\d{6}$/.test(code.replaceAll(' ', ''))) return takeTotp(person, code, clock);
  return inContext({ personId: person.id }, (db) =>
    spendRecoveryCode(db, person.id, hashOfCode(code), clock()),
  );
}

async function takeTotp(person: AccountPerson, code: string, clock: Clock): Promise<boolean> {
  if (person.totpSecret === null) return false;
  const token = code.replaceAll(' ', '');
  if (!/^\d{6}$/.test(token)) return false;
  const result = await verify({
    secret: decrypt(person.totpSecret),
    token,
    epoch: Math.floor(clock().getTime() / 1000),
    // A clock half a minute off still opens.
    epochTolerance: STEP_S,
  });
  if (!result.valid || !('timeStep' in result)) return false;
  return inContext({ personId: person.id }, (db) => takeTotpStep(db, person.id, result.timeStep));
}

function newRecoveryCode(): string {
  const letters = Array.from(
    { length: CODE_LETTERS },
    () => LETTERS[randomInt(LETTERS.length)] ?? '',
  ).join('');
  return letters.replace(/(.{4})(?=.)/g, '$1-');
}

/** Hyphens, spaces and capitals do not matter. */
const hashOfCode = (code: string): string =>
  hashOfSecret(code.toLowerCase().replaceAll(/[^a-z0-9]/g, ''));
