import knex from 'knex';
import { grantToAppRole } from './grants';
import { ownerKnexConfig } from './knex-config';

/** Brings the schema to the latest migration and lets the app's role read and write it. Returns the names that ran. */
export async function migrateToLatest(ownerUrl: string, appUrl = ownerUrl): Promise<string[]> {
  const owner = knex(ownerKnexConfig(ownerUrl));
  try {
    const [, ran] = (await owner.migrate.latest()) as [number, string[]];
    // On a server with one role for everything there is nobody to grant to.
    const appRole = new URL(appUrl).username;
    if (appRole !== new URL(ownerUrl).username) await grantToAppRole(owner, appRole);
    return ran;
  } finally {
    await owner.destroy();
  }
}
