import type { Knex } from 'knex';
import { migrationSource } from './migrations';

/** Connection pool of the web process: the role that owns nothing. */
export function appKnexConfig(databaseUrl: string): Knex.Config {
  return {
    client: 'pg',
    connection: { connectionString: databaseUrl, application_name: 'marlwick-web' },
    pool: { min: 0, max: 10 },
    acquireConnectionTimeout: 10_000,
  };
}

/** Migrations and demo data: the role that owns the schema. */
export function ownerKnexConfig(databaseUrl: string): Knex.Config {
  return {
    client: 'pg',
    connection: { connectionString: databaseUrl, application_name: 'marlwick-owner' },
    pool: { min: 0, max: 4 },
    migrations: { migrationSource },
  };
}
