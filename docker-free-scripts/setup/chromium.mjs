import { existsSync } from 'node:fs';
import { installDebianPackages } from './debian-packages.mjs';

export const CHROMIUM = '/usr/bin/chromium';

/** The browser tests drive Debian's own Chromium. */
export async function ensureChromium() {
  if (existsSync(CHROMIUM)) return;
  await installDebianPackages(['chromium', 'fonts-dejavu-core'], 'Chromium');
}
