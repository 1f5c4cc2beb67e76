import { findPersonByEmail } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { takeTry } from '@/lib/auth/limits';
import { systemClock, type Clock } from '@/lib/clock';
import { sendNewPassword } from '@/lib/mail/account-letters';
import { newLink } from './one-time-link';

const HOUR_MS = 3_600_000;

/**
 * Sends a link to a new password, if the address has an account; says the same if not. Throws `tooMany` after the third
 * in an hour, known or unknown alike.
 */
export async function askNewPassword(email: string, clock: Clock = systemClock): Promise<void> {
  await takeTry('reset', email);
  const person = await inContext({ signInEmail: email }, (db) => findPersonByEmail(db, email));
  if (person === undefined) return;
  const link = newLink(person.id, 'reset-password', clock, HOUR_MS);
  await inContext({ personId: person.id }, (db) => link.keep(db));
  // Not awaited by the answer: the time a mail server takes must not tell that there was someone to write to.
  void sendNewPassword(person.email, person.name, link.secret);
}
