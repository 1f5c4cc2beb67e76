import { join } from 'node:path';
import { ensureNodeModules } from './setup/node-modules.mjs';
import { PROJECT } from './setup/places.mjs';
import { openProductDatabase } from './setup/product-database.mjs';
import { run } from './setup/run.mjs';
import { runPlainly } from './setup/say.mjs';
import { ensureSecrets } from './setup/secrets.mjs';

/** `npm run audit:verify`: exits 0 when every organisation's audit trail is unbroken, 1 when one is not. */
await runPlainly(async () => {
  await ensureNodeModules();
  const database = await openProductDatabase(ensureSecrets());
  try {
    const { code } = await run(
      process.execPath,
      [
        join(PROJECT, 'node_modules/tsx/dist/cli.mjs'),
        'docker-free-scripts/verify-audit-trails.ts',
      ],
      { env: { DATABASE_URL: database.ownerUrl }, echo: true },
    );
    return code;
  } finally {
    await database.stop();
  }
});
