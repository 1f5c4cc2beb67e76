import { existsSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { installDebianPackages } from './debian-packages.mjs';
import { PlainProblem } from './say.mjs';

const DEBIAN_ROOT = '/usr/lib/postgresql';
const OLDEST_MAJOR = 15;

/**
 * The folder of the newest PostgreSQL server's programs, or null.
 * @param {string} [root]
 */
export function findPostgresBinaries(root = DEBIAN_ROOT) {
  if (!existsSync(root)) return null;
  const versions = readdirSync(root)
    .map(Number)
    .filter(
      (major) => major >= OLDEST_MAJOR && existsSync(join(root, String(major), 'bin', 'initdb')),
    )
    .sort((a, b) => b - a);
  return versions[0] === undefined ? null : join(root, String(versions[0]), 'bin');
}

/** Installs the server when it is missing. */
export async function ensurePostgresBinaries() {
  const found = findPostgresBinaries();
  if (found !== null) return found;
  await installDebianPackages(['postgresql'], 'PostgreSQL');
  const installed = findPostgresBinaries();
  if (installed === null) {
    throw new PlainProblem(
      `Debian's PostgreSQL is older than version ${OLDEST_MAJOR}; Marlwick needs Debian 12 or later.`,
    );
  }
  return installed;
}
