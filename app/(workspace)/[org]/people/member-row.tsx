'use client';

import { useState } from 'react';
import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import type { Role } from '@/lib/auth/permissions';
import { changeMemberAction, removeMemberAction, signOutMemberAction } from './actions';
import { RoleAndPlantsFields, type RoleAndPlants } from './role-and-plants';

export interface ShownMember {
  readonly personId: string;
  readonly name: string;
  readonly email: string;
  readonly role: Role;
  readonly plantIds: readonly string[] | null;
  readonly hasSecondFactor: boolean;
  readonly since: string;
}

/** One person; changing opens beneath the line, removing asks once more. */
export function MemberRow({
  organisationSlug,
  member,
  plants,
  isSelf,
  mayOwn,
}: {
  organisationSlug: string;
  member: ShownMember;
  plants: readonly { readonly id: string; readonly name: string }[];
  isSelf: boolean;
  mayOwn: boolean;
}) {
  const { personId, name, email, role, plantIds, hasSecondFactor, since } = member;
  const { run, problem, isBusy } = useAction();
  const [opened, setOpened] = useState<'change' | 'remove'>();
  const [next, setNext] = useState<RoleAndPlants>({ role, plantIds });
  const mayChange = mayOwn || role !== 'owner';
  const reach =
    plantIds === null
      ? 'all plants'
      : plants
          .filter(({ id }) => plantIds.includes(id))
          .map((plant) => plant.name)
          .join(', ');

  const open = (what: 'change' | 'remove') => {
    setNext({ role, plantIds });
    setOpened(opened === what ? undefined : what);
  };

  return (
    <li className="border-b border-rule py-3 last:border-b-0">
      <div className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2">
        <p className="min-w-0 break-words">
          <strong>{name}</strong>
          {isSelf ? ' (you)' : ''}
          <span className="block text-sm text-ink-soft">
            {email}
            <br />
            {role}, {reach}; since {since}; second factor {hasSecondFactor ? 'on' : 'off'}
          </span>
        </p>
        {mayChange ? (
          <div className="flex gap-2">
            <Button aria-expanded={opened === 'change'} onClick={() => open('change')}>
              Change<span className="sr-only"> {name}</span>
            </Button>
            <Button
              shape="quiet"
              aria-expanded={opened === 'remove'}
              onClick={() => open('remove')}
            >
              Remove<span className="sr-only"> {name}</span>
            </Button>
          </div>
        ) : null}
      </div>
      {problem === undefined ? null : (
        <div className="mt-2">
          <Notice tone="act" title="Not changed" role="alert">
            {problem}
          </Notice>
        </div>
      )}
      {opened === 'change' ? (
        <div className="mt-3 grid max-w-md gap-4 pb-2">
          <RoleAndPlantsFields value={next} onChange={setNext} plants={plants} mayOwn={mayOwn} />
          <div className="flex gap-3">
            <Button
              shape="main"
              disabled={isBusy}
              onClick={() =>
                run(
                  () =>
                    changeMemberAction(organisationSlug, {
                      personId,
                      role: next.role,
                      plantIds: next.plantIds === null ? null : [...next.plantIds],
                    }),
                  () => setOpened(undefined),
                )
              }
            >
              Keep the change
            </Button>
            <Button onClick={() => setOpened(undefined)}>Leave it</Button>
          </div>
          {isSelf ? null : (
            <p className="border-t border-rule pt-3 text-sm">
              A lost tablet?{' '}
              <Button
                disabled={isBusy}
                onClick={() =>
                  run(
                    () => signOutMemberAction(organisationSlug, { personId }),
                    () => setOpened(undefined),
                  )
                }
              >
                Sign {name} out everywhere
              </Button>
            </p>
          )}
        </div>
      ) : null}
      {opened === 'remove' ? (
        <div className="mt-3 pb-2">
          <p>
            {isSelf ? 'You' : name} will be out at the next click. What {isSelf ? 'you' : 'they'}{' '}
            wrote stays under the name.
          </p>
          <div className="mt-2 flex gap-3">
            <Button
              shape="main"
              disabled={isBusy}
              onClick={() => run(() => removeMemberAction(organisationSlug, { personId }))}
            >
              Remove {isSelf ? 'me' : name}
            </Button>
            <Button onClick={() => setOpened(undefined)}>Leave it</Button>
          </div>
        </div>
      ) : null}
    </li>
  );
}
