'use client';

import { signIn, type SignInResponse } from 'next-auth/react';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { SimpleForm, type SimpleField, type Submitted } from '@/components/forms/simple-form';
import { SECOND_FACTOR_NEEDED } from '@/lib/auth/sign-in-words';
import { paths } from '@/lib/paths';

const FIELDS: readonly SimpleField[] = [
  { name: 'email', label: 'E-mail', type: 'email', autoComplete: 'username' },
  { name: 'password', label: 'Password', type: 'password', autoComplete: 'current-password' },
];
const CODE: SimpleField = {
  name: 'code',
  label: 'Code',
  autoComplete: 'one-time-code',
  hint: 'From your authenticator, or a recovery code',
};

/** E-mail, password, and a code where the account asks for one. A wrong pair does not tell which of the two was wrong. */
export function SignInForm() {
  const router = useRouter();
  const [asksCode, setAsksCode] = useState(false);

  const enter = async (values: Readonly<Record<string, string>>): Promise<Submitted> => {
    const missing = missingOf(values);
    if (missing.length > 0) {
      return { ok: false, message: 'Both are needed.', problems: missing };
    }
    const answer = await signIn('credentials', { ...values, redirect: false });
    if (answer?.ok === true && answer.error === null) {
      router.replace(paths.home);
      router.refresh();
      return { ok: true };
    }
    const message = refusalWords(answer);
    if (message === SECOND_FACTOR_NEEDED) setAsksCode(true);
    return { ok: false, message, problems: [] };
  };

  return (
    <SimpleForm
      fields={asksCode ? [...FIELDS, CODE] : FIELDS}
      submit={enter}
      label="Sign in"
      busyLabel="Signing in…"
      failure={asksCode ? 'One thing more' : 'Not signed in'}
    />
  );
}

const missingOf = ({ email = '', password = '' }: Readonly<Record<string, string>>) => [
  ...(/^\S+@\S+$/.test(email.trim())
    ? []
    : [{ path: 'email', message: 'Write the e-mail address you were invited with.' }]),
  ...(password === '' ? [{ path: 'password', message: 'Write your password.' }] : []),
];

/** What next-auth answered, in words: its own for a wrong pair, the server's sentence for anything else. */
function refusalWords(answer: SignInResponse | undefined): string {
  if (answer?.status !== 401) return 'Marlwick did not answer. Check the connection and try again.';
  return answer.error === null || answer.error === undefined || answer.error === 'CredentialsSignin'
    ? 'This e-mail and password do not belong together. Check both and try again.'
    : answer.error;
}
