import { join } from 'node:path';
import { openCluster } from './cluster.mjs';
import { APP_ROLE, ensureDatabase, ensureRoles, OWNER_ROLE, urlFor } from './databases.mjs';
import { ensurePostgresBinaries } from './postgres-binaries.mjs';
import { OUTSIDE_STATE, PROJECT, STATE } from './places.mjs';
import { logPath, run } from './run.mjs';
import { PlainProblem, say } from './say.mjs';

/** @typedef {{ appUrl: string, ownerUrl: string, stop: () => Promise<void> }} ProductDatabase */

/**
 * The product's database: the server named by DATABASE_URL, or a cluster of the project's own.
 * @param {import('./secrets.mjs').Secrets} secrets
 * @returns {Promise<ProductDatabase>}
 */
export async function openProductDatabase(secrets) {
  const given = process.env.DATABASE_URL;
  if (given !== undefined && given !== '') {
    say('Using the PostgreSQL server named by DATABASE_URL.');
    return {
      appUrl: given,
      ownerUrl: process.env.DATABASE_OWNER_URL ?? given,
      stop: () => Promise.resolve(),
    };
  }
  const binaries = await ensurePostgresBinaries();
  const cluster = await openCluster({
    binaries,
    folder: join(STATE, 'postgres'),
    outside: join(OUTSIDE_STATE, 'postgres'),
  });
  try {
    await ensureRoles(cluster.adminUrl, secrets);
    await ensureDatabase(cluster.adminUrl, 'marlwick');
  } catch (error) {
    await cluster.stop();
    throw error;
  }
  return {
    appUrl: urlFor(cluster.adminUrl, APP_ROLE, secrets.appPassword, 'marlwick'),
    ownerUrl: urlFor(cluster.adminUrl, OWNER_ROLE, secrets.ownerPassword, 'marlwick'),
    stop: cluster.stop,
  };
}

/** @typedef {{ role: string, name: string, email: string, password: string }} DemoSignIn */

/**
 * Migrates and fills the demo once; returns who may sign in to it.
 * @param {Pick<ProductDatabase, 'appUrl' | 'ownerUrl'>} database
 * @returns {Promise<DemoSignIn[]>}
 */
export async function prepareDatabase({ appUrl, ownerUrl }) {
  const prepared = await run(
    process.execPath,
    [join(PROJECT, 'node_modules/tsx/dist/cli.mjs'), 'docker-free-scripts/prepare-database.ts'],
    { log: 'prepare-database', env: { DATABASE_URL: appUrl, DATABASE_OWNER_URL: ownerUrl } },
  );
  if (prepared.code !== 0) {
    throw new PlainProblem(
      `The database could not be brought up to date; ${logPath('prepare-database')} says why.`,
    );
  }
  const lastLine = prepared.stdout.trim().split('\n').at(-1) ?? '{}';
  /** @type {{ demoSignIns: DemoSignIn[] }} */
  const { demoSignIns } = JSON.parse(lastLine);
  return demoSignIns;
}
