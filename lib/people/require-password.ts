import type { AccountPerson } from '@/db/queries/people';
import { countTryOf, refuseWhenClosed } from '@/lib/auth/limits';
import { verifyPassword } from '@/lib/auth/passwords';
import { AppError } from '@/lib/errors';

/** Before an account's locks are changed its owner proves to be there (OWASP ASVS V7.5.1). Throws `badInput`. */
export async function requirePassword(person: AccountPerson, password: string): Promise<void> {
  await refuseWhenClosed('account', person.id);
  if (person.passwordHash !== null && (await verifyPassword(person.passwordHash, password))) return;
  await countTryOf('account', person.id);
  throw new AppError('badInput', 'This is not your present password.');
}
