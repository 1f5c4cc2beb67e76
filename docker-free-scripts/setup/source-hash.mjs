import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { PROJECT } from './places.mjs';

const BUILT_FROM = [
  'app',
  'components',
  'lib',
  'db',
  'public',
  'next.config.ts',
  'postcss.config.mjs',
  'proxy.ts',
  'tailwind.config.ts',
  'tsconfig.json',
  'package-lock.json',
];

/**
 * One hash over everything a build is made of: names and contents.
 * @param {string} [root]
 */
export function sourceHash(root = PROJECT) {
  const hash = createHash('sha256');
  for (const entry of BUILT_FROM) addTo(hash, root, entry);
  return hash.digest('hex');
}

/**
 * @param {import('node:crypto').Hash} hash
 * @param {string} root
 * @param {string} path
 */
function addTo(hash, root, path) {
  const full = join(root, path);
  if (!existsSync(full)) return;
  if (statSync(full).isDirectory()) {
    for (const name of readdirSync(full).sort()) addTo(hash, root, join(path, name));
    return;
  }
  hash.update(path).update('\0').update(readFileSync(full)).update('\0');
}
