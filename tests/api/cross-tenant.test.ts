import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { drawsFrom } from '@/lib/engine/uncertainty/random';
import { adminOf, insertToken } from '../support/make-token';
import { ROUTES, type RouteRow } from './matrix/table';
import { type Holding, type PlantHolding } from './matrix/world';

/** The full count by MARLWICK_FUZZ=10000; fewer in every run. */
const REQUESTS = Number(process.env.MARLWICK_FUZZ ?? '10000');
const TOGETHER = 16;
const baseUrl = inject('baseUrl');
let admin: Knex;

beforeAll(() => {
  admin = adminOf(inject('adminUrl'));
});
afterAll(() => admin.destroy());

/** Everything that names something of an organisation's, to be looked for in what others are answered. */
async function marksOf(organisationId: string): Promise<Set<string>> {
  const tables = ['plants', 'sampling_points', 'targets', 'samples', 'plans', 'dosing_points'];
  const ids = await Promise.all(
    tables.map((table) =>
      admin(table).where({ organisation_id: organisationId }).limit(400).pluck('id'),
    ),
  );
  return new Set((ids as string[][]).flat());
}

describe('one organisation at another’s door', () => {
  it(`gets nothing in ${REQUESTS} requests, whatever it asks for and however it mixes the ids`, async () => {
    const victim = await holdingOf('calverdine');
    const thief = await insertThief();
    const token = await insertToken(admin, {
      organisationId: thief.organisationId,
      madeBy: thief.personId,
    });
    const marks = await marksOf(victim.organisationId);
    const before = await countsOf(victim.organisationId);
    const { uniform } = drawsFrom(4711);
    const pick = <T>(list: readonly T[]): T => list[Math.floor(uniform() * list.length)] as T;
    const leaks: string[] = [];
    const statuses = new Map<number, number>();

    async function one(): Promise<void> {
      const row = pick(ROUTES);
      // Another's organisation with another's ids, one's own with another's ids, and every mixture.
      const holding = uniform() < 0.5 ? victim : thief.holding;
      const plant = mixed(pick, victim, thief.holding);
      // One's own name with one's own plant is no crossing; skip the pure case.
      const isOwn =
        holding === thief.holding &&
        Object.values<string>({ ...plant }).every((id) => !marks.has(id));
      if (isOwn && plant.slug === thief.holding.plants[0].slug) return one();
      const answer = await send(row, { holding, plant }, token);
      statuses.set(answer.status, (statuses.get(answer.status) ?? 0) + 1);
      const told = [...marks].find(
        (id) => answer.text.includes(id) && !JSON.stringify(plant).includes(id),
      );
      const opened = holding === victim && answer.status < 400;
      if (told !== undefined || opened || answer.status >= 500) {
        leaks.push(
          `${row.method} ${row.path({ holding, plant })} → ${answer.status} ${told ?? ''}`,
        );
      }
    }
    for (let sent = 0; sent < REQUESTS; sent += TOGETHER) {
      await Promise.all(Array.from({ length: Math.min(TOGETHER, REQUESTS - sent) }, one));
    }
    expect(leaks).toEqual([]);
    expect(await countsOf(victim.organisationId)).toEqual(before);
    expect(statuses.get(404) ?? 0).toBeGreaterThan(REQUESTS / 3);
  }, 600_000);
});

const mixed = (pick: <T>(list: readonly T[]) => T, victim: Holding, own: Holding): PlantHolding => {
  const from = () => pick([victim.plants[0], victim.plants[1], own.plants[0]]);
  return {
    id: from().id,
    slug: from().slug,
    pointId: from().pointId,
    targetId: from().targetId,
    dosingPointId: from().dosingPointId,
    sampleId: from().sampleId,
    planId: from().planId,
  };
};

