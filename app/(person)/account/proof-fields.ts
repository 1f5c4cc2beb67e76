import type { SimpleField } from '@/components/forms/simple-form';

/** What an account asks for before its locks are changed. */
export const proofFields = (
  hasSecondFactor: boolean,
  label = 'Password, to be sure it is you',
): readonly SimpleField[] => [
  { name: 'password', label, type: 'password', autoComplete: 'current-password' },
  ...(hasSecondFactor
    ? [
        {
          name: 'code',
          label: 'Code',
          autoComplete: 'one-time-code',
          hint: 'From your authenticator, or a recovery code',
        },
      ]
    : []),
];
