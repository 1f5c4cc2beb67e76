'use client';

import Link from 'next/link';
import { useState } from 'react';
import { SimpleForm } from '@/components/forms/simple-form';
import { useLinkSecret } from '@/components/forms/use-link-secret';
import { Notice } from '@/components/ui/notice';
import { paths } from '@/lib/paths';
import { confirmAddressAction } from '../actions';

/** A button, so that a mail scanner that opens links confirms nothing. */
export function ConfirmForm() {
  const secret = useLinkSecret();
  const [isDone, setIsDone] = useState(false);
  if (isDone) {
    return (
      <div className="mt-5 max-w-sm" role="status">
        <Notice tone="calm" title="Confirmed">
          Your account is open. <Link href={paths.signIn}>Sign in</Link>.
        </Notice>
      </div>
    );
  }
  return (
    <SimpleForm
      fields={[]}
      submit={async () => {
        const answer = await confirmAddressAction({ secret: secret ?? '' });
        if (answer.ok) setIsDone(true);
        return answer.ok ? answer : { ...answer, message: sentence(answer) };
      }}
      label="Confirm this address"
      busyLabel="Confirming…"
      failure="Not confirmed"
    />
  );
}

const sentence = (answer: { message: string; problems: readonly { message: string }[] }): string =>
  answer.problems[0]?.message ?? answer.message;
