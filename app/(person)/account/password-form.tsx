'use client';

import { signOut } from 'next-auth/react';
import { SimpleForm } from '@/components/forms/simple-form';
import { paths } from '@/lib/paths';
import { changePasswordAction } from './actions';
import { proofFields } from './proof-fields';

/** A new password ends every session, this one too. */
export function PasswordForm({ hasSecondFactor }: { hasSecondFactor: boolean }) {
  return (
    <>
      <p className="mt-2 max-w-sm text-ink-soft">
        Changing it signs you out everywhere; you then sign in with the new one.
      </p>
      <SimpleForm
        fields={[
          ...proofFields(hasSecondFactor, 'Present password'),
          {
            name: 'next',
            label: 'New password',
            type: 'password',
            autoComplete: 'new-password',
            hint: 'At least 12 characters; three or four words do well',
          },
        ]}
        submit={async ({ password = '', code = '', next = '' }) => {
          const answer = await changePasswordAction({ password, code, next });
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
