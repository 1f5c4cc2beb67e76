'use client';

import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { revokeInvitationAction } from './actions';

/** Invitations that nobody has accepted yet. */
export function InvitationList({
  organisationSlug,
  invitations,
}: {
  organisationSlug: string;
  invitations: readonly {
    readonly id: string;
    readonly email: string;
    readonly role: string;
    readonly invitedByName: string;
    readonly until: string;
  }[];
}) {
  const { run, problem, isBusy } = useAction();
  return (
    <>
      <h3 className="mt-8 text-lg">Not accepted yet</h3>
      {problem === undefined ? null : (
        <Notice tone="act" title="Not revoked" role="alert">
          {problem}
        </Notice>
      )}
      <ul className="mt-2 border-y border-rule-strong">
        {invitations.map(({ id, email, role, invitedByName, until }) => (
          <li
            key={id}
            className="flex flex-wrap items-center justify-between gap-x-4 border-b border-rule py-2 last:border-b-0"
          >
            <p className="min-w-0 break-words">
              {email}, {role}
              <span className="block text-sm text-ink-soft">
                by {invitedByName}, until {until}
              </span>
            </p>
            <Button
              disabled={isBusy}
              onClick={() =>
                run(() => revokeInvitationAction(organisationSlug, { invitationId: id }))
              }
            >
              Revoke<span className="sr-only"> the invitation of {email}</span>
            </Button>
          </li>
        ))}
      </ul>
    </>
  );
}
