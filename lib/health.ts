import { database } from '@/db/client';
import { logger } from './logger';

/** True when the database answers a bare question. */
export async function pingDatabase(): Promise<boolean> {
  try {
    await database().raw('select 1');
    return true;
  } catch (error) {
    logger.error({ err: error }, 'the database does not answer');
    return false;
  }
}
