import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ownerKnexConfig } from '@/db/knex-config';
import { verifyPassword } from '@/lib/auth/passwords';
import { seedDemoOnce } from '@/lib/demo/seed-demo-once';
import type { DemoSignIn } from '@/lib/demo/schema';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

const NOW = new Date('2026-12-01T10:30:00Z');
const TABLES = [
  'organisations',
  'people',
  'memberships',
  'plants',
  'sampling_points',
  'point_quantities',
  'targets',
  'train_steps',
  'dosing_points',
  'feed_settings',
  'shift_notes',
  'samples',
  'results',
  'solutions',
  'sample_indices',
] as const;

let test: TestDatabase;
let db: Knex;
let first: DemoSignIn[];

const counts = async (): Promise<Record<string, number>> => {
  const rows = await Promise.all(
    TABLES.map(async (table) => {
      const counted = await db(table).count<{ count: string | number }>('* as count').first();
      return [table, Number(counted?.count)] as const;
    }),
  );
  return Object.fromEntries(rows);
};

beforeAll(async () => {
  test = await createTestDatabase();
  db = knex(ownerKnexConfig(test.adminUrl));
  first = await seedDemoOnce(test.ownerUrl, { now: NOW });
}, 120_000);

afterAll(async () => {
  await db.destroy();
  await test.drop();
});

describe('seeding the demo', () => {
  it('fills every table of a migrated database', async () => {
    const filled = await counts();
    expect(filled).toMatchObject({ organisations: 1, people: 6, memberships: 6, plants: 3 });
    for (const table of TABLES) expect(filled[table]).toBeGreaterThan(0);
    expect(filled.samples).toBeGreaterThan(9000);
    expect(filled.results).toBeGreaterThan(90_000);
  });

  it('marks the organisation as a demo', async () => {
    const found = await db('organisations')
      .where({ slug: 'calverdine' })
      .first<{ is_demo: boolean }>('is_demo');
    expect(found).toEqual({ is_demo: true });
  });

  it('adds nothing the second time, and names the same sign-ins', async () => {
    const before = await counts();
    const second = await seedDemoOnce(test.ownerUrl, { now: new Date(NOW.getTime() + 3_600_000) });
    expect(second).toEqual(first);
    expect(await counts()).toEqual(before);
  });

  it('lets each role in with its password, and with no other', async () => {
    expect(first.map(({ role }) => role).toSorted()).toEqual([
      'consultant',
      'manager',
      'operator',
      'owner',
    ]);
    for (const { email, password, role } of first) {
      const found = await db('people')
        .join('memberships', 'memberships.person_id', 'people.id')
        .where({ email })
        .first<{ role: string; password_hash: string }>('role', 'password_hash');
      expect(found.role).toBe(role);
      expect(password.length).toBeGreaterThanOrEqual(12);
      expect(await verifyPassword(found.password_hash, password)).toBe(true);
      expect(await verifyPassword(found.password_hash, `${password} `)).toBe(false);
    }
  });

  it('keeps what was asked of the engine beside every answer', async () => {
    const kept = await db('solutions')
      .join('samples', 'samples.id', 'solutions.sample_id')
      .join('sampling_points', 'sampling_points.id', 'samples.point_id')
      .where('sampling_points.slug', 'finished')
      .orderBy('samples.taken_at', 'desc')
      .first<{ analysis: { analytesMgL: Record<string, number> }; refusal: string | null }>(
        'analysis',
        'refusal',
      );
    expect(kept.refusal).toBeNull();
    expect(kept.analysis.analytesMgL.calcium).toBeGreaterThan(10);
  });

  it('leaves nothing behind when a row is refused', async () => {
    const own = await createTestDatabase();
    const ownDb = knex(ownerKnexConfig(own.adminUrl));
    try {
      // One row of the last table is refused.
      await ownDb.raw(`alter table sample_indices add check (quantity <> 'ryznar')`);
      await expect(seedDemoOnce(own.ownerUrl, { now: NOW })).rejects.toThrow(/check constraint/);
      expect(await ownDb('people').first('id')).toBeUndefined();
      expect(await ownDb('organisations').first('id')).toBeUndefined();
    } finally {
      await ownDb.destroy();
      await own.drop();
    }
  }, 120_000);
});
