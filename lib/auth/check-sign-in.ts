import { findPersonByEmail } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { AppError } from '@/lib/errors';
import { signInInput } from '@/lib/people/schema';
import { hashPassword, verifyPassword } from './passwords';
import { countWrongPassword, forgetWrongPasswords, signInBlockedForS } from './sign-in-limit';

let unknownPersonHash: Promise<string> | undefined;

/**
 * The person whose e-mail and password these are, or null. An unknown address costs the same time and the same tries as
 * a known one. Throws `tooMany` while an address is closed after too many wrong passwords.
 */
export async function checkSignIn(
  credentials: unknown,
): Promise<{ id: string; name: string; email: string } | null> {
  const parsed = signInInput.safeParse(credentials);
  if (!parsed.success) return null;
  const { email, password } = parsed.data;
  if ((await signInBlockedForS(email)) > 0) {
    throw new AppError('tooMany', 'Too many wrong passwords. Wait a quarter of an hour.');
  }
  const person = await inContext({ signInEmail: email }, (db) => findPersonByEmail(db, email));
  unknownPersonHash ??= hashPassword(crypto.randomUUID());
  const hash = person?.passwordHash ?? (await unknownPersonHash);
  const matches = await verifyPassword(hash, password);
  if (person === undefined || !matches) {
    await countWrongPassword(email);
    return null;
  }
  await forgetWrongPasswords(email);
  return { id: person.id, name: person.name, email: person.email };
}
