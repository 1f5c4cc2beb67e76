import { mkdirSync, mkdtempSync, statSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { administratorPassword } from '@/docker-free-scripts/setup/cluster.mjs';
import { checkNodeVersion } from '@/docker-free-scripts/setup/node-modules.mjs';
import { freePort, isPortFree } from '@/docker-free-scripts/setup/ports.mjs';
import { findPostgresBinaries } from '@/docker-free-scripts/setup/postgres-binaries.mjs';
import { run } from '@/docker-free-scripts/setup/run.mjs';
import { readPort } from '@/docker-free-scripts/setup/serve.mjs';
import { sourceHash } from '@/docker-free-scripts/setup/source-hash.mjs';
import { closingLine, countsOf } from '@/docker-free-scripts/setup/stages.mjs';

const temporary = () => mkdtempSync(join(tmpdir(), 'marlwick-setup-'));

describe('the set-up', () => {
  it.each(['20.9.0', '20.20.2', '22.1.0'])('accepts Node %s', (version) => {
    expect(() => checkNodeVersion(version)).not.toThrow();
  });

  it.each(['18.19.0', '20.8.1'])('refuses Node %s in one sentence', (version) => {
    expect(() => checkNodeVersion(version)).toThrow(/too old: Marlwick needs Node 20\.9 or later/);
  });

  it.each([
    [undefined, 3100],
    ['', 3100],
    ['8080', 8080],
  ])('reads PORT=%j as %d', (text, port) => {
    expect(readPort(text)).toBe(port);
  });

  it.each(['0', '70000', 'http', '31.5'])('refuses PORT=%s in one sentence', (text) => {
    expect(() => readPort(text)).toThrow(/is no port/);
  });

  it('tells a busy port from a free one', async () => {
    const port = await freePort();
    expect(await isPortFree(port)).toBe(true);
    const holder = createServer().listen(port, '127.0.0.1');
    await new Promise((resolve) => holder.once('listening', resolve));
    expect(await isPortFree(port)).toBe(false);
    await new Promise((resolve) => holder.close(resolve));
  });

  it('keeps the database’s password beside its data, for this user only: a new clone finds both', () => {
    const folder = temporary();
    const made = administratorPassword(folder);
    expect(made).toMatch(/^[0-9a-f]{48}$/);
    expect(administratorPassword(folder)).toBe(made);
    expect(administratorPassword(temporary())).not.toBe(made);
    expect(statSync(join(folder, 'administrator-password')).mode & 0o777).toBe(0o600);
  });

  it('takes the newest PostgreSQL server that is new enough and whole', () => {
    const root = temporary();
    for (const version of ['13', '15', '17', '18']) {
      mkdirSync(join(root, version, 'bin'), { recursive: true });
      if (version !== '18') writeFileSync(join(root, version, 'bin', 'initdb'), '');
    }
    expect(findPostgresBinaries(root)).toBe(join(root, '17', 'bin'));
    expect(findPostgresBinaries(join(root, 'nowhere'))).toBeNull();
  });

  it('hashes names and contents of what a build is made of, and nothing else', () => {
    const root = temporary();
    mkdirSync(join(root, 'lib'));
    writeFileSync(join(root, 'lib', 'a.ts'), 'one');
    const first = sourceHash(root);
    writeFileSync(join(root, 'README.md'), 'words');
    expect(sourceHash(root)).toBe(first);
    writeFileSync(join(root, 'lib', 'a.ts'), 'two');
    const second = sourceHash(root);
    expect(second).not.toBe(first);
    writeFileSync(join(root, 'lib', 'b.ts'), '');
    expect(sourceHash(root)).not.toBe(second);
  });

  it('answers a command that does not exist with a code, not a crash', async () => {
    expect(await run('no-such-program-here', [])).toMatchObject({ code: 127 });
  });
});

describe('the closing line', () => {
  const report = (passed: number, failed: number, pending = 0, todo = 0) =>
    JSON.stringify({
      numPassedTests: passed,
      numFailedTests: failed,
      numPendingTests: pending,
      numTodoTests: todo,
    });

  it('adds the stages up', () => {
    expect(closingLine([countsOf(report(3, 0)), countsOf(report(4, 1))])).toBe(
      '7 passed, 1 failed',
    );
  });

  it('does not hide a skipped or promised test', () => {
    expect(closingLine([countsOf(report(3, 0, 1, 1))])).toBe('3 passed, 0 failed, 2 skipped');
  });
});
