import * as z from 'zod';
import { passwordProblem } from './password-rules';

const email = (message: string) =>
  z
    .string()
    .trim()
    .toLowerCase()
    .pipe(z.email({ error: message }));

const presentPassword = z
  .string({ error: 'Write your password.' })
  .min(1, 'Write your password.')
  .max(256, 'A password has at most 256 characters.');

/** A password to be: the rules stand in password-rules.ts. */
export const newPassword = z
  .string({ error: 'Choose a password.' })
  .superRefine((text, context) => {
    const problem = passwordProblem(text);
    if (problem !== null) context.addIssue({ code: 'custom', message: problem });
  });

const personName = z
  .string({ error: 'Write your name.' })
  .trim()
  .min(1, 'Write your name.')
  .max(120, 'A name has at most 120 characters.')
  .regex(/^[^\p{Cc}]*$/u, 'A name is one line of text.');

export const signInInput = z.object({
  email: email('Write the e-mail address you were invited with.'),
  password: presentPassword,
  /** The authenticator's figures or a recovery code; empty while none was asked for. */
  code: z.string().trim().max(40).default(''),
});
export type SignInInput = z.input<typeof signInInput>;

export const signUpInput = z.object({
  organisationName: z
    .string({ error: 'Write the name of your utility or firm.' })
    .trim()
    .min(2, 'Write the name of your utility or firm.')
    .max(120, 'A name has at most 120 characters.')
    .regex(/^[^\p{Cc}]*$/u, 'A name is one line of text.'),
  name: personName,
  email: email('Write your e-mail address.'),
  password: newPassword,
});
export type SignUpInput = z.input<typeof signUpInput>;

export const forgottenInput = z.object({ email: email('Write your e-mail address.') });

/** The secret of a link, as it stands behind its #. */
export const linkSecret = z
  .string()
  .regex(/^[A-Za-z0-9_-]{43}$/, 'This link is not whole. Copy it from the e-mail again.');

export const confirmAddressInput = z.object({ secret: linkSecret });
export const newPasswordInput = z.object({ secret: linkSecret, password: newPassword });
export const readInvitationInput = z.object({ secret: linkSecret });

/** Name and password only where the invited address has no account yet. */
export const acceptInvitationInput = z.object({
  secret: linkSecret,
  account: z.object({ name: personName, password: newPassword }).nullable(),
});

const code = z.string().trim().max(40).default('');
export const changePasswordInput = z.object({
  password: presentPassword,
  code,
  next: newPassword,
});
export const proofInput = z.object({ password: presentPassword, code });
export const sessionInput = z.object({ sessionHash: z.string().length(64) });
export const codeInput = z.object({
  code: z.string().trim().min(6, 'Write the six figures.').max(40),
});
