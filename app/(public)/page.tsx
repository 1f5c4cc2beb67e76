import { redirect } from 'next/navigation';
import { SignOutButton } from '@/components/shell/sign-out-button';
import { PageHeading } from '@/components/ui/page-heading';
import { signedInPerson } from '@/lib/auth/actor';
import { paths } from '@/lib/paths';
import { readHomeOf } from '@/lib/people/read-home-of';

/** The bare address leads a signed-in person to their organisation, anyone else to the door. */
export default async function HomePage() {
  const person = await signedInPerson();
  if (person === null) redirect(paths.signIn);
  const home = await readHomeOf(person.id);
  if (home !== null) redirect(paths.organisation(home));
  return (
    <main className="mx-auto max-w-prose px-4 py-16">
      <PageHeading title="No organisation yet">
        You are signed in, but no organisation counts you among its people. Ask its owner to invite
        you.
      </PageHeading>
      <SignOutButton />
    </main>
  );
}
