import type { Credential } from '@/lib/auth/door';

/** What a browser of this person would bring to the door. */
export const sessionOf = (personId: string, epoch = 0): Credential => ({
  kind: 'session',
  personId,
  epoch,
});
