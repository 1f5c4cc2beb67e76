import type { TestProject } from 'vitest/node';
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { NEXT } from '@/docker-free-scripts/setup/build.mjs';
import { openMail } from '@/docker-free-scripts/setup/mail.mjs';
import { freePort } from '@/docker-free-scripts/setup/ports.mjs';
import { prepareDatabase, type DemoSignIn } from '@/docker-free-scripts/setup/product-database.mjs';
import { Supervisor } from '@/docker-free-scripts/setup/supervisor.mjs';
import { createTestDatabase } from './test-database';

declare module 'vitest' {
  interface ProvidedContext {
    baseUrl: string;
    databaseUrl: string;
    adminUrl: string;
    signIns: DemoSignIn[];
    outbox: string;
  }
}

/** The built product with the seeded demo, served once for all API and browser tests. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const database = await createTestDatabase('template1');
  const signIns = await prepareDatabase({ appUrl: database.url, ownerUrl: database.ownerUrl });
  const port = await freePort();
  const baseUrl = `http://127.0.0.1:${port}`;
  const supervisor = new Supervisor();
  const outbox = mkdtempSync(join(tmpdir(), 'marlwick-outbox-'));
  const mail = await openMail(supervisor, outbox, 'test-mail');
  await supervisor.start({
    name: 'test-web',
    command: process.execPath,
    args: [NEXT, 'start', '-H', '127.0.0.1', '-p', String(port)],
    env: {
      NODE_ENV: 'production',
      MARLWICK_BUILD_DIR: '.next-test',
      NEXT_TELEMETRY_DISABLED: '1',
      NEXTAUTH_URL: baseUrl,
      NEXTAUTH_SECRET: 'a-secret-for-tests-only-0123456789abcdef',
      DATABASE_URL: database.url,
      ...mail,
    },
    healthUrl: `${baseUrl}/api/health`,
  });
  project.provide('baseUrl', baseUrl);
  project.provide('databaseUrl', database.url);
  project.provide('adminUrl', database.adminUrl);
  project.provide('signIns', signIns);
  project.provide('outbox', outbox);
  return async () => {
    await supervisor.stop();
    await database.drop();
    rmSync(outbox, { recursive: true, force: true });
  };
}
