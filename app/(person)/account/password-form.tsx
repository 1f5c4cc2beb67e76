'use client';

import { signOut } from 'next-auth/react';
import { SimpleForm } from '@/components/forms/simple-form';
import { paths } from '@/lib/paths';
import { changePasswordAction } from './actions';

/** A new password ends every session, this one too. */
export function PasswordForm() {
  return (
    <>
      <p className="mt-2 max-w-sm text-ink-soft">
        Changing it signs you out everywhere; you then sign in with the new one.
      </p>
      <SimpleForm
        fields={[
          {
            name: 'present',
            label: 'Present password',
            type: 'password',
            autoComplete: 'current-password',
          },
          {
            name: 'next',
            label: 'New password',
            type: 'password',
            autoComplete: 'new-password',
            hint: 'At least 12 characters; three or four words do well',
          },
        ]}
        submit={async ({ present = '', next = '' }) => {
          const answer = await changePasswordAction({ present, next });
          if (answer.ok) await signOut({ callbackUrl: paths.signIn });
          return answer;
        }}
        label="Change the password"
        busyLabel="Changing…"
        failure="Not changed"
      />
    </>
  );
}
