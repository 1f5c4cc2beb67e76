'use server';

import QRCode from 'qrcode';
import { personAction } from '@/lib/auth/member-action';
import { beginSecondFactor } from '@/lib/auth/second-factor';
import { endAllSessions, endSessionNamed } from '@/lib/auth/sessions';
import { changePassword } from '@/lib/people/change-password';
import { requireProof } from '@/lib/people/require-proof';
import { changePasswordInput, codeInput, proofInput, sessionInput } from '@/lib/people/schema';
import { turnOffSecondFactor, turnOnSecondFactor } from '@/lib/people/switch-second-factor';

export const changePasswordAction = personAction(
  'change-password',
  changePasswordInput,
  (person, { next, ...proof }) => changePassword(person, proof, next),
);

export const endAllSessionsAction = personAction(
  'end-all-sessions',
  proofInput,
  async (person, proof) => {
    await requireProof(person, proof);
    await endAllSessions(person.id);
  },
);

export const endSessionAction = personAction(
  'end-session',
  sessionInput,
  (person, { sessionHash }) => endSessionNamed(person.id, sessionHash),
);

/** The secret as text and as a drawing for the authenticator; the drawing is made here, nobody else sees it. */
export const beginSecondFactorAction = personAction(
  'begin-second-factor',
  proofInput,
  async (person, proof) => {
    await requireProof(person, proof);
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
  proofInput,
  (person, proof) => turnOffSecondFactor(person, proof),
);
