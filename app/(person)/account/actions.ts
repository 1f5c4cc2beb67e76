'use server';

import QRCode from 'qrcode';
import { personAction } from '@/lib/auth/member-action';
import { beginSecondFactor } from '@/lib/auth/second-factor';
import { changePassword } from '@/lib/people/change-password';
import { endAllSessions } from '@/lib/people/end-all-sessions';
import { changePasswordInput, codeInput, passwordInput } from '@/lib/people/schema';
import { turnOffSecondFactor, turnOnSecondFactor } from '@/lib/people/switch-second-factor';
import { requirePassword } from '@/lib/people/require-password';

export const changePasswordAction = personAction(
  'change-password',
  changePasswordInput,
  (person, { present, next }) => changePassword(person, present, next),
);

export const endAllSessionsAction = personAction(
  'end-all-sessions',
  passwordInput,
  (person, { password }) => requirePassword(person, password).then(() => endAllSessions(person.id)),
);

/** The secret as text and as a drawing for the authenticator; the drawing is made here, nobody else sees it. */
export const beginSecondFactorAction = personAction(
  'begin-second-factor',
  passwordInput,
  async (person, { password }) => {
    await requirePassword(person, password);
    const { secret, uri } = await beginSecondFactor(person);
    return { secret, drawing: await QRCode.toDataURL(uri, { margin: 2, width: 220 }) };
  },
);

export const confirmSecondFactorAction = personAction(
  'confirm-second-factor',
  codeInput,
  (person, { code }) => turnOnSecondFactor(person, code),
);

export const endSecondFactorAction = personAction(
  'end-second-factor',
  passwordInput,
  (person, { password }) => turnOffSecondFactor(person, password),
);
