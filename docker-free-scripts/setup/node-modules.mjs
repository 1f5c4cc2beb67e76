import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { PROJECT } from './places.mjs';
import { logPath, run } from './run.mjs';
import { PlainProblem, say } from './say.mjs';

const OLDEST_NODE = [20, 9];

/** @param {string} [version] */
export function checkNodeVersion(version = process.versions.node) {
  const [major = 0, minor = 0] = version.split('.').map(Number);
  const [wantedMajor = 0, wantedMinor = 0] = OLDEST_NODE;
  if (major < wantedMajor || (major === wantedMajor && minor < wantedMinor)) {
    throw new PlainProblem(
      `Node ${version} is too old: Marlwick needs Node ${OLDEST_NODE.join('.')} or later (Debian 13 ships it).`,
    );
  }
}

/** Installs the locked packages unless node_modules already holds exactly them. */
export async function ensureNodeModules() {
  const stampPath = join(PROJECT, 'node_modules', '.marlwick-lock');
  const wanted = createHash('sha256')
    .update(readFileSync(join(PROJECT, 'package-lock.json')))
    .digest('hex');
  if (existsSync(stampPath) && readFileSync(stampPath, 'utf8') === wanted) return;
  say('Installing the packages of package-lock.json (one to three minutes).');
  const installed = await run('npm', ['ci', '--no-audit', '--no-fund'], {
    log: 'npm-ci',
    // Development packages build and test the product, whatever NODE_ENV the caller has.
    env: { NODE_ENV: 'development' },
  });
  if (installed.code !== 0) {
    throw new PlainProblem(
      installed.code === 127
        ? 'npm is missing: install Debian’s package npm and start again.'
        : `The packages could not be installed; ${logPath('npm-ci')} says why.`,
    );
  }
  writeFileSync(stampPath, wanted);
}
