import { randomUUID } from 'node:crypto';
import type { Knex } from 'knex';
import { afterAll, beforeAll, describe, expect, inject, it } from 'vitest';
import { NEXT } from '@/docker-free-scripts/setup/build.mjs';
import { freePort } from '@/docker-free-scripts/setup/ports.mjs';
import { Supervisor } from '@/docker-free-scripts/setup/supervisor.mjs';
import { openFakeOpenId } from '../support/fake-openid';
import { adminOf } from '../support/make-token';

const CLIENT = { id: 'marlwick', secret: 'a-client-secret-for-tests' };
const supervisor = new Supervisor();
let provider: Awaited<ReturnType<typeof openFakeOpenId>>;
let baseUrl: string;
let admin: Knex;

/** A second web process beside the first, on the same database, with a provider set. */
beforeAll(async () => {
  admin = adminOf(inject('adminUrl'));
  provider = await openFakeOpenId(await freePort(), CLIENT);
  const port = await freePort();
  baseUrl = `http://127.0.0.1:${port}`;
  await supervisor.start({
    name: 'test-web-openid',
    command: process.execPath,
    args: [NEXT, 'start', '-H', '127.0.0.1', '-p', String(port)],
    env: {
      NODE_ENV: 'production',
      MARLWICK_BUILD_DIR: '.next-test',
      NEXT_TELEMETRY_DISABLED: '1',
      NEXTAUTH_URL: baseUrl,
      NEXTAUTH_SECRET: 'a-secret-for-tests-only-0123456789abcdef',
      DATABASE_URL: inject('databaseUrl'),
      OIDC_ISSUER: provider.issuer,
      OIDC_CLIENT_ID: CLIENT.id,
      OIDC_CLIENT_SECRET: CLIENT.secret,
      OIDC_NAME: 'Town Hall',
    },
    healthUrl: `${baseUrl}/api/health`,
  });
});
afterAll(async () => {
  await supervisor.stop();
  await provider.close();
  await admin.destroy();
});

/** Follows the whole way over the provider with a cookie jar; returns where it ends and the cookies held then. */
async function signInOverProvider(): Promise<{ end: string; cookie: string }> {
  const jar = new Map<string, string>();
  const ask = async (url: string, init: RequestInit = {}): Promise<Response> => {
    const cookie = [...jar].map(([name, value]) => `${name}=${value}`).join('; ');
    const answer = await fetch(url, {
      ...init,
      redirect: 'manual',
      headers: { ...init.headers, cookie },
    });
    for (const line of answer.headers.getSetCookie()) {
      const [pair = ''] = line.split(';');
      const at = pair.indexOf('=');
      jar.set(pair.slice(0, at), pair.slice(at + 1));
    }
    return answer;
  };
  const csrf = (await (await ask(`${baseUrl}/api/auth/csrf`)).json()) as { csrfToken: string };
  let answer = await ask(`${baseUrl}/api/auth/signin/openid`, {
    method: 'POST',
    headers: { 'content-type': 'application/x-www-form-urlencoded' },
    body: new URLSearchParams({ csrfToken: csrf.csrfToken, callbackUrl: baseUrl }),
  });
  let end = '';
  for (let hops = 0; hops < 6 && answer.headers.has('location'); hops++) {
    end = new URL(answer.headers.get('location') ?? '', baseUrl).href;
    if (end.startsWith(baseUrl) && !end.includes('/api/auth/')) break;
    answer = await ask(end);
  }
  return { end, cookie: [...jar].map(([name, value]) => `${name}=${value}`).join('; ') };
}

const statusWith = async (cookie: string): Promise<number> =>
  (await fetch(`${baseUrl}/api/v1/calverdine/plants`, { headers: { cookie } })).status;

describe('sign-in through the organisation’s own provider', () => {
  it('is offered by name only where one is set', async () => {
    expect(await (await fetch(`${baseUrl}/sign-in`)).text()).toContain('Town Hall');
    expect(await (await fetch(`${inject('baseUrl')}/sign-in`)).text()).not.toContain('Town Hall');
  });

  it('opens for the person of a verified address, and from then on for that identity whatever its address', async () => {
    const sub = randomUUID();
    provider.signInAs({
      sub,
      email: 'manager@calverdine.example',
      email_verified: true,
      name: 'Ingrid',
    });
    expect(await statusWith((await signInOverProvider()).cookie)).toBe(200);
    provider.signInAs({ sub, email: 'moved@elsewhere.example', email_verified: false, name: 'I' });
    expect(await statusWith((await signInOverProvider()).cookie)).toBe(200);
    const linked = await admin('external_identities');
    expect(linked).toHaveLength(1);
    expect(JSON.stringify(linked)).not.toContain(sub);
  });

  it.each([
    ['an address the provider has not verified', 'owner@calverdine.example', false],
    ['an address nobody here has', 'stranger@elsewhere.example', true],
  ])('stays shut for %s, and makes no account', async (_what, email, email_verified) => {
    const people = await admin('people').count();
    provider.signInAs({ sub: randomUUID(), email, email_verified, name: 'X' });
    const { end, cookie } = await signInOverProvider();
    expect(end).toContain('/sign-in?refused=unknown');
    expect(await statusWith(cookie)).toBe(401);
    expect(await admin('people').count()).toEqual(people);
  });
});
