import { raiseSessionEpoch } from '@/db/queries/people';
import { inContext } from '@/db/tenant';

/** Signs a person out everywhere, at the next request of each session. */
export async function endAllSessions(personId: string): Promise<void> {
  await inContext({ personId }, (db) => raiseSessionEpoch(db, personId));
}
