import { beforeAll, describe, expect, inject, it } from 'vitest';
import { sessionCookie, signInOf } from '../support/sign-in';

const baseUrl = inject('baseUrl');
const signIns = inject('signIns');
const SERIES = '/plants/quarrel-hill/series?point=raw&quantity=pH&from=2026-01-01&to=2026-12-31';

const ask = (path: string, cookie?: string) =>
  fetch(`${baseUrl}${path}`, {
    redirect: 'manual',
    headers: cookie === undefined ? {} : { cookie },
  });

describe('the door, at the running server', () => {
  let cookie: string;
  beforeAll(async () => {
    cookie = await sessionCookie(baseUrl, signInOf(signIns, 'operator'));
  });

  it('answers health without a sign-in, and says nothing else', async () => {
    const answer = await ask('/api/health');
    expect(answer.status).toBe(200);
    expect(await answer.json()).toEqual({ ok: true });
  });

  it('leads a signed-out reader of a page to the sign-in', async () => {
    const answer = await ask('/calverdine/plants/quarrel-hill');
    expect([302, 307]).toContain(answer.status);
    expect(answer.headers.get('location')).toContain('/sign-in');
  });

  it('answers a signed-out request for data with 401 and no data', async () => {
    const answer = await ask(`/api/v1/calverdine${SERIES}`);
    expect(answer.status).toBe(401);
    expect(await answer.json()).toEqual({
      error: { code: 'signedOut', message: 'Sign in to go on.' },
    });
  });

  it('opens to a member', async () => {
    expect((await ask('/calverdine/plants/quarrel-hill', cookie)).status).toBe(200);
    expect((await ask(`/api/v1/calverdine${SERIES}`, cookie)).status).toBe(200);
  });

  it.each(['/api/v1/somebody-else', '/api/v1/calverdine-2'])(
    'knows no organisation %s of another',
    async (organisation) => {
      const answer = await ask(`${organisation}${SERIES}`, cookie);
      expect(answer.status).toBe(404);
      expect(await answer.json()).toMatchObject({ error: { code: 'notFound' } });
    },
  );

  it('knows no works of that name', async () => {
    const answer = await ask(
      '/api/v1/calverdine/plants/nowhere/series?point=raw&quantity=pH&from=2026-01-01&to=2026-12-31',
      cookie,
    );
    expect(answer.status).toBe(404);
  });

  it('signs nobody in with a wrong password', async () => {
    const wrong = await sessionCookie(baseUrl, {
      ...signInOf(signIns, 'operator'),
      password: 'not the password at all',
    });
    expect((await ask(`/api/v1/calverdine${SERIES}`, wrong)).status).toBe(401);
  });

  it('lets every role of the demo read', async () => {
    for (const role of ['operator', 'consultant', 'manager', 'owner']) {
      const theirs = await sessionCookie(baseUrl, signInOf(signIns, role));
      expect((await ask(`/api/v1/calverdine${SERIES}`, theirs)).status, role).toBe(200);
    }
  });
});
