import { updatePerson, type AccountPerson } from '@/db/queries/people';
import { endSessions } from '@/db/queries/sessions';
import { inContext } from '@/db/tenant';
import { systemClock } from '@/lib/clock';
import { hashPassword } from '@/lib/auth/passwords';
import { logger } from '@/lib/logger';
import { sendPasswordChanged } from '@/lib/mail/account-letters';
import { requireProof, type Proof } from './require-proof';

/** Changes one's own password; every session ends, this one too. */
export async function changePassword(
  person: AccountPerson,
  present: Proof,
  next: string,
): Promise<void> {
  await requireProof(person, present);
  const passwordHash = await hashPassword(next);
  await inContext({ personId: person.id }, async (db) => {
    await updatePerson(db, person.id, { passwordHash });
    await endSessions(db, person.id, systemClock());
  });
  logger.info({ event: 'password-changed', personId: person.id }, 'a password was changed');
  await sendPasswordChanged(person.email, person.name);
}
