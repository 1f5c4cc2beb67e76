import knex, { type Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { database as pool } from '@/db/client';
import { ownerKnexConfig } from '@/db/knex-config';
import { enter, type Actor } from '@/lib/auth/door';
import { getPlant } from '@/lib/plants/read-plants';
import { getSample } from '@/lib/samples/get-sample';
import { saveSample } from '@/lib/samples/save-sample';
import { sampleInput, type SampleToKeep } from '@/lib/samples/schema';
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
  actor = await enter(await sessionOf(SMALL_WORKS.personId), 'small', 'sample.write');
});
afterAll(async () => {
  await pool().destroy();
  await admin.destroy();
  await database.drop();
});

const now = () => new Date('2026-12-01T12:00:00Z');

const sheet = (changes: object = {}): SampleToKeep =>
  sampleInput.parse({
    plantSlug: 'spring',
    pointSlug: 'raw',
    clientKey: crypto.randomUUID(),
    takenAtLocal: '2026-12-01T06:30',
    comment: 'clear',
    results: [
      { quantity: 'temperature', text: '6.4', unit: '°C', qualifier: '' },
      { quantity: 'pH', text: '7.10', unit: 'pH', qualifier: '' },
      { quantity: 'alkalinity', text: '40', unit: 'mg/L as CaCO₃', qualifier: '' },
      { quantity: 'calcium', text: '<12', unit: 'mg/L as Ca', qualifier: '' },
    ],
    ...changes,
  });

describe('saving a sample', () => {
  it('keeps figures as typed, the moment in the plant’s zone, and what the engine makes of it', async () => {
    const { sampleId } = await saveSample(actor, sheet(), now);
    const kept = await getSample(actor, await getPlant(actor, 'spring'), sampleId);
    expect(kept.takenAt.toISOString()).toBe('2026-12-01T06:30:00.000Z');
    expect(kept.results.find(({ quantity }) => quantity === 'pH')).toMatchObject({
      text: '7.10',
      value: 7.1,
      qualifier: '',
    });
    expect(kept.results.find(({ quantity }) => quantity === 'calcium')).toMatchObject({
      text: '12',
      qualifier: '<',
    });
    expect(kept.solution?.refusal).toBeNull();
    expect(kept.solution?.assumptions.join(' ')).toMatch(/Calcium was below its reporting limit/);
    expect(kept.indices.calciteIndex).toBeLessThan(-1);
  });

  it('keeps one sample however often and however much at once it is sent', async () => {
    const input = sheet();
    const answers = await Promise.all(
      Array.from({ length: 50 }, () => saveSample(actor, input, now)),
    );
    expect(new Set(answers.map(({ sampleId }) => sampleId)).size).toBe(1);
    const kept = await admin('samples').where({ client_key: input.clientKey });
    expect(kept).toHaveLength(1);
    expect(await admin('results').where({ sample_id: answers[0]?.sampleId })).toHaveLength(4);
  });

  it('keeps a sample that cannot be solved, without indices', async () => {
    const input = sheet({
      results: [{ quantity: 'pH', text: '7.1', unit: 'pH', qualifier: '' }],
    });
    const { sampleId } = await saveSample(actor, input, now);
    const kept = await getSample(actor, await getPlant(actor, 'spring'), sampleId);
    expect(kept.solution).toBeNull();
    expect(kept.indices).toEqual({});
  });

  it.each([
    [{ takenAtLocal: '2026-12-01T12:30' }, /in the future/],
    [{ takenAtLocal: '2026-03-29T01:30' }, /There was no/],
    [{ pointSlug: 'elsewhere' }, /no such sampling point/],
    [{ plantSlug: 'elsewhere' }, /no such works/],
    [
      { results: [{ quantity: 'sodium', text: '3', unit: 'mg/L', qualifier: '' }] },
      /does not list sodium/,
    ],
  ])('refuses %j with a sentence and writes nothing', async (changes, sentence) => {
    const input = sheet(changes);
    await expect(saveSample(actor, input, now)).rejects.toThrow(sentence);
    expect(await admin('samples').where({ client_key: input.clientKey })).toHaveLength(0);
  });

  it('shows another organisation’s sample to nobody else', async () => {
    const { sampleId } = await saveSample(actor, sheet(), now);
    const stranger = await enter(
      await sessionOf(`${SMALL_WORKS.personId}-2`),
      'small-2',
      'sample.read',
    );
    const theirs = await getPlant(stranger, 'spring');
    await expect(getSample(stranger, theirs, sampleId)).rejects.toThrow(/no such sample/);
  });
});

describe('the door', () => {
  it.each([
    [null, 'small', 'signedOut'],
    [SMALL_WORKS.personId, 'small-2', 'notFound'],
    [SMALL_WORKS.personId, 'nowhere', 'notFound'],
  ])('stays shut for %s at %s: %s', async (person, organisation, code) => {
    await expect(
      enter(person === null ? null : await sessionOf(person), organisation, 'plant.read'),
    ).rejects.toMatchObject({ code });
  });

  it('stays shut for a session that nobody has', async () => {
    await expect(
      enter({ kind: 'session', secret: 'x'.repeat(43) }, 'small', 'plant.read'),
    ).rejects.toMatchObject({ code: 'signedOut' });
  });

  it('refuses a consultant who would write a sample, at the very next request after the role changed', async () => {
    const membership = admin('memberships').where({ person_id: SMALL_WORKS.personId });
    await membership.clone().update({ role: 'consultant' });
    await expect(
      enter(await sessionOf(SMALL_WORKS.personId), 'small', 'sample.write'),
    ).rejects.toMatchObject({
      code: 'forbidden',
    });
    await membership.clone().update({ role: 'operator' });
    await expect(
      enter(await sessionOf(SMALL_WORKS.personId), 'small', 'sample.write'),
    ).resolves.toMatchObject({
      role: 'operator',
    });
  });
});
