import type { AccountPerson } from '@/db/queries/people';
import { countTryOf, refuseWhenClosed } from '@/lib/auth/limits';
import { verifyPassword } from '@/lib/auth/passwords';
import { takeSecondFactor } from '@/lib/auth/second-factor';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError } from '@/lib/errors';

/** What a person proves to be there with. */
export interface Proof {
  readonly password: string;
  /** The second factor's, where it is on. */
  readonly code: string;
}

/**
 * Before an account's locks are changed its owner proves to be there, with all that signing in asks for (OWASP ASVS
 * V7.5.1). Throws `badInput`.
 */
export async function requireProof(
  person: AccountPerson,
  { password, code }: Proof,
  clock: Clock = systemClock,
): Promise<void> {
  await refuseWhenClosed('account', person.id);
  const knows =
    person.passwordHash !== null && (await verifyPassword(person.passwordHash, password));
  if (!knows) {
    await countTryOf('account', person.id);
    throw new AppError('badInput', 'This is not your present password.');
  }
  if (person.totpConfirmedAt === null || (await takeSecondFactor(person, code, clock))) return;
  await countTryOf('account', person.id);
  throw new AppError(
    'badInput',
    'Write the code your authenticator shows now, or a recovery code.',
  );
}
