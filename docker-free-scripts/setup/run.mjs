import { spawn } from 'node:child_process';
import { createWriteStream, mkdirSync } from 'node:fs';
import { join } from 'node:path';
import { LOGS, PROJECT } from './places.mjs';

/**
 * Runs a command to its end. Output goes to `.marlwick/log/<log>.log` when `log` is given, and is returned.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {{ log?: string, env?: Record<string, string | undefined>, cwd?: string, input?: string, echo?: boolean }} [options]
 * @returns {Promise<{ code: number, stdout: string, stderr: string }>}
 */
export function run(command, args, options = {}) {
  return new Promise((resolve) => {
    const child = spawn(command, args, {
      cwd: options.cwd ?? PROJECT,
      env: { ...process.env, ...options.env },
      stdio: ['pipe', 'pipe', 'pipe'],
    });
    const log = options.log === undefined ? null : openLog(options.log);
    const collected = { stdout: '', stderr: '' };
    for (const name of /** @type {const} */ (['stdout', 'stderr'])) {
      child[name].on('data', (/** @type {Buffer} */ chunk) => {
        collected[name] += chunk.toString();
        log?.write(chunk);
        if (options.echo === true) process[name].write(chunk);
      });
    }
    // A child that ends before it has read its input is told by its exit code, not by a broken pipe.
    child.stdin.on('error', () => {});
    child.stdin.end(options.input ?? '');
    child.on('error', (error) => {
      log?.end();
      resolve({ code: 127, stdout: collected.stdout, stderr: error.message });
    });
    child.on('close', (code, signal) => {
      log?.end();
      resolve({ code: code ?? (signal === null ? 1 : 128), ...collected });
    });
  });
}

/** @param {string} name */
export function logPath(name) {
  return join(LOGS, `${name}.log`);
}

/** @param {string} name */
function openLog(name) {
  mkdirSync(LOGS, { recursive: true });
  return createWriteStream(logPath(name));
}
