import { existsSync, mkdtempSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { describe, expect, it } from 'vitest';
import { freePort } from '@/docker-free-scripts/setup/ports.mjs';
import { Supervisor } from '@/docker-free-scripts/setup/supervisor.mjs';

const folder = mkdtempSync(join(tmpdir(), 'marlwick-supervisor-'));
const diary = join(folder, 'diary');

const node = (name: string, script: string) => ({
  name: `test-${name}`,
  command: process.execPath,
  args: [
    '-e',
    `const fs = require('fs'); const write = (w) => fs.appendFileSync(${JSON.stringify(diary)}, w + ' '); ${script}`,
  ],
});

const LIVES = (name: string) =>
  `process.on('SIGTERM', () => { write('${name}-down'); process.exit(0); }); setInterval(() => {}, 1000); write('${name}-up');`;

const written = () => (existsSync(diary) ? readFileSync(diary, 'utf8').trim().split(' ') : []);
const until = async (condition: () => boolean): Promise<void> => {
  for (let tries = 0; tries < 400 && !condition(); tries++) {
    await new Promise((resolve) => setTimeout(resolve, 25));
  }
  expect(condition()).toBe(true);
};

describe('the supervisor', () => {
  it('stops what it started, last first', async () => {
    const supervisor = new Supervisor();
    await supervisor.start(node('first', LIVES('first')));
    await supervisor.start(node('second', LIVES('second')));
    await until(() => written().length === 2);
    await supervisor.stop();
    expect(written().slice(2)).toEqual(['second-down', 'first-down']);
  });

  it('tells in one sentence when a program falls', async () => {
    const supervisor = new Supervisor();
    await supervisor.start(node('faller', 'process.exit(3)'));
    expect(await supervisor.fallen).toMatch(
      /^test-faller ended unexpectedly \(exit 3\); .*\.log says why\.$/,
    );
    await supervisor.stop();
  });

  it('says so when a program ends before it is ready', async () => {
    const supervisor = new Supervisor();
    const port = await freePort();
    await expect(
      supervisor.start({
        ...node('early', 'process.exit(1)'),
        healthUrl: `http://127.0.0.1:${port}/`,
      }),
    ).rejects.toThrow(/ended while starting/);
  });

  it('kills at once what it is told to kill', async () => {
    const supervisor = new Supervisor();
    await supervisor.start(
      node(
        'deaf',
        `process.on('SIGTERM', () => {}); setInterval(() => {}, 1000); write('deaf-up');`,
      ),
    );
    await until(() => written().includes('deaf-up'));
    supervisor.kill();
    await supervisor.stop();
    expect(written()).not.toContain('deaf-down');
  });
});
