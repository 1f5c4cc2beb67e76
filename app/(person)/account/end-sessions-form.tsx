'use client';

import { signOut } from 'next-auth/react';
import { SimpleForm } from '@/components/forms/simple-form';
import { paths } from '@/lib/paths';
import { endAllSessionsAction } from './actions';

export function EndSessionsForm() {
  return (
    <>
      <p className="mt-2 max-w-sm text-ink-soft">
        A lost tablet, a shared computer: this signs you out of every browser at its next click.
      </p>
      <SimpleForm
        fields={[
          {
            name: 'password',
            label: 'Password, to be sure it is you',
            type: 'password',
            autoComplete: 'current-password',
          },
        ]}
        submit={async ({ password = '' }) => {
          const answer = await endAllSessionsAction({ password });
          if (answer.ok) await signOut({ callbackUrl: paths.signIn });
          return answer;
        }}
        label="Sign out everywhere"
        busyLabel="Signing out…"
        failure="Not signed out"
      />
    </>
  );
}
