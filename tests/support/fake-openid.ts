import { createHash, randomUUID } from 'node:crypto';
import { createServer } from 'node:http';
import { exportJWK, generateKeyPair, SignJWT } from 'jose';

export interface OpenIdClaims {
  readonly sub: string;
  readonly email: string;
  readonly email_verified: boolean;
  readonly name: string;
}

/** A small OpenID Connect provider: whoever comes is signed in at once as the person set. Checks PKCE and the secret. */
export async function openFakeOpenId(port: number, client: { id: string; secret: string }) {
  const issuer = `http://127.0.0.1:${port}`;
  const { publicKey, privateKey } = await generateKeyPair('RS256');
  const jwk = { ...(await exportJWK(publicKey)), kid: 'test', alg: 'RS256', use: 'sig' };
  const codes = new Map<string, { nonce: string; challenge: string; claims: OpenIdClaims }>();
  let person: OpenIdClaims = { sub: 'nobody', email: '', email_verified: false, name: '' };

  const server = createServer((request, response) => {
    void answer(request.url ?? '/', request.headers.authorization, bodyOf(request)).then(
      ({ status, headers, body }) => {
        response.writeHead(status, headers);
        response.end(body);
      },
    );
  });
  await new Promise<void>((resolve) => server.listen(port, '127.0.0.1', resolve));

  const json = (value: unknown, status = 200) => ({
    status,
    headers: { 'content-type': 'application/json' } as Record<string, string>,
    body: JSON.stringify(value),
  });

  async function answer(path: string, authorization: string | undefined, body: Promise<string>) {
    const url = new URL(path, issuer);
    switch (url.pathname) {
      case '/.well-known/openid-configuration':
        return json({
          issuer,
          authorization_endpoint: `${issuer}/authorize`,
          token_endpoint: `${issuer}/token`,
          jwks_uri: `${issuer}/keys`,
          response_types_supported: ['code'],
          subject_types_supported: ['public'],
          id_token_signing_alg_values_supported: ['RS256'],
          code_challenge_methods_supported: ['S256'],
        });
      case '/keys':
        return json({ keys: [jwk] });
      case '/authorize': {
        const asked = url.searchParams;
        const code = randomUUID();
        codes.set(code, {
          nonce: asked.get('nonce') ?? '',
          challenge: asked.get('code_challenge') ?? '',
          claims: person,
        });
        const back = new URL(asked.get('redirect_uri') ?? issuer);
        back.searchParams.set('code', code);
        back.searchParams.set('state', asked.get('state') ?? '');
        return { status: 302, headers: { location: back.href }, body: '' };
      }
      case '/token': {
        const form = new URLSearchParams(await body);
        const kept = codes.get(form.get('code') ?? '');
        codes.delete(form.get('code') ?? '');
        const expected = `Basic ${Buffer.from(`${client.id}:${client.secret}`).toString('base64')}`;
        const proof = createHash('sha256')
          .update(form.get('code_verifier') ?? '')
          .digest('base64url');
        if (kept === undefined || authorization !== expected || proof !== kept.challenge) {
          return json({ error: 'invalid_grant' }, 400);
        }
        const { sub, ...claims } = kept.claims;
        const idToken = await new SignJWT({ ...claims, nonce: kept.nonce })
          .setProtectedHeader({ alg: 'RS256', kid: 'test' })
          .setIssuer(issuer)
          .setAudience(client.id)
          .setSubject(sub)
          .setIssuedAt()
          .setExpirationTime('5m')
          .sign(privateKey);
        return json({ access_token: randomUUID(), token_type: 'Bearer', id_token: idToken });
      }
      default:
        return json({ error: 'not_found' }, 404);
    }
  }

  return {
    issuer,
    /** Whom the provider vouches for from now on. */
    signInAs: (claims: OpenIdClaims) => {
      person = claims;
    },
    close: () => new Promise<void>((resolve) => server.close(() => resolve())),
  };
}

async function bodyOf(request: AsyncIterable<unknown>): Promise<string> {
  let text = '';
  for await (const chunk of request) text += String(chunk);
  return text;
}
