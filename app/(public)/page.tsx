import { redirect } from 'next/navigation';
import { signedInPersonId } from '@/lib/auth/actor';
import { paths } from '@/lib/paths';
import { readHomeOf } from '@/lib/people/read-home-of';

/** The bare address leads a signed-in person to their organisation, anyone else to the door. */
export default async function HomePage() {
  const personId = await signedInPersonId();
  const home = personId === null ? null : await readHomeOf(personId);
  redirect(home === null ? paths.signIn : paths.organisation(home));
}
