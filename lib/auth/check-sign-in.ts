import { findPersonByEmail, type AccountPerson } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { AppError } from '@/lib/errors';
import { systemClock, type Clock } from '@/lib/clock';
import { logger } from '@/lib/logger';
import { signInInput } from '@/lib/people/schema';
import { countTryOf, forgetTriesOf, refuseWhenClosed } from './limits';
import { hashPassword, verifyPassword } from './passwords';
import { takeSecondFactor } from './second-factor';
import { SECOND_FACTOR_NEEDED } from './sign-in-words';

let unknownPersonHash: Promise<string> | undefined;

export interface SignedIn {
  readonly id: string;
  readonly name: string;
  readonly email: string;
}

/**
 * The person whose e-mail, password and, where they use one, second factor these are, or null. An unknown address costs
 * the same time and the same tries as a known one; anything more is said only to someone who knows the password.
 * Throws `tooMany` while an address is closed after too many wrong tries.
 */
export async function checkSignIn(
  credentials: unknown,
  clock: Clock = systemClock,
): Promise<SignedIn | null> {
  const parsed = signInInput.safeParse(credentials);
  if (!parsed.success) return null;
  const { email, password, code } = parsed.data;
  await refuseWhenClosed('sign-in', email);
  const person = await inContext({ signInEmail: email }, (db) => findPersonByEmail(db, email));
  unknownPersonHash ??= hashPassword(crypto.randomUUID());
  const hash = person?.passwordHash ?? (await unknownPersonHash);
  const matches = await verifyPassword(hash, password);
  if (person === undefined || person.passwordHash === null || !matches) {
    await countTryOf('sign-in', email);
    logger.warn({ event: 'sign-in-refused', personId: person?.id }, 'wrong e-mail or password');
    return null;
  }
  if (person.emailVerifiedAt === null) {
    throw new AppError(
      'forbidden',
      'Confirm your address first, by the link we sent you. “Forgotten password” sends another.',
    );
  }
  await requireSecondFactor(person, email, code, clock);
  await forgetTriesOf('sign-in', email);
  return { id: person.id, name: person.name, email: person.email };
}

async function requireSecondFactor(
  person: AccountPerson,
  email: string,
  code: string,
  clock: Clock,
): Promise<void> {
  if (person.totpConfirmedAt === null) return;
  if (code === '') throw new AppError('forbidden', SECOND_FACTOR_NEEDED);
  if (await takeSecondFactor(person, code, clock)) return;
  await countTryOf('sign-in', email);
  logger.warn({ event: 'second-factor-refused', personId: person.id }, 'wrong second factor');
  throw new AppError(
    'forbidden',
    'This code is not the one of now. Wait for the next, and try it.',
  );
}
