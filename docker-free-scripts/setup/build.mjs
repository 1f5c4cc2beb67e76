import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { PROJECT } from './places.mjs';
import { logPath, run } from './run.mjs';
import { PlainProblem, say } from './say.mjs';
import { sourceHash } from './source-hash.mjs';

export const NEXT = join(PROJECT, 'node_modules/next/dist/bin/next');

/**
 * Builds into `folder` unless what stands there was built from exactly these sources.
 * @param {string} folder `.next`, or `.next-test` for the tests
 */
export async function ensureBuild(folder) {
  const stampPath = join(PROJECT, folder, 'marlwick-source-hash');
  const wanted = sourceHash();
  if (existsSync(stampPath) && readFileSync(stampPath, 'utf8') === wanted) return;
  say('Building Marlwick (about a minute).');
  const built = await run(process.execPath, [NEXT, 'build'], {
    log: folder === '.next' ? 'build' : 'build-test',
    env: { MARLWICK_BUILD_DIR: folder, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1' },
  });
  if (built.code !== 0) {
    throw new PlainProblem(
      `The build failed; ${logPath(folder === '.next' ? 'build' : 'build-test')} says why.`,
    );
  }
  writeFileSync(stampPath, wanted);
}
