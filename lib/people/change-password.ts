import { raiseSessionEpoch, updatePerson, type AccountPerson } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { hashPassword } from '@/lib/auth/passwords';
import { sendPasswordChanged } from '@/lib/mail/account-letters';
import { requirePassword } from './require-password';

/** Changes one's own password; every session ends, this one too. */
export async function changePassword(
  person: AccountPerson,
  present: string,
  next: string,
): Promise<void> {
  await requirePassword(person, present);
  const passwordHash = await hashPassword(next);
  await inContext({ personId: person.id }, async (db) => {
    await updatePerson(db, person.id, { passwordHash });
    await raiseSessionEpoch(db, person.id);
  });
  await sendPasswordChanged(person.email, person.name);
}
