import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const alias = { '@': fileURLToPath(new URL('.', import.meta.url)) };

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'unit',
          include: [
            'tests/{engine,lib,components,architecture,docker-free-scripts}/**/*.test.{ts,tsx}',
          ],
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'db',
          include: ['tests/db/**/*.test.ts'],
          globalSetup: ['tests/support/database-template.ts'],
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'server',
          include: ['tests/{api,e2e}/**/*.test.ts'],
          globalSetup: ['tests/support/running-server.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
          fileParallelism: false,
        },
      },
    ],
  },
});
