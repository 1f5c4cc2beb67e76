import type { Knex } from 'knex';

/** The app's role may use rows, never change the schema, nor the past. */
export async function grantToAppRole(owner: Knex, appRole: string): Promise<void> {
  const role = decodeURIComponent(appRole);
  if (role === '') return;
  await owner.raw('grant usage on schema public to ??', [role]);
  await owner.raw('grant select, insert, update, delete on all tables in schema public to ??', [
    role,
  ]);
  await owner.raw('revoke all on knex_migrations, knex_migrations_lock from ??', [role]);
  // The trail is written once: no right to change it, beside the trigger that refuses anyone.
  await owner.raw('revoke update, delete, truncate on audit_entries from ??', [role]);
  await owner.raw('grant usage on all sequences in schema public to ??', [role]);
}
