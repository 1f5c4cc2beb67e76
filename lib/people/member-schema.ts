import * as z from 'zod';
import { ROLES } from '@/lib/auth/permissions';

const plantIds = z.array(z.string()).min(1, 'Name at least one plant.').nullable();

export const invitationInput = z.object({
  email: z
    .string()
    .trim()
    .toLowerCase()
    .pipe(z.email({ error: 'Write an e-mail address.' })),
  role: z.enum(ROLES),
  plantIds,
});
export const memberChangeInput = z.object({
  personId: z.string().min(1),
  role: z.enum(ROLES),
  plantIds,
});
export const memberIdInput = z.object({ personId: z.string().min(1) });
export const invitationIdInput = z.object({ invitationId: z.string().min(1) });
