import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ownerKnexConfig } from '@/db/knex-config';
import { setContext, type RowContext } from '@/db/tenant';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;
let app: Knex;

beforeAll(async () => {
  database = await createTestDatabase();
  admin = knex(ownerKnexConfig(database.adminUrl));
  app = knex({ client: 'pg', connection: database.url, pool: { min: 0, max: 2 } });
  await insertSmallWorks(admin);
  await insertSmallWorks(admin, '-2');
});
afterAll(async () => {
  await admin.destroy();
  await app.destroy();
  await database.drop();
});

const OURS = { organisationId: SMALL_WORKS.organisationId } as const;

/** Runs in a transaction of the app's role with a context, and keeps nothing. */
async function asApp<T>(context: RowContext, work: (db: Knex) => Promise<T>): Promise<T> {
  const transaction = await app.transaction();
  try {
    await setContext(transaction, context);
    return await work(transaction);
  } finally {
    await transaction.rollback();
  }
}

const tables = async (): Promise<{ name: string; secured: boolean; forced: boolean }[]> => {
  const { rows } = await admin.raw<{
    rows: { name: string; secured: boolean; forced: boolean }[];
  }>(`
    select relname as name, relrowsecurity as secured, relforcerowsecurity as forced
    from pg_class where relkind in ('r', 'p') and relnamespace = 'public'::regnamespace
      and relname not like 'knex\\_%' order by 1`);
  return rows;
};

describe('row policies', () => {
  it('are on, and forced on the owner too, for every table there is', async () => {
    const all = await tables();
    expect(all.length).toBeGreaterThanOrEqual(17);
    expect(all.filter(({ secured, forced }) => !secured || !forced)).toEqual([]);
  });

  it('say for every table both what may be seen and what may be written', async () => {
    const { rows } = await admin.raw<{
      rows: { tablename: string; cmd: string; qual: string | null; with_check: string | null }[];
    }>(`select tablename, cmd, qual, with_check from pg_policies where schemaname = 'public'`);
    for (const { name } of await tables()) {
      const own = rows.filter(({ tablename }) => tablename === name);
      expect(
        own.some(({ qual }) => qual !== null),
        `${name} reads`,
      ).toBe(true);
      expect(
        own.some(({ with_check }) => with_check !== null),
        `${name} writes`,
      ).toBe(true);
    }
  });

  it('show nothing at all to the app’s role without a context', async () => {
    for (const { name } of await tables()) {
      expect(await app(name).select('*'), name).toEqual([]);
    }
  });

  it('show one organisation its own rows and none of another’s, however they are asked for', async () => {
    await asApp(OURS, async (db) => {
      expect(await db('plants').pluck('id')).toEqual([SMALL_WORKS.plantId]);
      expect(await db('organisations').pluck('id')).toEqual([SMALL_WORKS.organisationId]);
      expect(await db('people').pluck('id')).toEqual([SMALL_WORKS.personId]);
      expect(await db('sampling_points').where({ id: `${SMALL_WORKS.pointId}-2` })).toEqual([]);
      expect(
        await db('plants')
          .where({ id: `${SMALL_WORKS.plantId}-2` })
          .update({ name: 'Taken' }),
      ).toBe(0);
      expect(
        await db('plants')
          .where({ id: `${SMALL_WORKS.plantId}-2` })
          .delete(),
      ).toBe(0);
    });
  });

  it('show who sees named plants only those, in every table that names a plant, and nothing of none', async () => {
    const named = [
      'plants',
      'sampling_points',
      'train_steps',
      'dosing_points',
      'shift_notes',
      'samples',
      'plans',
      'feed_log',
    ];
    const restricted = await admin('pg_policies')
      .where({ policyname: 'named_plants', permissive: 'RESTRICTIVE' })
      .pluck('tablename');
    expect((restricted as string[]).sort()).toEqual([...named].sort());
    const { rows } = await admin.raw<{ rows: { name: string }[] }>(
      `select table_name as name from information_schema.columns
       where table_schema = 'public' and column_name = 'plant_id' and table_name <> 'membership_plants'`,
    );
    expect([...rows.map(({ name }) => name), 'plants'].sort()).toEqual([...named].sort());
    await asApp({ ...OURS, plantIds: [SMALL_WORKS.plantId] }, async (db) => {
      expect(await db('plants').pluck('id')).toEqual([SMALL_WORKS.plantId]);
      expect(await db('sampling_points')).toHaveLength(1);
    });
    await asApp({ ...OURS, plantIds: [`${SMALL_WORKS.plantId}-2`] }, async (db) => {
      expect(await db('plants')).toEqual([]);
      expect(await db('sampling_points')).toEqual([]);
    });
    await asApp({ ...OURS, plantIds: [] }, async (db) => {
      expect(await db('plants')).toEqual([]);
    });
  });

  it('let nobody write into another organisation', async () => {
    const stray = {
      ...(await admin('plants').first<Record<string, unknown>>()),
      id: 'plt_stray',
      slug: 'stray',
      organisation_id: `${SMALL_WORKS.organisationId}-2`,
    };
    await expect(asApp(OURS, (db) => db('plants').insert(stray))).rejects.toThrow(
      /row-level security/,
    );
    await expect(
      asApp(OURS, (db) =>
        db('plants')
          .where({ id: SMALL_WORKS.plantId })
          .update({ organisation_id: `${SMALL_WORKS.organisationId}-2` }),
      ),
    ).rejects.toThrow(/row-level security/);
  });

  it('show a person their own memberships, and a signing-in address its one person', async () => {
    await asApp({ personId: SMALL_WORKS.personId }, async (db) => {
      expect(await db('memberships').pluck('organisation_id')).toEqual([
        SMALL_WORKS.organisationId,
      ]);
      expect(await db('plants')).toEqual([]);
    });
    await asApp({ signInEmail: 'operator-2@small.example' }, async (db) => {
      expect(await db('people').pluck('id')).toEqual([`${SMALL_WORKS.personId}-2`]);
      expect(await db('memberships')).toEqual([]);
    });
  });

  it('forget the context with the transaction', async () => {
    const single = knex({ client: 'pg', connection: database.url, pool: { min: 1, max: 1 } });
    try {
      await single.transaction(async (transaction) => {
        await setContext(transaction, OURS);
        expect(await transaction('plants')).toHaveLength(1);
      });
      expect(await single('plants')).toEqual([]);
    } finally {
      await single.destroy();
    }
  });
});
