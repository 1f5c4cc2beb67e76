'use client';

import { useState } from 'react';
import { SimpleForm } from '@/components/forms/simple-form';
import { Notice } from '@/components/ui/notice';
import { signUpAction } from '../actions';

/** Organisation, name, address, password. What follows is the same for a new address and a known one. */
export function SignUpForm() {
  const [address, setAddress] = useState<string>();
  if (address !== undefined) {
    return (
      <div className="mt-5 max-w-sm" role="status">
        <Notice tone="calm" title="Look into your mail">
          We wrote to {address}. Open the link in the letter within two days, then sign in.
        </Notice>
      </div>
    );
  }
  return (
    <SimpleForm
      fields={[
        {
          name: 'organisationName',
          label: 'Utility or firm',
          autoComplete: 'organization',
        },
        { name: 'name', label: 'Your name', autoComplete: 'name' },
        { name: 'email', label: 'E-mail', type: 'email', autoComplete: 'username' },
        {
          name: 'password',
          label: 'Password',
          type: 'password',
          autoComplete: 'new-password',
          hint: 'At least 12 characters; three or four words do well',
        },
      ]}
      submit={async (values) => {
        const { organisationName = '', name = '', email = '', password = '' } = values;
        const answer = await signUpAction({ organisationName, name, email, password });
        if (answer.ok) setAddress(email.trim());
        return answer;
      }}
      label="Open the account"
      busyLabel="Opening…"
      failure="Not opened"
    />
  );
}
