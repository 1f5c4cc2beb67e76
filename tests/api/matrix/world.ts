import type { Knex } from 'knex';
import { hashPassword } from '@/lib/auth/passwords';
import { ROLES, TOKEN_SCOPES, type Role, type TokenScope } from '@/lib/auth/permissions';
import { solveWater, type WaterAnalysis } from '@/lib/engine';
import { planQuantitiesOf } from '@/lib/plans/quantities';
import { insertToken } from '../../support/make-token';
import { sessionCookie } from '../../support/sign-in';

/** What one organisation of the matrix has; every id can be asked for by anyone. */
export interface Holding {
  readonly org: string;
  readonly organisationId: string;
  readonly plants: readonly [PlantHolding, PlantHolding];
}
export interface PlantHolding {
  readonly id: string;
  readonly slug: string;
  readonly pointId: string;
  readonly targetId: string;
  readonly dosingPointId: string;
  readonly sampleId: string;
  readonly planId: string;
}

/** One role's ways of coming to the door of the first organisation. */
export interface Caller {
  readonly role: Role;
  readonly personId: string;
  /** Sees every plant. */
  readonly cookie: string;
  /** A second person of the role, who sees the first plant alone. */
  readonly cookieOfFirstPlant: string;
  readonly token: string;
  /** Everything but the scope. */
  readonly tokenWithout: (scope: TokenScope) => Promise<string>;
  readonly tokenOfFirstPlant: string;
  readonly expiredToken: string;
  readonly revokedToken: string;
}

export interface World {
  readonly own: Holding;
  readonly other: Holding;
  readonly callers: readonly Caller[];
}

const PASSWORD = 'nine grey stones in a row';

/** Two organisations of two plants each, and in the first every role twice. */
export async function makeWorld(admin: Knex, baseUrl: string): Promise<World> {
  const passwordHash = await hashPassword(PASSWORD);
  const own = await insertHolding(admin, 'matrix');
  const other = await insertHolding(admin, 'matrix-other');
  const callers: Caller[] = [];
  for (const role of ROLES) {
    callers.push(await insertCaller(admin, baseUrl, own, role, passwordHash));
  }
  return { own, other, callers };
}

async function insertHolding(admin: Knex, org: string): Promise<Holding> {
  const organisationId = `org_${org}`;
  await admin('organisations').insert({ id: organisationId, slug: org, name: `The ${org} water` });
  const writer = `per_${org}_writer`;
  await admin('people').insert({
    id: writer,
    email: `writer@${org}.example`,
    name: 'Writer',
    password_hash: null,
  });
  await admin('memberships').insert({
    organisation_id: organisationId,
    person_id: writer,
    role: 'manager',
  });
  const first = await insertPlant(admin, organisationId, org, 'first', 0, writer);
  const second = await insertPlant(admin, organisationId, org, 'second', 1, writer);
  return { org, organisationId, plants: [first, second] };
}

