import type { z } from 'zod';
import { closeInvitation, findInvitation, type KeptInvitation } from '@/db/queries/invitations';
import { putMember } from '@/db/queries/members';
import { findOrganisation } from '@/db/queries/organisations';
import { findPersonByEmail, insertPerson, type AccountPerson } from '@/db/queries/people';
import { inContext } from '@/db/tenant';
import { recordChange } from '@/lib/audit/record-change';
import { hashPassword } from '@/lib/auth/passwords';
import { hashOfSecret } from '@/lib/auth/secret';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import type { Organisation } from '@/lib/organisations/schema';
import type { acceptInvitationInput } from './schema';

const SPENT =
  'This invitation does not work any more: it was used, revoked or is older than seven days. Ask for another.';

interface OpenInvitation {
  readonly invitation: KeptInvitation;
  readonly organisation: Organisation;
  /** The account of the invited address, if it has one. */
  readonly person: AccountPerson | undefined;
}

async function openInvitation(secret: string, clock: Clock): Promise<OpenInvitation> {
  const tokenHash = hashOfSecret(secret);
  const invitation = await inContext({ tokenHash }, (db) => findInvitation(db, tokenHash, clock()));
  if (invitation === undefined) throw new AppError('notFound', SPENT);
  const { organisationId, email } = invitation;
  return inContext({ organisationId, signInEmail: email }, async (db) => {
    const organisation = await findOrganisation(db, organisationId);
    if (organisation === undefined) throw new AppError('notFound', SPENT);
    return { invitation, organisation, person: await findPersonByEmail(db, email) };
  });
}

export interface InvitationWords {
  readonly organisationName: string;
  readonly email: string;
  readonly role: string;
  readonly allPlants: boolean;
  /** Whoever holds the letter may know: it went to that address. */
  readonly hasAccount: boolean;
}

/** What an invitation says, to whoever holds its letter. Throws `notFound` for one that is spent. */
export async function readInvitation(
  secret: string,
  clock: Clock = systemClock,
): Promise<InvitationWords> {
  const { invitation, organisation, person } = await openInvitation(secret, clock);
  return {
    organisationName: organisation.name,
    email: invitation.email,
    role: invitation.role,
    allPlants: invitation.plantIds === null,
    hasAccount: person !== undefined,
  };
}

/**
 * Accepts an invitation, once. The signed-in person joins if the invitation went to their address; an address without an
 * account gets one, confirmed by the letter itself.
 */
export async function acceptInvitation(
  signedIn: Pick<AccountPerson, 'id'> | null,
  { secret, account }: z.output<typeof acceptInvitationInput>,
  clock: Clock = systemClock,
): Promise<{ organisationSlug: string }> {
  const open = await openInvitation(secret, clock);
  const { invitation, organisation } = open;
  if (open.person !== undefined && open.person.id !== signedIn?.id) {
    throw new AppError(
      'forbidden',
      `Sign in as ${invitation.email} first, then open the link again.`,
    );
  }
  if (open.person === undefined && account === null) {
    throw new AppError('badInput', 'Write your name and choose a password.');
  }
  const passwordHash = account === null ? null : await hashPassword(account.password);
  const person = open.person ?? { id: newId('person'), name: account?.name ?? '' };
  const context = { organisationId: organisation.id, personId: person.id };
  await inContext(context, async (db) => {
    if (!(await closeInvitation(db, organisation.id, invitation.id, 'accepted', clock()))) {
      throw new AppError('notFound', SPENT);
    }
    if (open.person === undefined) {
      const inserted = await insertPerson(db, {
        id: person.id,
        email: invitation.email,
        name: person.name,
        passwordHash,
        emailVerifiedAt: clock(),
      });
      if (!inserted) throw new AppError('conflict', 'This address has an account by now. Sign in.');
    }
    const { role, plantIds } = invitation;
    await putMember(db, organisation.id, person.id, { role, plantIds });
    await recordChange(
      db,
      { personId: person.id, personName: person.name, role, organisation, plantIds, token: null },
      { action: 'member.joined', subjectId: person.id, detail: { role, plantIds } },
      clock,
    );
  });
  return { organisationSlug: organisation.slug };
}
