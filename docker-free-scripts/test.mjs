import { ensureBuild } from './setup/build.mjs';
import { ensureChromium } from './setup/chromium.mjs';
import { checkNodeVersion, ensureNodeModules } from './setup/node-modules.mjs';
import { PlainProblem, runPlainly, say } from './setup/say.mjs';
import { closingLine, commandStage, vitestStage } from './setup/stages.mjs';
import { StopSignal } from './setup/stop-signal.mjs';
import { openTestServer } from './setup/test-server.mjs';

const STAGES = ['types', 'lint', 'format', 'unit', 'db', 'server'];
const BUILD = '.next-test';

/** All checks, or only the stages named: `npm test -- unit db`. A stage that fails hides none of the others. */
async function main() {
  const wanted = chosenStages(process.argv.slice(2));
  const stop = new StopSignal(() => process.exit(130));
  checkNodeVersion();
  await ensureNodeModules();
  if (wanted.has('server')) await ensureChromium();
  stop.check();

  /** @type {import('./setup/stages.mjs').StageResult[]} */
  const results = [];
  /** @param {Promise<import('./setup/stages.mjs').StageResult>} running */
  const report = async (running) => {
    const result = await running;
    results.push(result);
    say(
      `${result.ok ? 'ok    ' : 'FAILED'} ${result.name.padEnd(8)} ${result.seconds.toFixed(0)} s`,
    );
    if (!result.ok) say(result.output);
    stop.check();
  };

  const needsServer = wanted.has('db') || wanted.has('server');
  const server = needsServer ? await openTestServer() : null;
  try {
    stop.check();
    // Two cores: the build goes on beside the static checks and the unit tests.
    const build = wanted.has('server') ? buildStage() : null;
    if (wanted.has('types'))
      await report(commandStage('types', 'npm', ['run', '--silent', 'types']));
    if (wanted.has('lint')) await report(commandStage('lint', 'npm', ['run', '--silent', 'lint']));
    if (wanted.has('format')) {
      await report(commandStage('format', 'npm', ['run', '--silent', 'format:check']));
    }
    if (wanted.has('unit')) await report(vitestStage('unit'));
    if (wanted.has('db')) await report(vitestStage('db', server?.env));
    if (build !== null) {
      await report(build);
      if (results.at(-1)?.ok === true) await report(vitestStage('server', server?.env));
    }
  } finally {
    await server?.close();
  }
  const counted = results.map(({ counts }) => counts);
  say(closingLine(counted));
  return results.every(({ ok }) => ok) ? 0 : 1;
}

/** @returns {Promise<import('./setup/stages.mjs').StageResult>} */
async function buildStage() {
  const began = Date.now();
  const counts = { passed: 0, failed: 0, skipped: 0 };
  try {
    await ensureBuild(BUILD);
    return { name: 'build', ok: true, seconds: (Date.now() - began) / 1000, output: '', counts };
  } catch (error) {
    const output = error instanceof Error ? error.message : String(error);
    return { name: 'build', ok: false, seconds: (Date.now() - began) / 1000, output, counts };
  }
}

/** @param {string[]} named */
function chosenStages(named) {
  const unknown = named.find((name) => !STAGES.includes(name));
  if (unknown !== undefined) {
    throw new PlainProblem(`There is no stage “${unknown}”: choose among ${STAGES.join(', ')}.`);
  }
  return new Set(named.length === 0 ? STAGES : named);
}

await runPlainly(main);
