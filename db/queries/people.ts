import type { Database } from '../client';
import type { MembershipRow, OrganisationRow, PersonRow } from '../tables/rows';
import type { Organisation } from '@/lib/organisations/schema';

export interface PersonWithPassword {
  id: string;
  name: string;
  email: string;
  passwordHash: string;
}

export async function findPersonByEmail(
  db: Database,
  email: string,
): Promise<PersonWithPassword | undefined> {
  const row = await db<PersonRow>('people').where({ email: email.toLowerCase() }).first();
  return row && { id: row.id, name: row.name, email: row.email, passwordHash: row.password_hash };
}

export interface Membership {
  personId: string;
  personName: string;
  role: MembershipRow['role'];
  organisation: Organisation;
}

type MembershipJoin = Pick<MembershipRow, 'role' | 'person_id'> &
  Pick<OrganisationRow, 'slug' | 'is_demo'> & {
    organisation_id: string;
    organisation_name: string;
    person_name: string;
  };

const memberships = (db: Database, personId: string) =>
  db<MembershipRow>('memberships')
    .join<OrganisationRow>('organisations', 'organisations.id', 'memberships.organisation_id')
    .join<PersonRow>('people', 'people.id', 'memberships.person_id')
    .where('memberships.person_id', personId)
    .select<MembershipJoin[]>(
      'memberships.role',
      'memberships.person_id',
      'memberships.organisation_id',
      'organisations.slug',
      'organisations.is_demo',
      'organisations.name as organisation_name',
      'people.name as person_name',
    );

const toMembership = (row: MembershipJoin): Membership => ({
  personId: row.person_id,
  personName: row.person_name,
  role: row.role,
  organisation: {
    id: row.organisation_id,
    slug: row.slug,
    name: row.organisation_name,
    isDemo: row.is_demo,
  },
});

/** The person's membership of the organisation with this slug, if there is one. */
export async function findMembership(
  db: Database,
  personId: string,
  organisationSlug: string,
): Promise<Membership | undefined> {
  const [row] = await memberships(db, personId).where('organisations.slug', organisationSlug);
  return row && toMembership(row);
}

export async function listMemberships(db: Database, personId: string): Promise<Membership[]> {
  const rows = await memberships(db, personId).orderBy('organisations.name');
  return rows.map(toMembership);
}