async function send(
  row: RouteRow,
  at: { holding: Holding; plant: PlantHolding },
  token: string,
): Promise<{ status: number; text: string }> {
  const answer = await fetch(`${baseUrl}${row.path(at)}`, {
    method: row.method,
    redirect: 'manual',
    headers: {
      authorization: `Bearer ${token}`,
      ...(row.body === undefined ? {} : { 'content-type': 'application/json' }),
      ...(row.method === 'POST' ? { 'idempotency-key': randomUUID() } : {}),
      ...(row.needsMatch === true ? { 'if-match': '"v1"' } : {}),
    },
    ...(row.body === undefined ? {} : { body: JSON.stringify(row.body(at)) }),
  });
  return { status: answer.status, text: await answer.text() };
}

async function countsOf(organisation_id: string): Promise<Record<string, number>> {
  const counts: Record<string, number> = {};
  for (const table of ['samples', 'plans', 'feed_log', 'audit_entries']) {
    const [row] = await admin(table).where({ organisation_id }).count<{ count: number }[]>();
    counts[table] = Number(row?.count ?? 0);
  }
  const [sum] = await admin('targets')
    .where({ organisation_id })
    .sum<{ sum: number }[]>('version as sum');
  counts['target versions'] = Number(sum?.sum ?? 0);
  return counts;
}

/** The ids of an organisation's first two plants and something in each. */
async function holdingOf(org: string): Promise<Holding> {
  const organisation = await admin('organisations').where({ slug: org }).first<{ id: string }>();
  const plants = await admin('plants')
    .where({ organisation_id: organisation.id })
    .orderBy('position')
    .limit(2)
    .select<{ id: string; slug: string }[]>('id', 'slug');
  const whole = await Promise.all(
    plants.map(async ({ id, slug }): Promise<PlantHolding> => {
      const idIn = async (table: string) =>
        (await admin(table).where({ plant_id: id }).first<{ id: string } | undefined>('id'))?.id ??
        `${table}_none`;
      const pointId = await idIn('sampling_points');
      const target = await admin('targets')
        .join('sampling_points', 'sampling_points.id', 'targets.point_id')
        .where('sampling_points.plant_id', id)
        .first<{ id: string }>('targets.id');
      return {
        id,
        slug,
        pointId,
        targetId: target.id,
        dosingPointId: await idIn('dosing_points'),
        sampleId: await idIn('samples'),
        planId: await idIn('plans'),
      };
    }),
  );
  const [first, second] = whole;
  if (first === undefined || second === undefined) throw new Error('Two plants are needed.');
  return { org, organisationId: organisation.id, plants: [first, second] };
}

/** An organisation of its own, with one empty plant whose name is also the victim's. */
async function insertThief() {
  const organisationId = 'org_thief';
  const personId = 'per_thief';
  await admin('organisations').insert({ id: organisationId, slug: 'thief', name: 'Thief' });
  await admin('people').insert({
    id: personId,
    email: 'thief@thief.example',
    name: 'Thief',
    password_hash: null,
  });
  await admin('memberships').insert({
    organisation_id: organisationId,
    person_id: personId,
    role: 'owner',
  });
  await admin('plants').insert({
    id: 'plt_thief',
    organisation_id: organisationId,
    slug: 'quarrel-hill',
    name: 'Quarrel Hill, so called',
    source_summary: '',
    time_zone: 'Europe/London',
    design_flow_ml_per_d: 1,
    position: 0,
  });
  await admin('sampling_points').insert({
    id: 'pnt_thief',
    organisation_id: organisationId,
    plant_id: 'plt_thief',
    slug: 'raw',
    name: 'Raw',
    kind: 'raw',
    position: 0,
    sample_every_h: null,
  });
  const plant: PlantHolding = {
    id: 'plt_thief',
    slug: 'quarrel-hill',
    pointId: 'pnt_thief',
    targetId: 'tgt_thief',
    dosingPointId: 'dos_thief',
    sampleId: 'smp_thief',
    planId: 'pln_thief',
  };
  const holding: Holding = { org: 'thief', organisationId, plants: [plant, plant] };
  return { organisationId, personId, holding };
}
