import type { Database } from '../client';
import type { MembershipPlantRow, MembershipRow, OrganisationRow, PersonRow } from '../tables/rows';
import type { Organisation } from '@/lib/organisations/schema';

/** A person as they sign in and keep their account. */
export interface AccountPerson {
  id: string;
  name: string;
  email: string;
  passwordHash: string | null;
  emailVerifiedAt: Date | null;
  /** Encrypted; in force once confirmed. */
  totpSecret: string | null;
  totpConfirmedAt: Date | null;
  totpLastStep: number;
}

const toPerson = (row: PersonRow): AccountPerson => ({
  id: row.id,
  name: row.name,
  email: row.email,
  passwordHash: row.password_hash,
  emailVerifiedAt: row.email_verified_at,
  totpSecret: row.totp_secret,
  totpConfirmedAt: row.totp_confirmed_at,
  totpLastStep: row.totp_last_step,
});

export async function findPersonByEmail(
  db: Database,
  email: string,
): Promise<AccountPerson | undefined> {
  const row = await db<PersonRow>('people').where({ email: email.toLowerCase() }).first();
  return row && toPerson(row);
}

export async function findPersonById(db: Database, id: string): Promise<AccountPerson | undefined> {
  const row = await db<PersonRow>('people').where({ id }).first();
  return row && toPerson(row);
}

export interface NewPerson {
  id: string;
  email: string;
  name: string;
  passwordHash: string | null;
  emailVerifiedAt: Date | null;
}

/** False when the address belongs to someone already; nothing is then written. */
export async function insertPerson(db: Database, person: NewPerson): Promise<boolean> {
  // No RETURNING: a person who belongs to no organisation yet may not be read back.
  const { rowCount } = await db.raw<{ rowCount: number }>(
    `insert into people (id, email, name, password_hash, email_verified_at) values (?, ?, ?, ?, ?)
     on conflict (email) do nothing`,
    [person.id, person.email, person.name, person.passwordHash, person.emailVerifiedAt],
  );
  return rowCount === 1;
}

/** Changes of an account by its own person; call in the person's context. */
export interface AccountChange {
  passwordHash?: string;
  emailVerifiedAt?: Date;
  totpSecret?: string | null;
  totpConfirmedAt?: Date | null;
}

export async function updatePerson(
  db: Database,
  personId: string,
  change: AccountChange,
): Promise<void> {
  await db<PersonRow>('people')
    .where({ id: personId })
    .update({
      ...(change.passwordHash === undefined ? {} : { password_hash: change.passwordHash }),
      ...(change.emailVerifiedAt === undefined
        ? {}
        : { email_verified_at: change.emailVerifiedAt }),
      ...(change.totpSecret === undefined ? {} : { totp_secret: change.totpSecret }),
      ...(change.totpConfirmedAt === undefined
        ? {}
        : { totp_confirmed_at: change.totpConfirmedAt }),
    });
}

/** Marks a time step's code as taken; false when it, or a later one, was taken before. */
export async function takeTotpStep(db: Database, personId: string, step: number): Promise<boolean> {
  const changed = await db<PersonRow>('people')
    .where({ id: personId })
    .where('totp_last_step', '<', step)
    .update({ totp_last_step: step });
  return changed === 1;
}

export interface Membership {
  personId: string;
  personName: string;
  role: MembershipRow['role'];
  organisation: Organisation;
  /** Null: all plants of the organisation. */
  plantIds: string[] | null;
}

type MembershipJoin = Pick<MembershipRow, 'role' | 'person_id' | 'all_plants'> &
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
    .whereNull('memberships.left_at')
    .select<MembershipJoin[]>(
      'memberships.role',
      'memberships.person_id',
      'memberships.organisation_id',
      'memberships.all_plants',
      'organisations.slug',
      'organisations.is_demo',
      'organisations.name as organisation_name',
      'people.name as person_name',
    );

const toMembership = (row: MembershipJoin, plantIds: string[] | null): Membership => ({
  personId: row.person_id,
  personName: row.person_name,
  role: row.role,
  organisation: {
    id: row.organisation_id,
    slug: row.slug,
    name: row.organisation_name,
    isDemo: row.is_demo,
  },
  plantIds,
});

/** The person's membership of the organisation with this slug, if there is one. */
export async function findMembership(
  db: Database,
  personId: string,
  organisationSlug: string,
): Promise<Membership | undefined> {
  const [row] = await memberships(db, personId).where('organisations.slug', organisationSlug);
  if (row === undefined) return undefined;
  const named = row.all_plants
    ? null
    : await db<MembershipPlantRow>('membership_plants')
        .where({ organisation_id: row.organisation_id, person_id: personId })
        .pluck('plant_id');
  return toMembership(row, named);
}

/** The organisations a person belongs to, by name. */
export async function listMemberships(
  db: Database,
  personId: string,
): Promise<Pick<Membership, 'organisation' | 'role'>[]> {
  const rows = await memberships(db, personId).orderBy('organisations.name');
  return rows.map((row) => {
    const { organisation, role } = toMembership(row, null);
    return { organisation, role };
  });
}
