import { closeInvitation, insertInvitation, listOpenInvitations } from '@/db/queries/invitations';
import { listMembers } from '@/db/queries/members';
import { recordChange } from '@/lib/audit/record-change';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { takeTry } from '@/lib/auth/limits';
import type { Role } from '@/lib/auth/permissions';
import { hashOfSecret, newSecret } from '@/lib/auth/secret';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { sendInvitation } from '@/lib/mail/account-letters';
import { checkPlantIds } from './plant-ids';

const SEVEN_DAYS_MS = 7 * 24 * 3_600_000;

export interface InvitationInput {
  readonly email: string;
  readonly role: Role;
  readonly plantIds: readonly string[] | null;
}

/**
 * Invites someone by letter: a role, all plants or named ones, seven days, one use. Only an owner invites an owner.
 * Says whether the letter went out; the invitation stands either way.
 */
export async function invite(
  actor: Actor,
  { email, role, plantIds }: InvitationInput,
  clock: Clock = systemClock,
): Promise<{ invitationId: string; isSent: boolean }> {
  if (role === 'owner' && actor.role !== 'owner') {
    throw new AppError('forbidden', 'Only an owner invites an owner.');
  }
  await takeTry('invitation', actor.organisation.id);
  const secret = newSecret();
  const id = newId('invitation');
  const organisationId = actor.organisation.id;
  await inTenant(actor, async (db) => {
    await checkPlantIds(db, actor, plantIds);
    const members = await listMembers(db, organisationId);
    if (members.some((member) => member.email === email)) {
      throw new AppError('conflict', `${email} belongs to ${actor.organisation.name} already.`);
    }
    // A second invitation to the same address replaces the first.
    for (const open of await listOpenInvitations(db, organisationId)) {
      if (open.email === email) {
        await closeInvitation(db, organisationId, open.id, 'revoked', clock());
      }
    }
    await insertInvitation(db, {
      id,
      organisationId,
      email,
      role,
      plantIds: plantIds === null ? null : [...plantIds],
      tokenHash: hashOfSecret(secret),
      invitedBy: actor.personId,
      expiresAt: new Date(clock().getTime() + SEVEN_DAYS_MS),
    });
    const detail = { email, role, plantIds: plantIds === null ? null : [...plantIds] };
    await recordChange(db, actor, { action: 'member.invited', subjectId: id, detail }, clock);
  });
  const isSent = await sendInvitation(email, {
    organisationName: actor.organisation.name,
    invitedBy: actor.personName,
    role,
    secret,
  });
  return { invitationId: id, isSent };
}

/** Ends an invitation that was not accepted yet. */
export async function revokeInvitation(
  actor: Actor,
  invitationId: string,
  clock: Clock = systemClock,
): Promise<void> {
  const organisationId = actor.organisation.id;
  await inTenant(actor, async (db) => {
    const open = await listOpenInvitations(db, organisationId);
    const email = open.find(({ id }) => id === invitationId)?.email;
    if (
      email === undefined ||
      !(await closeInvitation(db, organisationId, invitationId, 'revoked', clock()))
    ) {
      throw notFound('open invitation');
    }
    await recordChange(
      db,
      actor,
      { action: 'invitation.revoked', subjectId: invitationId, detail: { email } },
      clock,
    );
  });
}
