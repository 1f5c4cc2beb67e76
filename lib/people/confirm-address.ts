import { updatePerson } from '@/db/queries/people';
import { systemClock, type Clock } from '@/lib/clock';
import { spendLink } from './one-time-link';

/** Opens the account whose letter this secret came with. */
export const confirmAddress = (secret: string, clock: Clock = systemClock): Promise<void> =>
  spendLink(secret, 'verify-email', clock, (db, personId) =>
    updatePerson(db, personId, { emailVerifiedAt: clock() }),
  );
