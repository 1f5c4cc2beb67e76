import { listMemberships } from '@/db/queries/people';
import { inContext } from '@/db/tenant';

/** Slug of the first organisation a person belongs to, or null. */
export async function readHomeOf(personId: string): Promise<string | null> {
  const [first] = await inContext({ personId }, (db) => listMemberships(db, personId));
  return first?.organisation.slug ?? null;
}
