import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { listAllOrganisations } from '@/db/queries/organisations';
import { listAuditTrail } from '@/db/queries/audit';
import { inContext } from '@/db/tenant';
import { verifyChain } from '@/lib/audit/chain';
import { readAudit } from '@/lib/audit/read-audit';
import { recordChange } from '@/lib/audit/record-change';
import type { AuditChange } from '@/lib/audit/schema';
import { enter, type Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { sessionOf } from '../support/session-of';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;
let actor: Actor;

beforeAll(async () => {
  database = await createTestDatabase();
  process.env.DATABASE_URL = database.url;
  admin = knex(ownerKnexConfig(database.adminUrl));
  await insertSmallWorks(admin);
  await insertSmallWorks(admin, '-2');
  actor = await enter(await sessionOf(SMALL_WORKS.personId), 'small', 'plan.write');
});
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
});

const change = (subjectId: string): AuditChange => ({
  action: 'plan.saved',
  subjectId,
  detail: {
    sampleId: 'smp_1',
    target: { quantity: 'pH', value: 8.2 },
    doses: [{ reagent: 'sodium-hydroxide', doseMgL: 0.1 + 0.2 }],
    engineVersion: '1',
    reason: 'ümlaut, “quotes”',
  },
});

const trail = () =>
  inContext({ organisationId: SMALL_WORKS.organisationId }, (db) =>
    listAuditTrail(db, SMALL_WORKS.organisationId),
  );

describe('the audit trail', () => {
  it('stays one unbroken chain under 40 changes at once', async () => {
    await Promise.all(
      Array.from({ length: 40 }, (_, i) =>
        inTenant(actor, (db) => recordChange(db, actor, change(`pln_${i}`))),
      ),
    );
    const entries = await trail();
    expect(entries).toHaveLength(40);
    expect(verifyChain(SMALL_WORKS.organisationId, entries)).toEqual({ ok: true, entries: 40 });
  });

  it('keeps no entry of a change that was not kept', async () => {
    const before = (await trail()).length;
    await expect(
      inTenant(actor, async (db) => {
        await recordChange(db, actor, change('pln_lost'));
        throw new Error('the change failed');
      }),
    ).rejects.toThrow('the change failed');
    expect(await trail()).toHaveLength(before);
  });

  it('is read newest first, and by nobody of another organisation', async () => {
    const { entries, total } = await readAudit(actor, {}, 1);
    expect(total).toBe(entries.length);
    expect(entries[0]?.position).toBe(total);
    const stranger = await enter(
      await sessionOf(`${SMALL_WORKS.personId}-2`),
      'small-2',
      'plan.read',
    );
    expect(await readAudit(stranger, {}, 1)).toEqual({ entries: [], total: 0, people: [] });
  });

  it('cannot be changed or emptied: not by the app’s role, nor by the owner', async () => {
    const attempts = [
      `update audit_entries set actor_name = 'x'`,
      'delete from audit_entries',
      'truncate audit_entries',
    ];
    const owner = knex(ownerKnexConfig(database.ownerUrl));
    try {
      for (const sql of attempts) {
        await expect(
          inContext({ organisationId: SMALL_WORKS.organisationId }, (db) => db.raw(sql)),
        ).rejects.toThrow(/permission denied/);
        await expect(
          owner.transaction(async (db) => {
            await db.raw(`select set_config('marlwick.organisation_id', ?, true)`, [
              SMALL_WORKS.organisationId,
            ]);
            await db.raw(sql);
          }),
        ).rejects.toThrow(/append-only/);
      }
    } finally {
      await owner.destroy();
    }
  });

  it('shows a row that an administrator tampered with', async () => {
    await admin.raw('alter table audit_entries disable trigger all');
    await admin('audit_entries').where({ position: 7 }).update({ subject_id: 'pln_other' });
    expect(verifyChain(SMALL_WORKS.organisationId, await trail())).toEqual({
      ok: false,
      position: 7,
      why: 'its content was changed after it was written',
    });
  });

  it('can be visited by upkeep in every organisation, and by the app in none', async () => {
    expect(await listAllOrganisations(pool())).toEqual([]);
    const owner = knex(ownerKnexConfig(database.ownerUrl));
    try {
      expect(await listAllOrganisations(owner)).toHaveLength(2);
    } finally {
      await owner.destroy();
    }
  });
});
