import type { Credential } from '@/lib/auth/door';
import { beginSession } from '@/lib/auth/sessions';

/** What a browser of this person would bring to the door, just signed in. */
export const sessionOf = async (personId: string): Promise<Credential> => ({
  kind: 'session',
  secret: await beginSession(personId),
});
