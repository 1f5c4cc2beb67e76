import type { Knex } from 'knex';

/** The app's role may use rows, never change the schema. Without effect when it is the owner itself. */
export async function grantToAppRole(owner: Knex, appRole: string): Promise<void> {
  const role = decodeURIComponent(appRole);
  if (role === '') return;
  await owner.raw('grant usage on schema public to ??', [role]);
  await owner.raw('grant select, insert, update, delete on all tables in schema public to ??', [
    role,
  ]);
  await owner.raw('revoke all on knex_migrations, knex_migrations_lock from ??', [role]);
  await owner.raw('grant usage on all sequences in schema public to ??', [role]);
}
