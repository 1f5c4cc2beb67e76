import { describe, expect, it } from 'vitest';
import { contentSecurityPolicy } from '@/lib/security/content-security-policy';

describe('the content security policy', () => {
  const policy = contentSecurityPolicy('abc123', false);

  // OWASP ASVS 5.0 V3.4.3: at least object-src and base-uri none, and an allow-list or nonces.
  it.each([
    "script-src 'self' 'nonce-abc123' 'strict-dynamic'",
    "object-src 'none'",
    "base-uri 'none'",
    "frame-ancestors 'none'",
    "form-action 'self'",
    "connect-src 'self'",
  ])('has %s', (directive) => {
    expect(policy.split('; ')).toContain(directive);
  });

  it('lets no script be evaluated or written inline in production', () => {
    const scripts = policy.split('; ').find((directive) => directive.startsWith('script-src'));
    expect(scripts).not.toMatch(/unsafe/);
    expect(policy).not.toContain('http:');
  });
});
