import { NextResponse, type NextRequest } from 'next/server';
import { contentSecurityPolicy } from '@/lib/security/content-security-policy';
import { SECURITY_HEADERS, STRICT_TRANSPORT } from '@/lib/security/headers';

/** Dresses every answer with its security headers and a fresh nonce. It decides no permission. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = Buffer.from(crypto.getRandomValues(new Uint8Array(18))).toString('base64');
  const policy = contentSecurityPolicy(nonce, process.env.NODE_ENV === 'development');
  const headers = new Headers(request.headers);
  // Next reads the nonce for its own scripts from the policy on the request.
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('content-security-policy', policy);
  for (const [name, value] of Object.entries(SECURITY_HEADERS)) response.headers.set(name, value);
  if (process.env.NEXTAUTH_URL?.startsWith('https:') === true) {
    response.headers.set('strict-transport-security', STRICT_TRANSPORT);
  }
  return response;
}

export const config = {
  // Static files carry no secrets and need no nonce.
  matcher: '/((?!_next/static|_next/image|icon.svg|favicon.ico|robots.txt).*)',
};
