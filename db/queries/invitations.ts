import type { Database } from '../client';
import type { InvitationRow, PersonRow } from '../tables/rows';

export interface KeptInvitation {
  id: string;
  organisationId: string;
  email: string;
  role: InvitationRow['role'];
  plantIds: string[] | null;
  invitedBy: string;
  createdAt: Date;
  expiresAt: Date;
}

const toInvitation = (row: InvitationRow): KeptInvitation => ({
  id: row.id,
  organisationId: row.organisation_id,
  email: row.email,
  role: row.role,
  plantIds: row.plant_ids,
  invitedBy: row.invited_by,
  createdAt: row.created_at,
  expiresAt: row.expires_at,
});

export async function insertInvitation(
  db: Database,
  invitation: Omit<KeptInvitation, 'createdAt'> & { tokenHash: string },
): Promise<void> {
  await db<InvitationRow>('invitations').insert({
    id: invitation.id,
    organisation_id: invitation.organisationId,
    email: invitation.email,
    role: invitation.role,
    plant_ids: invitation.plantIds,
    token_hash: invitation.tokenHash,
    invited_by: invitation.invitedBy,
    expires_at: invitation.expiresAt,
  });
}

/** The open invitation that a link belongs to; call in the token's own context. */
export async function findInvitation(
  db: Database,
  tokenHash: string,
  now: Date,
): Promise<KeptInvitation | undefined> {
  const row = await db<InvitationRow>('invitations')
    .where({ token_hash: tokenHash, accepted_at: null, revoked_at: null })
    .where('expires_at', '>', now)
    .first();
  return row && toInvitation(row);
}

/** Closes an open invitation; false when it was accepted, revoked or expired before. */
export async function closeInvitation(
  db: Database,
  organisationId: string,
  id: string,
  how: 'accepted' | 'revoked',
  now: Date,
): Promise<boolean> {
  const query = db<InvitationRow>('invitations').where({
    organisation_id: organisationId,
    id,
    accepted_at: null,
    revoked_at: null,
  });
  const closed =
    how === 'accepted'
      ? await query.where('expires_at', '>', now).update({ accepted_at: now })
      : await query.update({ revoked_at: now });
  return closed === 1;
}

/** Invitations neither accepted nor revoked, newest first; expired ones too, until they are revoked. */
export async function listOpenInvitations(
  db: Database,
  organisationId: string,
): Promise<(KeptInvitation & { invitedByName: string })[]> {
  const rows = await db<InvitationRow>('invitations')
    .leftJoin<PersonRow>('people', 'people.id', 'invitations.invited_by')
    .where({ organisation_id: organisationId, accepted_at: null, revoked_at: null })
    .orderBy('invitations.created_at', 'desc')
    .select<(InvitationRow & { person_name: string | null })[]>(
      'invitations.*',
      'people.name as person_name',
    );
  return rows.map((row) => ({ ...toInvitation(row), invitedByName: row.person_name ?? '' }));
}
