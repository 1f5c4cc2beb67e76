import * as z from 'zod';
import { TOKEN_SCOPES } from '@/lib/auth/permissions';

export const TOKEN_LIVES_DAYS = [30, 90, 365] as const;

export const tokenInput = z.object({
  name: z.string().trim().min(1, 'Give the token a name.').max(80, 'At most 80 characters.'),
  scopes: z.array(z.enum(TOKEN_SCOPES)).min(1, 'Choose at least one thing it may do.'),
  /** Null: every plant its maker sees. */
  plantIds: z.array(z.string()).min(1, 'Name at least one plant.').nullable(),
  days: z.literal(TOKEN_LIVES_DAYS, { error: 'Choose how long it shall last.' }),
});
export type TokenInput = z.output<typeof tokenInput>;

export const tokenIdInput = z.object({ tokenId: z.string().min(1) });