async function insertPlant(
  admin: Knex,
  organisation_id: string,
  org: string,
  slug: string,
  position: number,
  writer: string,
): Promise<PlantHolding> {
  const id = (kind: string) => `${kind}_${org}_${slug}`;
  const plant_id = id('plt');
  await admin('plants').insert({
    id: plant_id,
    organisation_id,
    slug,
    name: `Plant ${slug}`,
    source_summary: 'Brook',
    time_zone: 'Europe/London',
    design_flow_ml_per_d: 2,
    position,
  });
  await admin('sampling_points').insert({
    id: id('pnt'),
    organisation_id,
    plant_id,
    slug: 'raw',
    name: 'Raw',
    kind: 'raw',
    position: 0,
    sample_every_h: 24,
  });
  await admin('point_quantities').insert(
    (
      [
        ['temperature', '°C'],
        ['pH', 'pH'],
        ['alkalinity', 'mg/L as CaCO₃'],
      ] as const
    ).map(([quantity, unit], place) => ({
      organisation_id,
      point_id: id('pnt'),
      quantity,
      unit,
      decimals: 1,
      position: place,
    })),
  );
  await admin('targets').insert({
    id: id('tgt'),
    organisation_id,
    point_id: id('pnt'),
    quantity: 'pH',
    lowest: 6,
    highest: 9,
    preferred: null,
    basis: '',
  });
  await admin('train_steps').insert({
    id: id('stp'),
    organisation_id,
    plant_id,
    position: 0,
    kind: 'intake',
    name: 'Intake',
  });
  await admin('dosing_points').insert({
    id: id('dos'),
    organisation_id,
    plant_id,
    train_step_id: id('stp'),
    position: 0,
    reagent: 'sodium-hydroxide',
    product_name: 'Caustic soda',
    dose_basis: 'as NaOH',
  });
  await admin('samples').insert({
    id: id('smp'),
    organisation_id,
    plant_id,
    point_id: id('pnt'),
    client_key: crypto.randomUUID(),
    taken_at: new Date('2026-11-01T06:00:00Z'),
    entered_by: writer,
  });
  await admin('results').insert(
    (
      [
        ['temperature', '8', '°C', 8],
        ['pH', '7.2', 'pH', 7.2],
        ['alkalinity', '60', 'mg/L as CaCO₃', 60],
      ] as const
    ).map(([quantity, entered_text, entered_unit, value]) => ({
      organisation_id,
      sample_id: id('smp'),
      quantity,
      entered_text,
      entered_unit,
      qualifier: '',
      value,
    })),
  );
  const analysis = {
    temperatureC: 8,
    pH: 7.2,
    alkalinityMgLCaCO3: 60,
    analytesMgL: {},
  };
  await admin('plans').insert({
    id: id('pln'),
    organisation_id,
    plant_id,
    sample_id: id('smp'),
    client_key: crypto.randomUUID(),
    target_quantity: 'pH',
    target_value: 8,
    engine_version: 'test',
    constants_hash: 'test',
    analysis: JSON.stringify(analysis),
    predicted: JSON.stringify(predictedOf(analysis)),
    reason: '',
    created_by: writer,
  });
  await admin('plan_doses').insert({
    organisation_id,
    plan_id: id('pln'),
    position: 0,
    reagent: 'sodium-hydroxide',
    dose_mg_per_l: 2,
  });
  return {
    id: plant_id,
    slug,
    pointId: id('pnt'),
    targetId: id('tgt'),
    dosingPointId: id('dos'),
    sampleId: id('smp'),
    planId: id('pln'),
  };
}

async function insertCaller(
  admin: Knex,
  baseUrl: string,
  own: Holding,
  role: Role,
  passwordHash: string,
): Promise<Caller> {
  const [first] = own.plants;
  const insertPerson = async (name: string, allPlants: boolean) => {
    const id = `per_matrix_${name}`;
    const email = `${name}@matrix.example`;
    await admin('people').insert({
      id,
      email,
      name,
      password_hash: passwordHash,
      email_verified_at: new Date(),
    });
    await admin('memberships').insert({
      organisation_id: own.organisationId,
      person_id: id,
      role,
      all_plants: allPlants,
    });
    return { id, cookie: await sessionCookie(baseUrl, { role, name, email, password: PASSWORD }) };
  };
  const whole = await insertPerson(role, true);
  const narrow = await insertPerson(`${role}-of-first`, false);
  await admin('membership_plants').insert({
    organisation_id: own.organisationId,
    person_id: narrow.id,
    plant_id: first.id,
  });
  const token = (wish: object = {}) =>
    insertToken(admin, { organisationId: own.organisationId, madeBy: whole.id, ...wish });
  return {
    role,
    personId: whole.id,
    cookie: whole.cookie,
    cookieOfFirstPlant: narrow.cookie,
    token: await token(),
    tokenWithout: (scope) => token({ scopes: TOKEN_SCOPES.filter((each) => each !== scope) }),
    tokenOfFirstPlant: await token({ plantIds: [first.id] }),
    expiredToken: await token({ expiresAt: new Date(Date.now() - 1000) }),
    revokedToken: await token({ revokedAt: new Date() }),
  };
}

/** Before and after alike: what a plan without effect would predict. */
function predictedOf(analysis: WaterAnalysis) {
  const solved = solveWater(analysis);
  if (!solved.ok) throw new Error(solved.message);
  const quantities = planQuantitiesOf(solved.water);
  return { before: quantities, equilibrium: quantities };
}
