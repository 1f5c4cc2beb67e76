import { spawn } from 'node:child_process';
import { createWriteStream, mkdirSync } from 'node:fs';
import { LOGS, PROJECT } from './places.mjs';
import { logPath } from './run.mjs';
import { PlainProblem, say } from './say.mjs';

const GRACE_MS = 8_000;
const HEALTH_PAUSE_MS = 150;

/**
 * @typedef {object} Program one process of the product
 * @property {string} name
 * @property {string} command
 * @property {string[]} args
 * @property {Record<string, string | undefined>} [env]
 * @property {string} [healthUrl] answers 200 once the program is ready
 * @property {() => Promise<boolean>} [isReady] for a program that answers otherwise
 * @property {number} [healthWithinMs]
 * @property {boolean} [echo] show its output instead of keeping it in a log
 */

/** @typedef {{ program: Program, child: import('node:child_process').ChildProcess, ended: Promise<string> }} Running */

/** Starts programs in order and stops them in reverse; one that dies takes the rest down in good order. */
export class Supervisor {
  /** @type {Running[]} */
  #running = [];
  #isStopping = false;
  /** @type {(why: string) => void} */
  #fell = () => {};
  /** Settles with a sentence when a program ends that nobody asked to end. */
  fallen = new Promise((/** @type {(why: string) => void} */ resolve) => {
    this.#fell = resolve;
  });

  /**
   * Starts one program and waits until it is ready. Throws a plain problem when it is not.
   * @param {Program} program
   */
  async start(program) {
    const running = this.#spawn(program);
    this.#running.push(running);
    void running.ended.then((how) => {
      if (!this.#isStopping)
        this.#fell(
          `${program.name} ended unexpectedly (${how}); ${logPath(program.name)} says why.`,
        );
    });
    const { healthUrl } = program;
    const isReady = program.isReady ?? (healthUrl === undefined ? null : () => answers(healthUrl));
    if (isReady !== null) await this.#untilReady(running, isReady);
  }

  /**
   * @param {Program} program
   * @returns {Running}
   */
  #spawn(program) {
    const child = spawn(program.command, program.args, {
      cwd: PROJECT,
      env: { ...process.env, ...program.env },
      // A group of its own: a Ctrl-C at the terminal reaches the supervisor alone, which then stops things in order.
      detached: true,
      stdio: ['ignore', 'pipe', 'pipe'],
    });
    mkdirSync(LOGS, { recursive: true });
    const log = createWriteStream(logPath(program.name));
    for (const stream of [child.stdout, child.stderr]) {
      stream?.on('data', (/** @type {Buffer} */ chunk) => {
        log.write(chunk);
        if (program.echo === true) process.stdout.write(chunk);
      });
    }
    /** @type {Promise<string>} */
    const ended = new Promise((resolve) => {
      child.on('error', (error) => resolve(error.message));
      child.on('close', (code, signal) => resolve(signal ?? `exit ${code}`));
    });
    void ended.then(() => log.end());
    return { program, child, ended };
  }

  /**
   * @param {Running} running
   * @param {() => Promise<boolean>} isReady
   */
  async #untilReady({ program, ended }, isReady) {
    const deadline = Date.now() + (program.healthWithinMs ?? 60_000);
    /** @type {string | null} */
    let dead = null;
    void ended.then((how) => {
      dead = how;
    });
    while (Date.now() < deadline) {
      if (dead !== null)
        throw new PlainProblem(
          `${program.name} ended while starting (${String(dead)}); ${logPath(program.name)} says why.`,
        );
      if (await isReady()) return;
      await new Promise((resolve) => setTimeout(resolve, HEALTH_PAUSE_MS));
    }
    throw new PlainProblem(
      `${program.name} did not answer in time; ${logPath(program.name)} says why.`,
    );
  }

  /** Stops what was started, last first; what does not end in time is killed. */
  async stop() {
    this.#isStopping = true;
    for (const { child, ended } of [...this.#running].reverse()) {
      if (child.pid === undefined || child.exitCode !== null || child.signalCode !== null) continue;
      signalGroup(child.pid, 'SIGTERM');
      const kill = setTimeout(() => signalGroup(child.pid, 'SIGKILL'), GRACE_MS);
      await ended;
      clearTimeout(kill);
    }
    this.#running = [];
  }

  /** At once, for a second Ctrl-C. */
  kill() {
    this.#isStopping = true;
    for (const { child } of this.#running) signalGroup(child.pid, 'SIGKILL');
  }
}

/** @param {string} url */
async function answers(url) {
  const answer = await fetch(url, { signal: AbortSignal.timeout(5_000) }).catch(() => null);
  await answer?.body?.cancel();
  return answer?.ok === true;
}

/**
 * @param {number | undefined} pid
 * @param {NodeJS.Signals} signal
 */
function signalGroup(pid, signal) {
  if (pid === undefined) return;
  try {
    process.kill(-pid, signal);
  } catch {
    // It has ended already.
  }
}
