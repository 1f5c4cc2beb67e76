'use server';

import { publicAction } from '@/lib/auth/member-action';
import { acceptInvitation, readInvitation } from '@/lib/people/accept-invitation';
import { askNewPassword } from '@/lib/people/ask-new-password';
import { confirmAddress } from '@/lib/people/confirm-address';
import {
  acceptInvitationInput,
  confirmAddressInput,
  forgottenInput,
  newPasswordInput,
  readInvitationInput,
  signUpInput,
} from '@/lib/people/schema';
import { setNewPassword } from '@/lib/people/set-new-password';
import { signUp } from '@/lib/people/sign-up';

export const signUpAction = publicAction('sign-up', signUpInput, (_person, input) => signUp(input));

export const askNewPasswordAction = publicAction(
  'ask-new-password',
  forgottenInput,
  (_person, { email }) => askNewPassword(email),
);

export const confirmAddressAction = publicAction(
  'confirm-address',
  confirmAddressInput,
  (_person, { secret }) => confirmAddress(secret),
);

export const setNewPasswordAction = publicAction(
  'set-new-password',
  newPasswordInput,
  (_person, { secret, password }) => setNewPassword(secret, password),
);

export const readInvitationAction = publicAction(
  'read-invitation',
  readInvitationInput,
  (_person, { secret }) => readInvitation(secret),
);

export const acceptInvitationAction = publicAction(
  'accept-invitation',
  acceptInvitationInput,
  acceptInvitation,
);
