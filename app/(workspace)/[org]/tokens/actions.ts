'use server';

import { memberAction } from '@/lib/auth/member-action';
import { makeToken, revokeToken } from '@/lib/tokens/manage-tokens';
import { tokenIdInput, tokenInput } from '@/lib/tokens/schema';

export const makeTokenAction = memberAction('token.write', tokenInput, makeToken);

export const revokeTokenAction = memberAction('token.write', tokenIdInput, (actor, { tokenId }) =>
  revokeToken(actor, tokenId),
);
