import { migrateToLatest } from '@/db/migrate';
import { seedDemoOnce } from '@/lib/demo/seed-demo-once';

const appUrl = process.env.DATABASE_URL;
if (appUrl === undefined) {
  process.stderr.write('DATABASE_URL is not set.\n');
  process.exit(1);
}
const ownerUrl = process.env.DATABASE_OWNER_URL ?? appUrl;

for (const name of await migrateToLatest(ownerUrl, appUrl)) {
  process.stderr.write(`migrated ${name}\n`);
}
// A deployment of one's own has no use for accounts whose passwords stand in the README.
const demoSignIns = process.env.MARLWICK_DEMO === 'off' ? [] : await seedDemoOnce(ownerUrl);
process.stdout.write(`${JSON.stringify({ demoSignIns })}\n`);
