import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { apiClient, itemsIn, onceKey, textIn } from '../support/api-client';
import { adminOf, insertToken } from '../support/make-token';
import { sessionCookie, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
const PLANT = '/calverdine/plants/quarrel-hill';
let admin: Knex;
let api: ReturnType<typeof apiClient>;
let organisationId: string;
let managerId: string;

beforeAll(async () => {
  admin = adminOf(inject('adminUrl'));
  const organisation = await admin('organisations')
    .where({ slug: 'calverdine' })
    .first<{ id: string }>();
  organisationId = organisation.id;
  const manager = await admin('people')
    .where({ email: 'manager@calverdine.example' })
    .first<{ id: string }>();
  managerId = manager.id;
  api = apiClient(baseUrl, {
    token: await insertToken(admin, { organisationId, madeBy: managerId }),
  });
});
afterAll(() => admin.destroy());

const sample = {
  pointSlug: 'raw',
  takenAtLocal: '2026-11-30T07:10',
  comment: '',
  results: [
    { quantity: 'temperature', text: '6.4', unit: '°C', qualifier: '' },
    { quantity: 'pH', text: '6.70', unit: 'pH', qualifier: '' },
    { quantity: 'alkalinity', text: '11', unit: 'mg/L as CaCO₃', qualifier: '' },
  ],
};

describe('reading', () => {
  it('pages through every sample once, newest first, whatever the page’s size', async () => {
    const seen: string[] = [];
    let cursor = '';
    do {
      const { status, body } = await api(`${PLANT}/samples?limit=200${cursor}`);
      expect(status).toBe(200);
      seen.push(...itemsIn(body).map((item) => String(item['id'])));
      const next = (body as { next: string | null }).next;
      cursor = next === null ? '' : `&cursor=${next}`;
    } while (cursor !== '');
    const plant = await admin('plants').where({ slug: 'quarrel-hill' }).first<{ id: string }>();
    const ids = (await admin('samples')
      .where({ plant_id: plant.id })
      .orderBy([
        { column: 'taken_at', order: 'desc' },
        { column: 'id', order: 'desc' },
      ])
      .pluck('id')) as string[];
    expect(seen).toEqual(ids);
  });

  it('loses no plan between two pages, however close in time they were made', async () => {
    const item = itemsIn((await api(`${PLANT}/samples?limit=1&point=raw`)).body)[0];
    const plan = {
      sampleId: item?.['id'],
      reagent: 'sodium-hydroxide',
      doseMgL: 1,
      target: { quantity: 'pH', value: 7 },
      reason: '',
    };
    await Promise.all(
      Array.from({ length: 12 }, (_, i) =>
        api(`${PLANT}/plans`, {
          method: 'POST',
          body: { ...plan, doseMgL: i },
          headers: onceKey(),
        }),
      ),
    );
    const seen = new Set<unknown>();
    let next: string | null = '';
    while (next !== null) {
      const { body } = await api(`${PLANT}/plans?limit=5${next === '' ? '' : `&cursor=${next}`}`);
      itemsIn(body).forEach(({ id }) => seen.add(id));
      next = (body as { next: string | null }).next;
    }
    const total = await admin('plans')
      .join('plants', 'plants.id', 'plans.plant_id')
      .where('plants.slug', 'quarrel-hill');
    expect(seen.size).toBe(total.length);
  });

  it('tells of every plan its cautions', async () => {
    const { body } = await api(`${PLANT}/plans?limit=1`);
    expect(itemsIn(body)[0]?.['cautions']).toContain(
      'Handle by the product’s safety data sheet, with the protection it names.',
    );
  });

  it('answers 304 to a reader who has it already', async () => {
    const first = await api(`${PLANT}/points`);
    const etag = first.headers.get('etag') ?? '';
    const again = await api(`${PLANT}/points`, { headers: { 'if-none-match': etag } });
    expect([first.status, again.status]).toEqual([200, 304]);
  });

  it.each([
    ['an unknown query', `${PLANT}/samples?colour=blue`, 422],
    ['a page too long', `${PLANT}/samples?limit=1000`, 422],
    ['a made-up cursor', `${PLANT}/samples?cursor=bm90aGluZw`, 422],
    ['another point', `${PLANT}/samples?point=moon`, 404],
    ['another plant', '/calverdine/plants/moon', 404],
    ['another sample', `${PLANT}/samples/smp_00`, 404],
    ['a NUL in a name', `${PLANT}/samples/%00`, 422],
  ])('refuses %s', async (_what, path, status) => {
    const { status: answered, body } = await api(path);
    expect(answered).toBe(status);
    expect(body).toMatchObject({ error: { code: status === 404 ? 'notFound' : 'badInput' } });
  });
});

describe('creating', () => {
  it('keeps a sample with its solution and gives it back as written', async () => {
    const made = await api(`${PLANT}/samples`, {
      method: 'POST',
      body: sample,
      headers: onceKey(),
    });
    expect(made.status).toBe(201);
    const { body } = await api(`${PLANT}/samples/${textIn(made.body, 'id')}`);
    expect(body).toMatchObject({
      takenAt: '2026-11-30T07:10:00.000Z',
      results: expect.arrayContaining([
        expect.objectContaining({ quantity: 'pH', text: '6.70' }) as unknown,
      ]) as unknown,
      solution: { refusal: null },
    });
  });

  it('makes exactly one record of fifty parallel repeats, and answers all alike', async () => {
    const headers = onceKey();
    const answers = await Promise.all(
      Array.from({ length: 50 }, () =>
        api(`${PLANT}/samples`, { method: 'POST', body: sample, headers }),
      ),
    );
    expect(new Set(answers.map(({ status }) => status))).toEqual(new Set([201]));
    const ids = new Set(answers.map(({ body }) => textIn(body, 'id')));
    expect(ids.size).toBe(1);
    const later = await api(`${PLANT}/samples`, { method: 'POST', body: sample, headers });
    expect(later.headers.get('idempotency-replayed')).toBe('true');
    expect(ids.has(textIn(later.body, 'id'))).toBe(true);
    const kept = await admin('samples').whereIn('id', [...ids]);
    expect(kept).toHaveLength(1);
  });

  it('refuses a key that came with another request, and frees the key of a refused one', async () => {
    const headers = onceKey();
    const bad = { ...sample, pointSlug: 'moon' };
    const refused = await api(`${PLANT}/samples`, { method: 'POST', body: bad, headers });
    expect(refused.status).toBe(404);
    const mended = await api(`${PLANT}/samples`, { method: 'POST', body: sample, headers });
    expect(mended.status).toBe(201);
    const other = { ...sample, comment: 'another' };
    const reused = await api(`${PLANT}/samples`, { method: 'POST', body: other, headers });
    expect(reused.status).toBe(422);
    expect(reused.body).toMatchObject({ error: { code: 'badInput' } });
  });

  it('logs what was fed, in the audit trail with the token’s name', async () => {
    const [point] = await admin('dosing_points')
      .join('plants', 'plants.id', 'dosing_points.plant_id')
      .where('plants.slug', 'quarrel-hill')
      .select<{ id: string }[]>('dosing_points.id');
    const entry = {
      dosingPointId: point?.id,
      from: '2026-11-30T00:00:00Z',
      to: '2026-11-30T12:00:00Z',
      productKg: 84.5,
    };
    const made = await api(`${PLANT}/feed-log`, {
      method: 'POST',
      body: entry,
      headers: onceKey(),
    });
    expect(made.status).toBe(201);
    const { body } = await api(`${PLANT}/feed-log`);
    expect(itemsIn(body)[0]).toMatchObject({ id: textIn(made.body, 'id'), productKg: 84.5 });
    const trail = await api('/calverdine/audit?action=feed.logged');
    expect(itemsIn(trail.body)[0]).toMatchObject({
      subjectId: textIn(made.body, 'id'),
      actorName: expect.stringContaining('by API token Test') as unknown,
    });
  });

  it.each([
    ['without a key', { body: sample }, 422],
    ['no JSON', { body: '{', headers: onceKey() }, 422],
    [
      'as a form',
      {
        body: 'a=b',
        headers: { ...onceKey(), 'content-type': 'application/x-www-form-urlencoded' },
      },
      415,
    ],
    ['compressed', { body: sample, headers: { ...onceKey(), 'content-encoding': 'gzip' } }, 415],
    ['too large', { body: { ...sample, comment: 'x'.repeat(300_000) }, headers: onceKey() }, 413],
    ['without results', { body: { ...sample, results: [] }, headers: onceKey() }, 422],
    [
      'pH 71',
      {
        body: { ...sample, results: [{ quantity: 'pH', text: '71', unit: 'pH', qualifier: '' }] },
        headers: onceKey(),
      },
      422,
    ],
    [
      'in the future',
      { body: { ...sample, takenAtLocal: '2099-01-01T00:00' }, headers: onceKey() },
      422,
    ],
  ])('refuses a sample %s', async (_what, request, status) => {
    const answer = await api(`${PLANT}/samples`, { method: 'POST', ...request });
    expect(answer.status).toBe(status);
    expect(answer.body).toHaveProperty('error.message');
  });
});

describe('changing a target', () => {
  const bounds = { lowest: 7.6, highest: 8.6, preferred: 8.1, basis: 'Test', reason: 'a trial' };

  async function aTarget() {
    const { body } = await api(`${PLANT}/targets`);
    const found = itemsIn(body).find(({ quantity }) => quantity === 'pH');
    const path = `${PLANT}/targets/${String(found?.['id'])}`;
    const read = await api(path);
    return {
      path,
      etag: read.headers.get('etag') ?? '',
      version: Number(textIn(read.body, 'version')),
    };
  }

  it('needs the tag that was read', async () => {
    const { path, etag } = await aTarget();
    const without = await api(path, { method: 'PUT', body: bounds });
    expect(without.status).toBe(428);
    const changed = await api(path, { method: 'PUT', body: bounds, headers: { 'if-match': etag } });
    expect(changed.status).toBe(200);
    expect(changed.headers.get('etag')).not.toBe(etag);
  });

  it('lets one of twenty editors win each version; the others are told what stands now', async () => {
    const auditBefore = await admin('audit_entries').where({ action: 'target.changed' });
    const rounds = 4;
    for (let round = 0; round < rounds; round++) {
      const { path, etag, version } = await aTarget();
      const answers = await Promise.all(
        Array.from({ length: 20 }, (_, i) =>
          api(path, {
            method: 'PUT',
            body: { ...bounds, preferred: 8 + i / 100, reason: `editor ${i}` },
            headers: { 'if-match': etag },
          }),
        ),
      );
      const statuses = answers.map(({ status }) => status).sort();
      expect(statuses).toEqual([200, ...Array.from({ length: 19 }, () => 412)]);
      const lost = answers.find(({ status }) => status === 412);
      expect(lost?.body).toMatchObject({
        error: {
          code: 'preconditionFailed',
          message: expect.stringContaining(`version ${version + 1} now`) as unknown,
        },
      });
    }
    const auditAfter = await admin('audit_entries').where({ action: 'target.changed' });
    expect(auditAfter.length - auditBefore.length).toBe(rounds);
  });

  it.each([
    ['upside down', { ...bounds, lowest: 9, highest: 8 }],
    ['open at both ends', { ...bounds, lowest: null, highest: null, preferred: null }],
    ['without a reason', { ...bounds, reason: ' ' }],
    ['at pH 15', { ...bounds, highest: 15 }],
  ])('refuses bounds %s', async (_what, body) => {
    const { path, etag } = await aTarget();
    const answer = await api(path, { method: 'PUT', body, headers: { 'if-match': etag } });
    expect(answer.status).toBe(422);
  });
});

describe('a browser’s cookie', () => {
  it('changes something only from a page of our own', async () => {
    const cookie = await sessionCookie(baseUrl, signInOf(inject('signIns'), 'operator'));
    const own = apiClient(baseUrl, { cookie });
    const body = { ...sample, comment: randomUUID() };
    const accepted = await own(`${PLANT}/samples`, { method: 'POST', body, headers: onceKey() });
    expect(accepted.status).toBe(201);
    for (const origin of ['https://elsewhere.example', 'null', `${baseUrl}.evil.example`]) {
      const answer = await own(`${PLANT}/samples`, {
        method: 'POST',
        body,
        headers: { ...onceKey(), origin },
      });
      expect(answer.status, origin).toBe(403);
    }
  });
});

describe('the documents', () => {
  it('name every route there is, and only those, as OpenAPI 3.1', async () => {
    const { status, body } = await apiClient(baseUrl)('/openapi.json');
    expect(status).toBe(200);
    expect(body).toMatchObject({ openapi: '3.1.0', security: [{ token: [] }] });
    const { paths } = body as { paths: Record<string, Record<string, unknown>> };
    expect(Object.keys(paths)).toContain('/{org}/plants/{plant}/samples');
    for (const operations of Object.values(paths)) {
      for (const operation of Object.values(operations)) {
        expect(operation).toHaveProperty('operationId');
        expect(operation).toHaveProperty('responses.401');
      }
    }
  });

  it('are told to people too', async () => {
    const page = await fetch(`${baseUrl}/api-guide`);
    expect(page.status).toBe(200);
    const html = await page.text();
    for (const words of ['Idempotency-Key', 'If-Match', 'Enter a sample']) {
      expect(html).toContain(words);
    }
  });
});
