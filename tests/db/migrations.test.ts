import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ownerKnexConfig } from '@/db/knex-config';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let owner: Knex;
let app: Knex;

beforeAll(async () => {
  database = await createTestDatabase();
  owner = knex(ownerKnexConfig(database.ownerUrl));
  app = knex({ client: 'pg', connection: database.url });
});
afterAll(async () => {
  await owner.destroy();
  await app.destroy();
  await database.drop();
});

const tables = async (): Promise<string[]> => {
  const { rows } = await owner.raw<{ rows: { name: string }[] }>(
    `select table_name as name from information_schema.tables
     where table_schema = 'public' and table_name not like 'knex%' order by 1`,
  );
  return rows.map(({ name }) => name);
};

describe('the schema', () => {
  it('carries the tenant in every table but organisations, people and the hashed keys of tries', async () => {
    const { rows } = await owner.raw<{ rows: { name: string }[] }>(
      `select table_name as name from information_schema.columns
       where table_schema = 'public' and column_name = 'organisation_id' and is_nullable = 'NO'`,
    );
    const withTenant = new Set(rows.map(({ name }) => name));
    expect((await tables()).filter((name) => !withTenant.has(name))).toEqual([
      // Belong to a person, who may belong to several organisations.
      'external_identities',
      'one_time_tokens',
      'organisations',
      'people',
      'rate_limits',
      'recovery_codes',
      'sessions',
    ]);
  });

  it('is not the app role’s to change', async () => {
    await expect(app.raw('create table stray (id int)')).rejects.toThrow(/permission denied/);
    await expect(app.raw('drop table samples')).rejects.toThrow(/must be owner/);
    const { rows } = await app.raw<{ rows: { rolsuper: boolean; rolbypassrls: boolean }[] }>(
      'select rolsuper, rolbypassrls from pg_roles where rolname = current_user',
    );
    expect(rows).toEqual([{ rolsuper: false, rolbypassrls: false }]);
  });

  it('goes down to nothing and up again to the same tables', async () => {
    const before = await tables();
    await owner.migrate.rollback(undefined, true);
    expect(await tables()).toEqual([]);
    await owner.migrate.latest();
    expect(await tables()).toEqual(before);
  });
});
