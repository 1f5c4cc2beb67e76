import { findPersonById, updatePerson } from '@/db/queries/people';
import { endSessions } from '@/db/queries/sessions';
import { forgetTriesOf } from '@/lib/auth/limits';
import { hashPassword } from '@/lib/auth/passwords';
import { systemClock, type Clock } from '@/lib/clock';
import { logger } from '@/lib/logger';
import { sendPasswordChanged } from '@/lib/mail/account-letters';
import { spendLink } from './one-time-link';

/** A new password by an e-mailed link: ends every session, and proves the address. The second factor stays on. */
export async function setNewPassword(
  secret: string,
  password: string,
  clock: Clock = systemClock,
): Promise<void> {
  const passwordHash = await hashPassword(password);
  const person = await spendLink(secret, 'reset-password', clock, async (db, personId) => {
    const found = await findPersonById(db, personId);
    await updatePerson(db, personId, {
      passwordHash,
      ...(found?.emailVerifiedAt === null ? { emailVerifiedAt: clock() } : {}),
    });
    await endSessions(db, personId, clock());
    return found;
  });
  if (person === undefined) return;
  logger.info({ event: 'password-changed', personId: person.id }, 'a password was replaced');
  await forgetTriesOf('sign-in', person.email);
  await sendPasswordChanged(person.email, person.name);
}
