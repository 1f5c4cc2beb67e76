import type { Knex } from 'knex';

export const SMALL_WORKS = {
  organisationId: 'org_small',
  plantId: 'plt_small',
  pointId: 'pnt_small',
  personId: 'per_small',
} as const;

/** An organisation with one plant, one point and one operator: enough for the data tests. */
export async function insertSmallWorks(owner: Knex, suffix = ''): Promise<void> {
  const id = (name: keyof typeof SMALL_WORKS) => `${SMALL_WORKS[name]}${suffix}`;
  const organisation_id = id('organisationId');
  await owner('organisations').insert({
    id: organisation_id,
    slug: `small${suffix}`,
    name: `Small Works${suffix}`,
  });
  await owner('people').insert({
    id: id('personId'),
    email: `operator${suffix}@small.example`,
    name: 'Operator',
    password_hash: 'no password',
    email_verified_at: owner.fn.now(),
  });
  await owner('memberships').insert({
    organisation_id,
    person_id: id('personId'),
    role: 'operator',
  });
  await owner('plants').insert({
    id: id('plantId'),
    organisation_id,
    slug: 'spring',
    name: 'Spring',
    source_summary: 'Spring',
    time_zone: 'Europe/London',
    design_flow_ml_per_d: 1,
    position: 0,
  });
  await owner('sampling_points').insert({
    id: id('pointId'),
    organisation_id,
    plant_id: id('plantId'),
    slug: 'raw',
    name: 'Raw',
    kind: 'raw',
    position: 0,
    sample_every_h: 24,
  });
  const quantities = [
    ['temperature', '°C'],
    ['pH', 'pH'],
    ['alkalinity', 'mg/L as CaCO₃'],
    ['calcium', 'mg/L as Ca'],
  ] as const;
  await owner('point_quantities').insert(
    quantities.map(([quantity, unit], position) => ({
      organisation_id,
      point_id: id('pointId'),
      quantity,
      unit,
      decimals: 1,
      position,
    })),
  );
}
