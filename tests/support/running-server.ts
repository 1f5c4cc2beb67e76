import type { TestProject } from 'vitest/node';
import { NEXT } from '@/docker-free-scripts/setup/build.mjs';
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
  }
}

/** The built product with the seeded demo, served once for all API and browser tests. */
export default async function setup(project: TestProject): Promise<() => Promise<void>> {
  const database = await createTestDatabase('template1');
  const signIns = await prepareDatabase({ appUrl: database.url, ownerUrl: database.ownerUrl });
  const port = await freePort();
  const baseUrl = `http://127.0.0.1:${port}`;
  const supervisor = new Supervisor();
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
    },
    healthUrl: `${baseUrl}/api/health`,
  });
  project.provide('baseUrl', baseUrl);
  project.provide('databaseUrl', database.url);
  project.provide('adminUrl', database.adminUrl);
  project.provide('signIns', signIns);
  return async () => {
    await supervisor.stop();
    await database.drop();
  };
}
