import { migrateToLatest } from '@/db/migrate';
import {
  APP_ROLE,
  dropDatabase,
  ensureDatabase,
  OWNER_ROLE,
  urlFor,
} from '@/docker-free-scripts/setup/databases.mjs';
import { TEMPLATE, testServer } from './test-database';

/** Migrates one template before the database tests; each test file clones it in milliseconds. */
export default async function setup(): Promise<() => Promise<void>> {
  const { adminUrl, ownerPassword, appPassword } = testServer();
  await dropDatabase(adminUrl, TEMPLATE);
  await ensureDatabase(adminUrl, TEMPLATE);
  await migrateToLatest(
    urlFor(adminUrl, OWNER_ROLE, ownerPassword, TEMPLATE),
    urlFor(adminUrl, APP_ROLE, appPassword, TEMPLATE),
  );
  return () => dropDatabase(adminUrl, TEMPLATE);
}
