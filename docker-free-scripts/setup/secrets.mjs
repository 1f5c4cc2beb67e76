import { randomBytes } from 'node:crypto';
import { existsSync, mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { STATE } from './places.mjs';

/**
 * @typedef {{ sessionSecret: string, ownerPassword: string, appPassword: string }} Secrets
 */

/** Made once, kept readable for this user only. */
export function ensureSecrets() {
  const path = join(STATE, 'secrets.json');
  /** @type {Partial<Secrets>} */
  const kept = existsSync(path) ? JSON.parse(readFileSync(path, 'utf8')) : {};
  /** @type {Secrets} */
  const secrets = {
    sessionSecret: kept.sessionSecret ?? randomBytes(32).toString('hex'),
    ownerPassword: kept.ownerPassword ?? randomBytes(24).toString('hex'),
    appPassword: kept.appPassword ?? randomBytes(24).toString('hex'),
  };
  mkdirSync(STATE, { recursive: true });
  writeFileSync(path, `${JSON.stringify(secrets, null, 2)}\n`, { mode: 0o600 });
  return secrets;
}
