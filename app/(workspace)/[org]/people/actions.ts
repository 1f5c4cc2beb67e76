'use server';

import { memberAction } from '@/lib/auth/member-action';
import { invite, revokeInvitation } from '@/lib/people/invite';
import {
  invitationIdInput,
  invitationInput,
  memberChangeInput,
  memberIdInput,
} from '@/lib/people/member-schema';
import { changeMember, removeMember, signOutMember } from '@/lib/people/members';

export const inviteAction = memberAction('member.write', invitationInput, invite);

export const revokeInvitationAction = memberAction(
  'member.write',
  invitationIdInput,
  (actor, { invitationId }) => revokeInvitation(actor, invitationId),
);

export const changeMemberAction = memberAction('member.write', memberChangeInput, changeMember);

export const removeMemberAction = memberAction(
  'member.write',
  memberIdInput,
  (actor, { personId }) => removeMember(actor, personId),
);

export const signOutMemberAction = memberAction(
  'member.write',
  memberIdInput,
  (actor, { personId }) => signOutMember(actor, personId),
);
