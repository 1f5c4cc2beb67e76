import { createCipheriv, createDecipheriv, hkdfSync, randomBytes } from 'node:crypto';
import { env } from '@/lib/env';

const IV_BYTES = 12;
const TAG_BYTES = 16;
const PURPOSE = 'marlwick second factor';

/** A key of its own from the session secret, so that neither use weakens the other (RFC 5869). */
function key(): Buffer {
  const secret = env().NEXTAUTH_SECRET;
  if (secret === undefined) throw new Error('NEXTAUTH_SECRET is needed to keep second factors.');
  return Buffer.from(hkdfSync('sha256', secret, '', PURPOSE, 32));
}

/** AES-256-GCM; the text cannot be read or changed without the key. */
export function encrypt(text: string): string {
  const iv = randomBytes(IV_BYTES);
  const cipher = createCipheriv('aes-256-gcm', key(), iv);
  const sealed = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()]);
  return Buffer.concat([iv, cipher.getAuthTag(), sealed]).toString('base64');
}

/** Throws when the text was changed, or made under another key. */
export function decrypt(encrypted: string): string {
  const bytes = Buffer.from(encrypted, 'base64');
  const decipher = createDecipheriv('aes-256-gcm', key(), bytes.subarray(0, IV_BYTES));
  decipher.setAuthTag(bytes.subarray(IV_BYTES, IV_BYTES + TAG_BYTES));
  return Buffer.concat([
    decipher.update(bytes.subarray(IV_BYTES + TAG_BYTES)),
    decipher.final(),
  ]).toString('utf8');
}
