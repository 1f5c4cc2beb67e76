import { randomBytes } from 'node:crypto';
import {
  APP_ROLE,
  dropDatabase,
  ensureDatabase,
  OWNER_ROLE,
  urlFor,
} from '@/docker-free-scripts/setup/databases.mjs';

export const TEMPLATE = 'marlwick_template';

interface TestServer {
  adminUrl: string;
  ownerPassword: string;
  appPassword: string;
}

/** The throw-away server that `npm test` opened. */
export function testServer(): TestServer {
  const adminUrl = process.env.TEST_DATABASE_ADMIN_URL;
  const ownerPassword = process.env.TEST_OWNER_PASSWORD;
  const appPassword = process.env.TEST_APP_PASSWORD;
  if (adminUrl === undefined || ownerPassword === undefined || appPassword === undefined) {
    throw new Error(
      'These tests need a database of their own: run them with “npm test -- db server”.',
    );
  }
  return { adminUrl, ownerPassword, appPassword };
}

export interface TestDatabase {
  /** As the app's role. */
  url: string;
  /** As the schema's owner, whom the row policies hold as well. */
  ownerUrl: string;
  /** As the server's administrator, who sees every row: for checks from outside. */
  adminUrl: string;
  drop: () => Promise<void>;
}

/** A fresh database cloned from the migrated template, or an empty one. */
export async function createTestDatabase(
  template: typeof TEMPLATE | 'template1' = TEMPLATE,
): Promise<TestDatabase> {
  const { adminUrl, ownerPassword, appPassword } = testServer();
  const name = `marlwick_test_${randomBytes(6).toString('hex')}`;
  await ensureDatabase(adminUrl, name, template);
  return {
    url: urlFor(adminUrl, APP_ROLE, appPassword, name),
    ownerUrl: urlFor(adminUrl, OWNER_ROLE, ownerPassword, name),
    adminUrl: databaseUrl(adminUrl, name),
    drop: () => dropDatabase(adminUrl, name),
  };
}

function databaseUrl(serverUrl: string, name: string): string {
  const url = new URL(serverUrl);
  url.pathname = `/${name}`;
  return url.href;
}
