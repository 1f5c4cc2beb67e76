import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { enter, type Actor } from '@/lib/auth/door';
import { applyDose } from '@/lib/engine';
import { reworkPlan } from '@/lib/plans/frozen';
import { planQuantitiesOf } from '@/lib/plans/quantities';
import { getPlan } from '@/lib/plans/read-plans';
import { savePlan } from '@/lib/plans/save-plan';
import type { PlanInput } from '@/lib/plans/schema';
import { getPlant } from '@/lib/plants/read-plants';
import { saveSample } from '@/lib/samples/save-sample';
import { sampleInput } from '@/lib/samples/schema';
import { solveSample } from '@/lib/samples/solve-sample';
import { sessionOf } from '../support/session-of';
import { insertSmallWorks, SMALL_WORKS } from '../support/small-works';
import { createTestDatabase, type TestDatabase } from '../support/test-database';

let database: TestDatabase;
let admin: Knex;
let actor: Actor;
let sampleId: string;

beforeAll(async () => {
  database = await createTestDatabase();
  process.env.DATABASE_URL = database.url;
  admin = knex(ownerKnexConfig(database.adminUrl));
  await insertSmallWorks(admin);
  actor = await enter(await sessionOf(SMALL_WORKS.personId), 'small', 'plan.write');
  ({ sampleId } = await saveSample(
    actor,
    sampleInput.parse({
      plantSlug: 'spring',
      pointSlug: 'raw',
      clientKey: crypto.randomUUID(),
      takenAtLocal: '2026-11-30T06:30',
      comment: '',
      results: [
        { quantity: 'temperature', text: '6.4', unit: '°C', qualifier: '' },
        { quantity: 'pH', text: '6.62', unit: 'pH', qualifier: '' },
        { quantity: 'alkalinity', text: '11', unit: 'mg/L as CaCO₃', qualifier: '' },
        { quantity: 'calcium', text: '3.1', unit: 'mg/L as Ca', qualifier: '' },
      ],
    }),
  ));
});
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
});

/** What the browser would have shown for a dose. */
function previewedPH(doseMgL: number): number {
  const solution = solveSample({
    temperature: { value: 6.4, qualifier: '' },
    pH: { value: 6.62, qualifier: '' },
    alkalinity: { value: 11, qualifier: '' },
    calcium: { value: 3.1, qualifier: '' },
  });
  if (!solution.ok) throw new Error(solution.refusal);
  const after = applyDose(solution.water, { reagent: 'sodium-hydroxide', doseMgL });
  if (!after.ok) throw new Error(after.message);
  return after.water.pH;
}

const planOf = (changes: Partial<PlanInput> = {}): PlanInput => ({
  plantSlug: 'spring',
  sampleId,
  clientKey: crypto.randomUUID(),
  reagent: 'sodium-hydroxide',
  doseMgL: 5,
  target: { quantity: 'pH', value: 8 },
  previewedPH: previewedPH(5),
  reason: 'a test',
  ...changes,
});

describe('saving a plan', () => {
  it('keeps the server’s own answer, and works out the same digits again from what was frozen', async () => {
    const { planId } = await savePlan(actor, planOf());
    const kept = await getPlan(actor, await getPlant(actor, 'spring'), planId);
    const [dose] = kept.doses;
    expect(dose).toEqual({ reagent: 'sodium-hydroxide', doseMgL: 5 });
    const again = dose && reworkPlan(kept.analysis, dose);
    expect(again && planQuantitiesOf(again.after)).toEqual(kept.predicted.equilibrium);
    expect(again && planQuantitiesOf(again.before)).toEqual(kept.predicted.before);
    expect(kept.predicted.equilibrium.pH).toBeGreaterThan(7);
  });

  it('refuses a preview that the server does not find itself', async () => {
    const input = planOf({ previewedPH: previewedPH(5) + 0.01 });
    await expect(savePlan(actor, input)).rejects.toMatchObject({ code: 'conflict' });
    expect(await admin('plans').where({ client_key: input.clientKey })).toHaveLength(0);
  });

  it('keeps one plan however often it is sent at once', async () => {
    const input = planOf();
    const answers = await Promise.all(Array.from({ length: 20 }, () => savePlan(actor, input)));
    expect(new Set(answers.map(({ planId }) => planId)).size).toBe(1);
    expect(await admin('plans').where({ client_key: input.clientKey })).toHaveLength(1);
  });

  it('knows no sample of another plant', async () => {
    await expect(savePlan(actor, planOf({ sampleId: 'smp_nowhere' }))).rejects.toMatchObject({
      code: 'notFound',
    });
  });
});
