import { findPersonById, type AccountPerson } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import type { Credential } from './door';

export type SignedInPerson = AccountPerson;

/** The person of a session, unless their sessions were ended since it began. */
export async function findSignedIn(credential: Credential): Promise<SignedInPerson | null> {
  if (credential?.kind !== 'session') return null;
  const { personId, epoch } = credential;
  const person = await inContext({ personId }, (db) => findPersonById(db, personId));
  return person === undefined || person.sessionEpoch !== epoch ? null : person;
}
