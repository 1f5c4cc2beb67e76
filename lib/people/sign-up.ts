import type { z } from 'zod';
import { putMember } from '@/db/queries/members';
import { insertOrganisation } from '@/db/queries/organisations';
import { findPersonByEmail, insertPerson } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { recordChange } from '@/lib/audit/record-change';
import { takeTry } from '@/lib/auth/limits';
import { hashPassword } from '@/lib/auth/passwords';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { sendConfirmAddress, sendKnownAddress } from '@/lib/mail/account-letters';
import { isFreeSlug, slugsFor } from '@/lib/organisations/slug';
import { newLink } from './one-time-link';
import type { signUpInput } from './schema';

const TWO_DAYS_MS = 48 * 3_600_000;

/**
 * Opens an account with an organisation of its own, shut until the address is confirmed. Says the same, after the same
 * work, whether the address is new or known; a known one gets a letter that says so.
 */
export async function signUp(
  { email, name, password, organisationName }: z.output<typeof signUpInput>,
  clock: Clock = systemClock,
): Promise<void> {
  await takeTry('sign-up', email);
  const passwordHash = await hashPassword(password);
  const personId = newId('person');
  const known = await inContext({ signInEmail: email }, (db) => findPersonByEmail(db, email));
  if (known !== undefined) {
    await sendKnownAddress(known.email, known.name);
    return;
  }
  const organisation = { id: newId('organisation'), name: organisationName };
  const link = newLink(personId, 'verify-email', clock, TWO_DAYS_MS);
  const isNew = await inContext({ organisationId: organisation.id, personId }, async (db) => {
    const inserted = await insertPerson(db, {
      id: personId,
      email,
      name,
      passwordHash,
      emailVerifiedAt: null,
    });
    if (!inserted) return false;
    let slug = '';
    for (const candidate of slugsFor(organisationName)) {
      if (!isFreeSlug(candidate)) continue;
      if (!(await insertOrganisation(db, { ...organisation, slug: candidate }))) continue;
      slug = candidate;
      break;
    }
    if (slug === '') throw new AppError('conflict', 'Choose another name for the organisation.');
    await putMember(db, organisation.id, personId, { role: 'owner', plantIds: null });
    await link.keep(db);
    await recordChange(
      db,
      {
        personId,
        personName: name,
        role: 'owner',
        organisation: { ...organisation, slug, isDemo: false },
        plantIds: null,
        token: null,
      },
      {
        action: 'organisation.made',
        subjectId: organisation.id,
        detail: { name: organisationName, slug },
      },
      clock,
    );
    return true;
  });
  // Someone signed up with the same address in the same moment: that one's letter is on its way.
  if (isNew) await sendConfirmAddress(email, name, link.secret);
}
