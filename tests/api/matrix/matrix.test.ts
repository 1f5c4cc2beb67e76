import { readdirSync, readFileSync } from 'node:fs';
import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { isTokenScope, ROLES, roleMay, type Permission, type Role } from '@/lib/auth/permissions';
import { adminOf } from '../../support/make-token';
import { callAction, readActionIds } from './call-action';
import {
  ACTIONS,
  OPEN_ROUTES,
  PAGES,
  ROUTES,
  type ActionRow,
  type PageRow,
  type RouteRow,
} from './table';
import { makeWorld, type Caller, type Holding, type PlantHolding, type World } from './world';

const baseUrl = inject('baseUrl');
let admin: Knex;
let world: World;

beforeAll(async () => {
  admin = adminOf(inject('adminUrl'));
  world = await makeWorld(admin, baseUrl);
});
afterAll(() => admin.destroy());

const filesOf = (name: string): string[] =>
  readdirSync('app', { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith(`/${name}`))
    .map((file) => `app/${file}`)
    .sort();

const callerOf = (role: Role): Caller => {
  const caller = world.callers.find((each) => each.role === role);
  if (caller === undefined) throw new Error(`No ${role}.`);
  return caller;
};
const isPermission = (door: string): door is Permission => door.includes('.');

describe('the table', () => {
  it('has every page, and no other', () => {
    expect(PAGES.map(({ file }) => file).sort()).toEqual(filesOf('page.tsx'));
  });

  it('has every method of every route handler, and no other', () => {
    const found = filesOf('route.ts')
      .filter((file) => !(file in OPEN_ROUTES))
      .flatMap((file) =>
        [...readFileSync(file, 'utf8').matchAll(/export const (GET|POST|PUT|PATCH|DELETE)\b/g)].map(
          ([, method]) => `${method ?? ''} ${file}`,
        ),
      )
      .sort();
    expect(ROUTES.map(({ file, method }) => `${method} ${file}`).sort()).toEqual(found);
  });

  it('has every action, and no other; the server knows each', () => {
    const found = filesOf('actions.ts')
      .flatMap((file) =>
        [...readFileSync(file, 'utf8').matchAll(/export (?:const|async function) (\w+)/g)].map(
          ([, name]) => `${file} ${name ?? ''}`,
        ),
      )
      .sort();
    expect(ACTIONS.map(({ file, name }) => `${file} ${name}`).sort()).toEqual(found);
    const ids = readActionIds('.next-test');
    // What no page uses is not built, and cannot be called.
    expect([...ids.keys()].sort()).toEqual(found);
  });
});

interface At {
  readonly holding: Holding;
  readonly plant: PlantHolding;
}
/** Own plant, the plant that a narrowed caller does not see, and the same of another organisation. */
const places = (): Record<'own' | 'second' | 'other', At> => ({
  own: { holding: world.own, plant: world.own.plants[0] },
  second: { holding: world.own, plant: world.own.plants[1] },
  other: { holding: world.other, plant: world.other.plants[0] },
});

async function statusOf(
  path: string,
  init: { method?: string; headers?: Record<string, string>; body?: string } = {},
): Promise<number> {
  const answer = await fetch(`${baseUrl}${path}`, { redirect: 'manual', ...init });
  await answer.arrayBuffer();
  return answer.status;
}

describe.each(PAGES.map((row) => [row.file, row] as const))('%s', (_file, row: PageRow) => {
  const opened = row.opens ?? 200;
  const ask = (at: At, headers: Record<string, string> = {}) => statusOf(row.path(at), { headers });

  if (row.door === 'public') {
    it('opens to anyone', async () => {
      expect(await ask(places().own)).toBe(200);
    });
    return;
  }

  it('leads the signed out, and whoever brings a token to a page, to the sign-in', async () => {
    const { own } = places();
    const caller = callerOf('owner');
    expect(await ask(own)).toBe(307);
    for (const token of [caller.expiredToken, caller.token]) {
      expect(await ask(own, { authorization: `Bearer ${token}` })).toBe(307);
    }
  });

  it.each(ROLES)('answers the %s as the table says', async (role) => {
    const { own, second, other } = places();
    const caller = callerOf(role);
    const may = row.door === 'person' || roleMay(role, row.door as Permission);
    const expected = may ? opened : 404;
    expect(await ask(own, { cookie: caller.cookie }), 'own plant').toBe(expected);
    expect(await ask(second, { cookie: caller.cookie }), 'second plant').toBe(expected);
    const narrow = { cookie: caller.cookieOfFirstPlant };
    expect(await ask(own, narrow), 'own plant, named').toBe(expected);
    expect(await ask(second, narrow), 'plant not named').toBe(row.isOfPlant ? 404 : expected);
    if (row.door === 'person') return;
    expect(await ask(other, { cookie: caller.cookie }), 'other organisation').toBe(404);
  });
});

describe.each(ROUTES.map((row) => [`${row.method} ${row.file}`, row] as const))(
  '%s',
  (_name, row: RouteRow) => {
    const opened = row.opens ?? 200;

    async function ask(at: At, headers: Record<string, string> = {}): Promise<number> {
      const target = row.needsMatch
        ? await admin('targets').where({ id: at.plant.targetId }).first<{ version: number }>()
        : undefined;
      return statusOf(row.path(at), {
        method: row.method,
        headers: {
          ...(row.body === undefined ? {} : { 'content-type': 'application/json' }),
          ...(row.method === 'POST' ? { 'idempotency-key': randomUUID() } : {}),
          ...(target === undefined ? {} : { 'if-match': `"v${target.version}"` }),
          ...headers,
        },
        ...(row.body === undefined ? {} : { body: JSON.stringify(row.body(at)) }),
      });
    }
    const bearer = (token: string) => ({ authorization: `Bearer ${token}` });
    const browser = (cookie: string) => ({ cookie, origin: baseUrl });

    it('answers 401 without a sign-in, and to an expired, revoked or unknown token', async () => {
      const { own } = places();
      const { expiredToken, revokedToken } = callerOf('owner');
      expect(await ask(own)).toBe(401);
      for (const token of [expiredToken, revokedToken, `mwk_0a0a0a_${'A'.repeat(43)}`, 'x']) {
        expect(await ask(own, bearer(token))).toBe(401);
      }
    });

    it.each(ROLES)('answers the %s as the table says', async (role) => {
      if (!isPermission(row.door) || !isTokenScope(row.door)) throw new Error('No scope.');
      const { own, second, other } = places();
      const caller = callerOf(role);
      const may = roleMay(role, row.door);
      const expected = may ? opened : 403;
      const ofPlant = row.isOfPlant ? (may ? 404 : 403) : expected;
      expect(await ask(own, browser(caller.cookie)), 'own plant').toBe(expected);
      expect(await ask(own, bearer(caller.token)), 'own plant, token').toBe(expected);
      expect(await ask(second, browser(caller.cookieOfFirstPlant)), 'not named').toBe(ofPlant);
      expect(await ask(second, bearer(caller.tokenOfFirstPlant)), 'token, not named').toBe(ofPlant);
      expect(await ask(own, bearer(caller.tokenOfFirstPlant)), 'token, named').toBe(expected);
      expect(await ask(own, bearer(await caller.tokenWithout(row.door))), 'no scope').toBe(403);
      expect(await ask(other, browser(caller.cookie)), 'other organisation').toBe(404);
      expect(await ask(other, bearer(caller.token)), 'other organisation, token').toBe(404);
      if (row.method !== 'GET') {
        const elsewhere = { cookie: caller.cookie, origin: 'https://elsewhere.example' };
        expect(await ask(own, elsewhere), 'from another site').toBe(403);
      }
    });
  },
);

describe.each(ACTIONS.map((row) => [row.name, row] as const))('%s', (_name, row: ActionRow) => {
  const SIGN_IN = 'Sign in to go on.';
  const LOOK = 'Some fields need another look.';
  const NO_ORGANISATION = 'There is no such organisation here.';
  const NO_PLANT = 'There is no such works here.';
  const mayNot = (role: Role) => `A person with the role ${role} may not do this here.`;

  /** A page that carries the action; the door is the action's own, whatever page it is sent to. */
  function ask(holding: Holding, input: unknown, headers: Record<string, string> = {}) {
    const id = readActionIds('.next-test').get(`${row.file} ${row.name}`) ?? '';
    const args = isPermission(row.door) ? [holding.org, input] : [input];
    const carrier = PAGES.find(({ file }) => file.replace('page.tsx', 'actions.ts') === row.file);
    const at = { holding: world.own, plant: world.own.plants[0] };
    return callAction(baseUrl, carrier?.path(at) ?? '/sign-up', id, args, headers);
  }

  if (row.door === 'public') {
    it('hears anyone, and says what is wrong with what it was sent', async () => {
      expect(await ask(world.own, {})).toMatchObject({ ok: false, message: LOOK });
    });
    return;
  }

  it('asks the signed out, and whoever brings a token, to sign in', async () => {
    const { expiredToken, token } = callerOf('owner');
    expect(await ask(world.own, {})).toMatchObject({ ok: false, message: SIGN_IN });
    for (const each of [expiredToken, token]) {
      const answer = await ask(world.own, {}, { authorization: `Bearer ${each}` });
      expect(answer).toMatchObject({ ok: false, message: SIGN_IN });
    }
  });

  it('is not called from another site', async () => {
    const answer = await ask(
      world.own,
      {},
      { cookie: callerOf('owner').cookie, origin: 'https://elsewhere.example' },
    );
    expect(answer.ok).toBeNull();
    expect(answer.status).toBeGreaterThanOrEqual(400);
  });

  it.each(ROLES)('answers the %s as the table says', async (role) => {
    const { own, second } = places();
    const caller = callerOf(role);
    if (row.door === 'person') {
      const answer = await ask(world.own, {}, { cookie: caller.cookie });
      expect(answer).toMatchObject({ ok: false, message: LOOK });
      return;
    }
    const may = roleMay(role, row.door as Permission);
    expect(await ask(world.own, {}, { cookie: caller.cookie }), 'own').toMatchObject({
      ok: false,
      message: may ? LOOK : mayNot(role),
    });
    expect(await ask(world.other, {}, { cookie: caller.cookie }), 'other').toMatchObject({
      ok: false,
      message: NO_ORGANISATION,
    });
    if (row.plantInput === undefined) return;
    const narrow = { cookie: caller.cookieOfFirstPlant };
    expect(await ask(world.own, row.plantInput(second), narrow), 'not named').toMatchObject({
      ok: false,
      message: may ? NO_PLANT : mayNot(role),
    });
    const ofNamed = await ask(world.own, row.plantInput(own), narrow);
    expect(ofNamed.message, 'named').not.toBe(NO_PLANT);
    const foreign = row.plantInput(places().other);
    const crossed = await ask(world.own, foreign, { cookie: caller.cookie });
    expect(crossed.ok && row.name !== 'saveSampleAction', 'ids of another').toBeFalsy();
  });
});
