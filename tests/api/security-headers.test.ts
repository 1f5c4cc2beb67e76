import { request } from 'node:http';
import { describe, expect, inject, it } from 'vitest';

const baseUrl = inject('baseUrl');

describe('every answer of the running server', () => {
  it.each(['/sign-in', '/api/health', '/api/v1/nowhere/plants/x/series', '/no-such-page'])(
    '%s carries its security headers',
    async (path) => {
      const { headers } = await fetch(`${baseUrl}${path}`, { redirect: 'manual' });
      expect(headers.get('content-security-policy')).toMatch(
        /script-src 'self' 'nonce-[\w+/=]{24}'/,
      );
      expect(headers.get('x-content-type-options')).toBe('nosniff');
      expect(headers.get('referrer-policy')).toBe('same-origin');
      expect(headers.get('x-powered-by')).toBeNull();
    },
  );

  it('has a nonce of its own, and every script of the page carries it', async () => {
    const nonces = await Promise.all(
      [1, 2].map(async () => {
        const answer = await fetch(`${baseUrl}/sign-in`);
        const nonce = /'nonce-([\w+/=]+)'/.exec(
          answer.headers.get('content-security-policy') ?? '',
        )?.[1];
        const scripts = (await answer.text()).match(/<script\b[^>]*>/g) ?? [];
        expect(scripts.length).toBeGreaterThan(0);
        for (const script of scripts) expect(script).toContain(`nonce="${nonce}"`);
        return nonce;
      }),
    );
    expect(nonces[0]).not.toBe(nonces[1]);
  });

  it('keeps the session cookie from scripts and from other sites', async () => {
    const answer = await fetch(`${baseUrl}/api/auth/csrf`);
    const cookies = answer.headers.getSetCookie();
    expect(cookies.length).toBeGreaterThan(0);
    for (const cookie of cookies) {
      expect(cookie).toMatch(/HttpOnly/i);
      expect(cookie).toMatch(/SameSite=Lax/i);
    }
  });

  it('is no document for other sites, sniffed or framed, if it is a static file', async () => {
    const page = await (await fetch(`${baseUrl}/sign-in`)).text();
    const script = /\/_next\/static\/[^"]+\.js/.exec(page)?.[0] ?? '';
    for (const path of [script, '/icon.svg', '/favicon.ico']) {
      const { status, headers } = await fetch(`${baseUrl}${path}`);
      expect(status, path).toBe(200);
      expect(headers.get('x-content-type-options'), path).toBe('nosniff');
      expect(headers.get('content-security-policy'), path).toContain("frame-ancestors 'none'");
    }
  });

  it('never echoes a request back to who sends TRACE', async () => {
    const { status, text } = await new Promise<{ status: number; text: string }>(
      (resolve, reject) => {
        const asked = request(
          `${baseUrl}/api/health`,
          { method: 'TRACE', headers: { 'x-marker': 'echo-me' } },
          (answer) => {
            let body = '';
            answer.on('data', (chunk) => (body += String(chunk)));
            answer.on('end', () => resolve({ status: answer.statusCode ?? 0, text: body }));
          },
        );
        asked.on('error', reject);
        asked.end();
      },
    );
    expect(status).toBeGreaterThanOrEqual(400);
    expect(text).not.toContain('echo-me');
  });
});
