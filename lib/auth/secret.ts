import { createHash, randomBytes } from 'node:crypto';

const SECRET_BYTES = 32;

/** 256 random bits as text that survives links and headers. */
export const newSecret = (): string => randomBytes(SECRET_BYTES).toString('base64url');

/** What is kept of a secret. It has 256 random bits, so a plain SHA-256 cannot be turned back (OWASP ASVS V11.4). */
export const hashOfSecret = (secret: string): string =>
  createHash('sha256').update(secret).digest('hex');
