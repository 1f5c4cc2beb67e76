import { spawnSync } from 'node:child_process';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const root = fileURLToPath(new URL('../..', import.meta.url));

describe('the log', () => {
  it('is one JSON object a line, with secrets and addresses blotted out', () => {
    const script = `
      import { logger } from './lib/logger.ts';
      const error = Object.assign(new Error('duplicate key'), { code: '23505', detail: 'Key (password_hash)=(h4sh)' });
      logger.error({ err: error }, 'failed');
      logger.info({ event: 'x', password: 'hunter', email: 'a@b.example', person: { passwordHash: 'h4sh', email: 'c@d.example' } }, 'said');
    `;
    const { stderr } = spawnSync(
      process.execPath,
      ['--import', 'tsx', '--input-type=module', '-e', script],
      { cwd: root, encoding: 'utf8', env: { ...process.env, LOG_LEVEL: 'info' } },
    );
    const line = JSON.parse(stderr.trim().split('\n').at(-1) ?? '') as Record<string, unknown>;
    expect(line).toMatchObject({ program: 'marlwick', event: 'x', msg: 'said', level: 30 });
    for (const secret of ['hunter', 'h4sh', 'a@b.example', 'c@d.example']) {
      expect(stderr).not.toContain(secret);
    }
  });
});
