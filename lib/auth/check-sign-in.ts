import { database } from '@/db/client';
import { findPersonByEmail } from '@/db/queries/people';
import { signInInput } from '@/lib/people/schema';
import { hashPassword, verifyPassword } from './passwords';

let unknownPersonHash: Promise<string> | undefined;

/** The person whose e-mail and password these are, or null. An unknown address costs the same time as a known one. */
export async function checkSignIn(
  credentials: unknown,
): Promise<{ id: string; name: string; email: string } | null> {
  const parsed = signInInput.safeParse(credentials);
  if (!parsed.success) return null;
  const person = await findPersonByEmail(database(), parsed.data.email);
  unknownPersonHash ??= hashPassword(crypto.randomUUID());
  const hash = person?.passwordHash ?? (await unknownPersonHash);
  const matches = await verifyPassword(hash, parsed.data.password);
  if (person === undefined || !matches) return null;
  return { id: person.id, name: person.name, email: person.email };
}
