import { createHash } from 'node:crypto';
import { fileURLToPath } from 'node:url';
import { join } from 'node:path';

/** The project's own folder. */
export const PROJECT = fileURLToPath(new URL('../..', import.meta.url)).replace(/\/$/, '');

/** Everything the scripts keep: git-ignored, safe to delete when nothing runs. */
export const STATE = join(PROJECT, '.marlwick');
export const LOGS = join(STATE, 'log');

/** Where PostgreSQL's own user may always go, for a project in a folder that it may not enter. */
export const OUTSIDE_STATE = join(
  '/var/lib/marlwick',
  createHash('sha256').update(PROJECT).digest('hex').slice(0, 16),
);
