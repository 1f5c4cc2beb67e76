'use client';

import { useState } from 'react';
import { TextField } from '@/components/forms/text-field';
import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { inviteAction } from './actions';
import { RoleAndPlantsFields, type RoleAndPlants } from './role-and-plants';

const USUAL: RoleAndPlants = { role: 'operator', plantIds: null };

export function InviteForm({
  organisationSlug,
  plants,
  mayOwn,
}: {
  organisationSlug: string;
  plants: readonly { readonly id: string; readonly name: string }[];
  mayOwn: boolean;
}) {
  const { run, problem, isBusy } = useAction();
  const [email, setEmail] = useState('');
  const [chosen, setChosen] = useState(USUAL);
  const [said, setSaid] = useState<string>();

  const send = () =>
    run(
      () =>
        inviteAction(organisationSlug, {
          email,
          role: chosen.role,
          plantIds: chosen.plantIds === null ? null : [...chosen.plantIds],
        }),
      ({ isSent }) => {
        setSaid(
          isSent
            ? `A letter went to ${email}.`
            : `The invitation of ${email} stands, but no mail server took the letter. Revoke it and try later.`,
        );
        setEmail('');
        setChosen(USUAL);
      },
    );

  return (
    <form
      className="mt-3 grid max-w-md gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setSaid(undefined);
        send();
      }}
    >
      <TextField
        label="E-mail"
        type="email"
        autoComplete="off"
        value={email}
        onChange={({ target }) => setEmail(target.value)}
      />
      <RoleAndPlantsFields value={chosen} onChange={setChosen} plants={plants} mayOwn={mayOwn} />
      {problem === undefined ? null : (
        <Notice tone="act" title="Not invited" role="alert">
          {problem}
        </Notice>
      )}
      {said === undefined ? null : (
        <Notice tone="calm" title="Invited" role="status">
          {said}
        </Notice>
      )}
      <div>
        <Button type="submit" shape="main" disabled={isBusy}>
          {isBusy ? 'Inviting…' : 'Send the invitation'}
        </Button>
      </div>
    </form>
  );
}
