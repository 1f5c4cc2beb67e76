import { PlainProblem } from './say.mjs';

export const OWNER_ROLE = 'marlwick_owner';
export const APP_ROLE = 'marlwick_app';

/** @typedef {{ ownerPassword: string, appPassword: string }} RolePasswords */

/**
 * One connection for a piece of administration. `pg` is loaded only now: it is there once node_modules is.
 * @template T
 * @param {string} adminUrl
 * @param {(ask: (sql: string, values?: string[]) => Promise<Record<string, unknown>[]>) => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function asAdministrator(adminUrl, work) {
  const { default: pg } = await import('pg');
  const client = new pg.Client({ connectionString: adminUrl });
  try {
    await client.connect();
    return await work(async (sql, values = []) => (await client.query(sql, values)).rows);
  } catch (error) {
    if (error instanceof PlainProblem) throw error;
    throw new PlainProblem(
      `PostgreSQL refused the set-up: ${error instanceof Error ? error.message : String(error)}.`,
    );
  } finally {
    await client.end();
  }
}

/**
 * Two roles: the owner keeps the schema, the app's role owns nothing and passes no row policy by.
 * @param {string} adminUrl
 * @param {RolePasswords} passwords
 */
export async function ensureRoles(adminUrl, { ownerPassword, appPassword }) {
  await asAdministrator(adminUrl, async (ask) => {
    for (const [role, password] of [
      [OWNER_ROLE, ownerPassword],
      [APP_ROLE, appPassword],
    ]) {
      const [found] = await ask('select 1 from pg_roles where rolname = $1', [String(role)]);
      // Role names and the generated hexadecimal passwords need no quoting; statements of this kind take no parameters.
      if (found === undefined) await ask(`create role ${role}`);
      await ask(
        `alter role ${role} login nosuperuser nobypassrls nocreaterole nocreatedb password '${password}'`,
      );
    }
  });
}

/**
 * Makes a database owned by the owner role unless it is there.
 * @param {string} adminUrl
 * @param {string} name
 * @param {string} [template]
 */
export async function ensureDatabase(adminUrl, name, template = 'template1') {
  await asAdministrator(adminUrl, async (ask) => {
    const [found] = await ask('select 1 from pg_database where datname = $1', [name]);
    if (found === undefined) {
      await ask(`create database ${name} owner ${OWNER_ROLE} template ${template}`);
    }
  });
}

/**
 * @param {string} adminUrl
 * @param {string} name
 */
export async function dropDatabase(adminUrl, name) {
  await asAdministrator(adminUrl, (ask) => ask(`drop database if exists ${name} with (force)`));
}

/**
 * @param {string} adminUrl
 * @param {string} role
 * @param {string} password
 * @param {string} database
 */
export function urlFor(adminUrl, role, password, database) {
  const url = new URL(adminUrl);
  url.username = role;
  url.password = password;
  url.pathname = `/${database}`;
  return url.href;
}
