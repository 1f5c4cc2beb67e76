import { countUnusedCodes } from '@/db/queries/recovery-codes';
import { listMemberships, type AccountPerson } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import type { Role } from '@/lib/auth/permissions';
import type { Organisation } from '@/lib/organisations/schema';

/** What a person's own page shows: where they belong, and how many recovery codes are left. */
export const readAccount = ({
  id,
}: AccountPerson): Promise<{
  memberships: { organisation: Organisation; role: Role }[];
  unusedCodes: number;
}> =>
  inContext({ personId: id }, async (db) => ({
    memberships: await listMemberships(db, id),
    unusedCodes: await countUnusedCodes(db, id),
  }));
