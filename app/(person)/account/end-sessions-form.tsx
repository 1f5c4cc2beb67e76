'use client';

import { signOut } from 'next-auth/react';
import { SimpleForm } from '@/components/forms/simple-form';
import { paths } from '@/lib/paths';
import { endAllSessionsAction } from './actions';
import { proofFields } from './proof-fields';

export function EndSessionsForm({ hasSecondFactor }: { hasSecondFactor: boolean }) {
  return (
    <>
      <p className="mt-2 max-w-sm text-ink-soft">
        A lost tablet, a shared computer: this signs you out of every browser, this one too, at its
        next click.
      </p>
      <SimpleForm
        fields={proofFields(hasSecondFactor)}
        submit={async ({ password = '', code = '' }) => {
          const answer = await endAllSessionsAction({ password, code });
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
