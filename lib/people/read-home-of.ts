import { database } from '@/db/client';
import { listMemberships } from '@/db/queries/people';

/** Slug of the first organisation a person belongs to, or null. */
export async function readHomeOf(personId: string): Promise<string | null> {
  const [first] = await listMemberships(database(), personId);
  return first?.organisation.slug ?? null;
}
