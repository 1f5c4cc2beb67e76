import type { Knex } from 'knex';
import * as peopleAndPlants from './20261201090000_people_and_plants';
import * as samples from './20261201091000_samples';
import * as plans from './20261201092000_plans';
import * as audit from './20261201113000_audit';
import * as accounts from './20261201130000_accounts';
import * as rateLimits from './20261201120000_rate_limits';
import * as rowPolicies from './20261201110000_row_policies';

const migrations: Readonly<Record<string, Knex.Migration>> = {
  '20261201090000_people_and_plants': peopleAndPlants,
  '20261201091000_samples': samples,
  '20261201092000_plans': plans,
  '20261201110000_row_policies': rowPolicies,
  '20261201113000_audit': audit,
  '20261201120000_rate_limits': rateLimits,
  '20261201130000_accounts': accounts,
};

/** Imported rather than read from disk, so that every runner (tsx, vitest, knex) finds the same list. */
export const migrationSource: Knex.MigrationSource<string> = {
  getMigrations: () => Promise.resolve(Object.keys(migrations).sort()),
  getMigrationName: (name) => name,
  getMigration: (name) => {
    const migration = migrations[name];
    if (migration === undefined) throw new Error(`Unknown migration ${name}`);
    return Promise.resolve(migration);
  },
};
