import { findPersonByEmail } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { signInInput } from '@/lib/people/schema';
import { hashPassword, verifyPassword } from './passwords';

let unknownPersonHash: Promise<string> | undefined;

/** The person whose e-mail and password these are, or null. An unknown address costs the same time as a known one. */
export async function checkSignIn(
  credentials: unknown,
): Promise<{ id: string; name: string; email: string } | null> {
  const parsed = signInInput.safeParse(credentials);
  if (!parsed.success) return null;
  const { email, password } = parsed.data;
  const person = await inContext({ signInEmail: email }, (db) => findPersonByEmail(db, email));
  unknownPersonHash ??= hashPassword(crypto.randomUUID());
  const hash = person?.passwordHash ?? (await unknownPersonHash);
  const matches = await verifyPassword(hash, password);
  if (person === undefined || !matches) return null;
  return { id: person.id, name: person.name, email: person.email };
}
