import * as z from 'zod';

export const signInInput = z.object({
  email: z
    .string()
    .trim()
    .toLowerCase()
    .pipe(z.email({ error: 'Write the e-mail address you were invited with.' })),
  password: z
    .string({ error: 'Write your password.' })
    .min(1, 'Write your password.')
    .max(256, 'A password has at most 256 characters.'),
});

export type SignInInput = z.infer<typeof signInInput>;
