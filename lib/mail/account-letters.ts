import { env } from '@/lib/env';
import { paths } from '@/lib/paths';
import { sendLetter } from './transport';

const address = (path: string): string => new URL(path, env().NEXTAUTH_URL).href;
const SIGNATURE =
  '\n\nMarlwick suggests; the licensed operator in charge decides.\nYou need not answer this letter.\n';

export const sendConfirmAddress = (to: string, name: string, secret: string) =>
  sendLetter({
    kind: 'confirm-address',
    to,
    subject: 'Confirm your address for Marlwick',
    text: `Hello ${name},

someone, most likely you, opened a Marlwick account with this address. Confirm it here within two days:

${address(paths.confirmAddress(secret))}

If it was not you, do nothing: without this link the account stays shut.${SIGNATURE}`,
  });

/** To an address that has an account already and was used to sign up again: only its owner learns so. */
export const sendKnownAddress = (to: string, name: string) =>
  sendLetter({
    kind: 'known-address',
    to,
    subject: 'You have a Marlwick account already',
    text: `Hello ${name},

someone, most likely you, tried to open a Marlwick account with this address, which has one already. Sign in here:

${address(paths.signIn)}

If you do not know the password, ask for a new one: ${address(paths.forgotten)}${SIGNATURE}`,
  });

export const sendNewPassword = (to: string, name: string, secret: string) =>
  sendLetter({
    kind: 'new-password',
    to,
    subject: 'A new password for Marlwick',
    text: `Hello ${name},

choose a new password here within one hour; the link works once:

${address(paths.newPassword(secret))}

If you did not ask for it, do nothing: your password stays as it is.${SIGNATURE}`,
  });

export const sendPasswordChanged = (to: string, name: string) =>
  sendLetter({
    kind: 'password-changed',
    to,
    subject: 'Your Marlwick password was changed',
    text: `Hello ${name},

the password of your Marlwick account was changed just now, and all its sessions were ended. If it was not you, ask for
a new password at once: ${address(paths.forgotten)}${SIGNATURE}`,
  });

export const sendSecondFactorChanged = (to: string, name: string, isOn: boolean) =>
  sendLetter({
    kind: 'second-factor-changed',
    to,
    subject: `The second factor of your Marlwick account is ${isOn ? 'on' : 'off'}`,
    text: `Hello ${name},

the second factor of your Marlwick account was turned ${isOn ? 'on' : 'off'} just now. If it was not you, ask for a new
password at once: ${address(paths.forgotten)}${SIGNATURE}`,
  });

export const sendInvitation = (
  to: string,
  {
    organisationName,
    invitedBy,
    role,
    secret,
  }: {
    organisationName: string;
    invitedBy: string;
    role: string;
    secret: string;
  },
) =>
  sendLetter({
    kind: 'invitation',
    to,
    subject: `${invitedBy} invites you to ${organisationName} on Marlwick`,
    text: `Hello,

${invitedBy} invites you to the water log of ${organisationName}, as ${role}. Accept within seven days; the link works once:

${address(paths.invitation(secret))}

If you do not know them, do nothing.${SIGNATURE}`,
  });
