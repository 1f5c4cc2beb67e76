'use client';

import Link from 'next/link';
import { useState } from 'react';
import { SimpleForm } from '@/components/forms/simple-form';
import { useLinkSecret } from '@/components/forms/use-link-secret';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/lib/paths';
import { setNewPasswordAction } from '../actions';

export function NewPasswordForm() {
  const secret = useLinkSecret();
  const [isDone, setIsDone] = useState(false);
  if (isDone) {
    return (
      <div className="mt-5 max-w-sm" role="status">
        <Notice tone="calm" title="Changed">
          Every session of this account was ended. <Link href={paths.signIn}>Sign in</Link> with the
          new password.
        </Notice>
      </div>
    );
  }
  return (
    <SimpleForm
      fields={[
        {
          name: 'password',
          label: 'New password',
          type: 'password',
          autoComplete: 'new-password',
          hint: 'At least 12 characters; three or four words do well',
        },
      ]}
      submit={async ({ password = '' }) => {
        const answer = await setNewPasswordAction({ secret: secret ?? '', password });
        if (answer.ok) {
          setIsDone(true);
          return answer;
        }
        const atLink = answer.problems.find(({ path }) => path === 'secret');
        return atLink === undefined ? answer : { ...answer, message: atLink.message };
      }}
      label="Keep this password"
      busyLabel="Keeping…"
      failure="Not changed"
    />
  );
}
