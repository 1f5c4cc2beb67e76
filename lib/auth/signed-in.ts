import { findPersonById, type AccountPerson } from '@/db/queries/people';
import type { Credential } from './door';
import { withSession } from './sessions';

/** A person with the session they came by. */
export type SignedInPerson = AccountPerson & { readonly sessionHash: string };

/** The person of a session in force; null for anyone else. */
export async function findSignedIn(credential: Credential): Promise<SignedInPerson | null> {
  if (credential?.kind !== 'session') return null;
  const found = await withSession(credential.secret, async (db, { personId, sessionHash }) => {
    const person = await findPersonById(db, personId);
    return person && { ...person, sessionHash };
  });
  return found ?? null;
}
