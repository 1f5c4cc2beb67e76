import { mkdirSync, readFileSync, rmSync, existsSync } from 'node:fs';
import { join } from 'node:path';
import { STATE } from './places.mjs';
import { run } from './run.mjs';

/** @typedef {{ passed: number, failed: number, skipped: number }} Counts */
/** @typedef {{ name: string, ok: boolean, seconds: number, output: string, counts: Counts }} StageResult */

/** @type {Counts} */
const NOTHING = { passed: 0, failed: 0, skipped: 0 };

/**
 * Runs one command as a stage and keeps what it printed.
 * @param {string} name
 * @param {string} command
 * @param {string[]} args
 * @param {Record<string, string | undefined>} [env]
 * @returns {Promise<StageResult>}
 */
export async function commandStage(name, command, args, env = {}) {
  const began = Date.now();
  const { code, stdout, stderr } = await run(command, args, { log: `test-${name}`, env });
  return {
    name,
    ok: code === 0,
    seconds: (Date.now() - began) / 1000,
    output: stdout + stderr,
    counts: NOTHING,
  };
}

/**
 * Runs one vitest project and counts its tests from vitest's own report.
 * @param {string} project
 * @param {Record<string, string | undefined>} [env]
 * @param {string[]} [filters]
 * @returns {Promise<StageResult>}
 */
export async function vitestStage(project, env = {}, filters = []) {
  const folder = join(STATE, 'test-reports');
  mkdirSync(folder, { recursive: true });
  const report = join(folder, `${project}.json`);
  rmSync(report, { force: true });
  const result = await commandStage(
    project,
    process.execPath,
    [
      'node_modules/vitest/vitest.mjs',
      'run',
      '--project',
      project,
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
      ...filters,
    ],
    { ...env, NODE_ENV: 'test' },
  );
  const counts = existsSync(report) ? countsOf(readFileSync(report, 'utf8')) : NOTHING;
  return { ...result, ok: result.ok && counts.passed > 0 && counts.skipped === 0, counts };
}

/**
 * @param {string} report vitest's JSON report
 * @returns {Counts}
 */
export function countsOf(report) {
  /** @type {{ numPassedTests: number, numFailedTests: number, numPendingTests: number, numTodoTests: number }} */
  const { numPassedTests, numFailedTests, numPendingTests, numTodoTests } = JSON.parse(report);
  return {
    passed: numPassedTests,
    failed: numFailedTests,
    skipped: numPendingTests + numTodoTests,
  };
}

/**
 * The closing line of a run.
 * @param {readonly Counts[]} all
 */
export function closingLine(all) {
  const sum = (/** @type {keyof Counts} */ key) =>
    all.reduce((total, counts) => total + counts[key], 0);
  const skipped = sum('skipped');
  return `${sum('passed')} passed, ${sum('failed')} failed${skipped === 0 ? '' : `, ${skipped} skipped`}`;
}
