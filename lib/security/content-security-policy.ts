/**
 * What a page may load: its own origin, and scripts only with this answer's nonce. Style attributes are allowed because
 * charts and the plant line set sizes by them; they can run nothing.
 */
export function contentSecurityPolicy(nonce: string, isDevelopment: boolean): string {
  const directives: Record<string, readonly string[]> = {
    'default-src': ["'self'"],
    // Development reloads by evaluating and over a web socket; production does neither.
    'script-src': [
      "'self'",
      `'nonce-${nonce}'`,
      "'strict-dynamic'",
      ...(isDevelopment ? ["'unsafe-eval'"] : []),
    ],
    'style-src': ["'self'", isDevelopment ? "'unsafe-inline'" : `'nonce-${nonce}'`],
    'style-src-attr': ["'unsafe-inline'"],
    'img-src': ["'self'", 'data:', 'blob:'],
    'font-src': ["'self'"],
    'connect-src': ["'self'", ...(isDevelopment ? ['ws:'] : [])],
    'worker-src': ["'self'", 'blob:'],
    'object-src': ["'none'"],
    'base-uri': ["'none'"],
    'form-action': ["'self'"],
    'frame-ancestors': ["'none'"],
  };
  return Object.entries(directives)
    .map(([name, sources]) => `${name} ${sources.join(' ')}`)
    .join('; ');
}
