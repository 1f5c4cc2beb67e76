import { randomBytes } from 'node:crypto';
import { rmSync } from 'node:fs';
import { join } from 'node:path';
import { openCluster } from './cluster.mjs';
import { ensureRoles } from './databases.mjs';
import { OUTSIDE_STATE, STATE } from './places.mjs';
import { ensurePostgresBinaries } from './postgres-binaries.mjs';

/**
 * A PostgreSQL server for one test run: a cluster of its own, gone at the end, or the server named by DATABASE_URL, where
 * only databases of its own are made and dropped again.
 * @returns {Promise<{ env: Record<string, string | undefined>, close: () => Promise<void> }>}
 */
export async function openTestServer() {
  const passwords = {
    ownerPassword: randomBytes(16).toString('hex'),
    appPassword: randomBytes(16).toString('hex'),
  };
  const server = await adminServer();
  try {
    await ensureRoles(server.adminUrl, passwords);
  } catch (error) {
    await server.close();
    throw error;
  }
  return {
    env: {
      TEST_DATABASE_ADMIN_URL: server.adminUrl,
      TEST_OWNER_PASSWORD: passwords.ownerPassword,
      TEST_APP_PASSWORD: passwords.appPassword,
    },
    close: server.close,
  };
}

/** @returns {Promise<{ adminUrl: string, close: () => Promise<void> }>} */
async function adminServer() {
  const given = process.env.DATABASE_URL;
  if (given !== undefined && given !== '') {
    return { adminUrl: given, close: () => Promise.resolve() };
  }
  const name = `test-${process.pid}`;
  const folder = join(STATE, name);
  const outside = join(OUTSIDE_STATE, name);
  const remove = () => {
    rmSync(folder, { recursive: true, force: true });
    rmSync(outside, { recursive: true, force: true });
  };
  try {
    const cluster = await openCluster({
      binaries: await ensurePostgresBinaries(),
      folder,
      outside,
      throwAway: true,
    });
    return {
      adminUrl: cluster.adminUrl,
      close: async () => {
        await cluster.stop();
        remove();
      },
    };
  } catch (error) {
    remove();
    throw error;
  }
}
