import type { Database } from '../client';
import type { MembershipPlantRow, MembershipRow, PersonRow } from '../tables/rows';

export interface Member {
  personId: string;
  name: string;
  email: string;
  role: MembershipRow['role'];
  plantIds: string[] | null;
  hasSecondFactor: boolean;
  since: Date;
}

/** Everyone who belongs to an organisation now, by name. */
export async function listMembers(db: Database, organisationId: string): Promise<Member[]> {
  const rows = await db<MembershipRow>('memberships')
    .join<PersonRow>('people', 'people.id', 'memberships.person_id')
    .where({ organisation_id: organisationId, left_at: null })
    .orderBy('people.name')
    .select<(MembershipRow & Pick<PersonRow, 'name' | 'email' | 'totp_confirmed_at'>)[]>(
      'memberships.*',
      'people.name',
      'people.email',
      'people.totp_confirmed_at',
    );
  const named = await db<MembershipPlantRow>('membership_plants').where({
    organisation_id: organisationId,
  });
  return rows.map((row) => ({
    personId: row.person_id,
    name: row.name,
    email: row.email,
    role: row.role,
    plantIds: row.all_plants
      ? null
      : named
          .filter(({ person_id }) => person_id === row.person_id)
          .map(({ plant_id }) => plant_id),
    hasSecondFactor: row.totp_confirmed_at !== null,
    since: row.created_at,
  }));
}

/** One member with their row held until the transaction ends, or nothing. */
export async function lockMember(
  db: Database,
  organisationId: string,
  personId: string,
): Promise<{ role: MembershipRow['role'] } | undefined> {
  return db<MembershipRow>('memberships')
    .where({ organisation_id: organisationId, person_id: personId, left_at: null })
    .forUpdate()
    .first('role');
}

/** Holds every owner's row: two owners who unmake each other at once take turns. */
export async function lockOwners(db: Database, organisationId: string): Promise<string[]> {
  return db<MembershipRow>('memberships')
    .where({ organisation_id: organisationId, role: 'owner', left_at: null })
    .orderBy('person_id')
    .forUpdate()
    .pluck('person_id');
}

/** Takes someone in, or takes back in who had left, with this role and these plants. */
export async function putMember(
  db: Database,
  organisationId: string,
  personId: string,
  { role, plantIds }: Pick<Member, 'role' | 'plantIds'>,
): Promise<void> {
  await db<MembershipRow>('memberships')
    .insert({
      organisation_id: organisationId,
      person_id: personId,
      role,
      all_plants: plantIds === null,
    })
    .onConflict(['organisation_id', 'person_id'])
    .merge({ role, all_plants: plantIds === null, left_at: null });
  await db<MembershipPlantRow>('membership_plants')
    .where({ organisation_id: organisationId, person_id: personId })
    .delete();
  if (plantIds === null || plantIds.length === 0) return;
  await db<MembershipPlantRow>('membership_plants').insert(
    plantIds.map((plant_id) => ({
      organisation_id: organisationId,
      person_id: personId,
      plant_id,
    })),
  );
}

export async function endMembership(
  db: Database,
  organisationId: string,
  personId: string,
  now: Date,
): Promise<void> {
  await db<MembershipRow>('memberships')
    .where({ organisation_id: organisationId, person_id: personId })
    .update({ left_at: now });
}
