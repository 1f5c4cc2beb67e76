'use client';

import { useState } from 'react';
import { SimpleForm } from '@/components/forms/simple-form';
import { Notice } from '@/components/ui/notice';
import { askNewPasswordAction } from '../actions';

/** Asks for a link to a new password; says the same whether the address is known or not. */
export function ForgottenForm() {
  const [address, setAddress] = useState<string>();
  if (address !== undefined) {
    return (
      <div className="mt-5 max-w-sm" role="status">
        <Notice tone="calm" title="Look into your mail">
          If {address} has an account, a letter with a link is on its way. It works once, within an
          hour.
        </Notice>
      </div>
    );
  }
  return (
    <SimpleForm
      fields={[{ name: 'email', label: 'E-mail', type: 'email', autoComplete: 'username' }]}
      submit={async ({ email = '' }) => {
        const answer = await askNewPasswordAction({ email });
        if (answer.ok) setAddress(email.trim());
        return answer;
      }}
      label="Send the link"
      busyLabel="Sending…"
      failure="Not sent"
    />
  );
}
