import {
  endMembership,
  listMembers,
  lockMember,
  lockOwners,
  putMember,
  type Member,
} from '@/db/queries/members';
import { listOpenInvitations, type KeptInvitation } from '@/db/queries/invitations';
import { endAllSessions } from '@/lib/auth/sessions';
import { recordChange } from '@/lib/audit/record-change';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import type { Role } from '@/lib/auth/permissions';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError, notFound } from '@/lib/errors';
import { checkPlantIds } from './plant-ids';

/** Who belongs to the actor's organisation, and who is invited. */
export const readPeople = (
  actor: Actor,
): Promise<{
  members: Member[];
  invitations: (KeptInvitation & { invitedByName: string })[];
}> =>
  inTenant(actor, async (db) => ({
    members: await listMembers(db, actor.organisation.id),
    invitations: await listOpenInvitations(db, actor.organisation.id),
  }));

export interface MemberChange {
  readonly personId: string;
  readonly role: Role;
  readonly plantIds: readonly string[] | null;
}

/**
 * Gives a member another role or other plants, in force at their next request. Only an owner makes or unmakes owners,
 * and one owner always remains.
 */
export async function changeMember(
  actor: Actor,
  change: MemberChange,
  clock: Clock = systemClock,
): Promise<void> {
  await inTenant(actor, async (db) => {
    const owners = await lockOwners(db, actor.organisation.id);
    const before = await memberOrThrow(db, actor, change.personId);
    guardOwners(actor, owners, change.personId, before.role, change.role);
    await checkPlantIds(db, actor, change.plantIds);
    const after = { role: change.role, plantIds: change.plantIds ? [...change.plantIds] : null };
    await putMember(db, actor.organisation.id, change.personId, after);
    await recordChange(
      db,
      actor,
      { action: 'member.changed', subjectId: change.personId, detail: { before, after } },
      clock,
    );
  });
}

/** Takes a member out, in force at their next request; what they wrote stays under their name. */
export async function removeMember(
  actor: Actor,
  personId: string,
  clock: Clock = systemClock,
): Promise<void> {
  await inTenant(actor, async (db) => {
    const owners = await lockOwners(db, actor.organisation.id);
    const { role } = await memberOrThrow(db, actor, personId);
    guardOwners(actor, owners, personId, role, null);
    await endMembership(db, actor.organisation.id, personId, clock());
    await recordChange(
      db,
      actor,
      { action: 'member.removed', subjectId: personId, detail: { role } },
      clock,
    );
  });
}

/** Ends every session of a member, here and wherever else they belong: for a lost tablet or a stolen password. */
export async function signOutMember(
  actor: Actor,
  personId: string,
  clock: Clock = systemClock,
): Promise<void> {
  await inTenant(actor, async (db) => {
    const owners = await lockOwners(db, actor.organisation.id);
    const { role } = await memberOrThrow(db, actor, personId);
    guardOwners(actor, owners, personId, role, role);
    await recordChange(
      db,
      actor,
      { action: 'member.signed-out', subjectId: personId, detail: { role } },
      clock,
    );
  });
  await endAllSessions(personId, clock);
}

async function memberOrThrow(
  db: Parameters<typeof lockMember>[0],
  actor: Actor,
  personId: string,
): Promise<Pick<Member, 'role' | 'plantIds'>> {
  const held = await lockMember(db, actor.organisation.id, personId);
  const listed = await listMembers(db, actor.organisation.id);
  const member = listed.find((candidate) => candidate.personId === personId);
  if (held === undefined || member === undefined) throw notFound('person');
  return { role: member.role, plantIds: member.plantIds };
}

function guardOwners(
  actor: Actor,
  owners: readonly string[],
  personId: string,
  before: Role,
  after: Role | null,
): void {
  if ((before === 'owner' || after === 'owner') && actor.role !== 'owner') {
    throw new AppError('forbidden', 'Only an owner makes or unmakes an owner.');
  }
  const leaves = before === 'owner' && after !== 'owner';
  if (leaves && owners.every((id) => id === personId)) {
    throw new AppError(
      'conflict',
      'An organisation needs an owner: make someone else owner first.',
    );
  }
}
