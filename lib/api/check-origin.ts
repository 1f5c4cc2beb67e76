import { env } from '@/lib/env';
import { AppError } from '@/lib/errors';
import { logger } from '@/lib/logger';

/**
 * A browser's cookie goes with requests that other sites make: one that changes something must come from a page of our
 * own (OWASP ASVS V3.5.1). Tokens are sent by hand and need no such proof. Throws `forbidden`.
 */
export function checkOrigin(request: Request): void {
  const origin = request.headers.get('origin');
  if (origin !== null && origin === new URL(env().NEXTAUTH_URL).origin) return;
  logger.warn({ event: 'foreign-origin' }, 'a change was asked for from another site');
  throw new AppError('forbidden', 'This request did not come from a page of Marlwick.');
}
