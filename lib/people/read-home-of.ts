import { listMemberships } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import type { Organisation } from '@/lib/organisations/schema';

/** The organisations a person belongs to, by name. */
export async function readOrganisationsOf(personId: string): Promise<Organisation[]> {
  const memberships = await inContext({ personId }, (db) => listMemberships(db, personId));
  return memberships.map(({ organisation }) => organisation);
}

/** Slug of the first organisation a person belongs to, or null. */
export async function readHomeOf(personId: string): Promise<string | null> {
  const [first] = await readOrganisationsOf(personId);
  return first?.slug ?? null;
}
