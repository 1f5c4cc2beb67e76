import type { AccountPerson } from '@/db/queries/people';
import { countTryOf, refuseWhenClosed } from '@/lib/auth/limits';
import { confirmSecondFactor, endSecondFactor } from '@/lib/auth/second-factor';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError } from '@/lib/errors';
import { sendSecondFactorChanged } from '@/lib/mail/account-letters';
import { requireProof, type Proof } from './require-proof';

/** Puts the second factor in force with its first code; returns the recovery codes, shown this once. */
export async function turnOnSecondFactor(
  person: AccountPerson,
  code: string,
  clock: Clock = systemClock,
): Promise<readonly string[]> {
  await refuseWhenClosed('account', person.id);
  try {
    const codes = await confirmSecondFactor(person, code, clock);
    await sendSecondFactorChanged(person.email, person.name, true);
    return codes;
  } catch (error) {
    if (error instanceof AppError && error.code === 'badInput') {
      await countTryOf('account', person.id);
    }
    throw error;
  }
}

/** Turns it off for who proves to be there; says so by letter. */
export async function turnOffSecondFactor(
  person: AccountPerson,
  proof: Proof,
  clock: Clock = systemClock,
): Promise<void> {
  await requireProof(person, proof, clock);
  await endSecondFactor(person);
  await sendSecondFactorChanged(person.email, person.name, false);
}
