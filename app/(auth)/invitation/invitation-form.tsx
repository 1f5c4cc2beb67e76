'use client';

import Link from 'next/link';
import { useEffect, useState } from 'react';
import { SimpleForm } from '@/components/forms/simple-form';
import { useLinkSecret } from '@/components/forms/use-link-secret';
import { Notice } from '@/components/ui/notice';
import type { InvitationWords } from '@/lib/people/accept-invitation';
import { paths } from '@/lib/paths';
import { acceptInvitationAction, readInvitationAction } from '../actions';

type Read =
  | { readonly kind: 'reading' }
  | { readonly kind: 'refused'; readonly message: string }
  | { readonly kind: 'open'; readonly words: InvitationWords };

/** Says who invites to what, then asks only for what is missing: nothing, a sign-in, or a name and a password. */
export function InvitationForm({ signedInEmail }: { signedInEmail: string | null }) {
  const secret = useLinkSecret();
  const [read, setRead] = useState<Read>({ kind: 'reading' });
  const [joined, setJoined] = useState<string>();

  useEffect(() => {
    if (secret === null) return;
    let isCurrent = true;
    readInvitationAction({ secret }).then(
      (answer) => {
        if (!isCurrent) return;
        setRead(
          answer.ok
            ? { kind: 'open', words: answer.value }
            : { kind: 'refused', message: answer.problems[0]?.message ?? answer.message },
        );
      },
      () => setRead({ kind: 'refused', message: 'Marlwick did not answer. Load the page again.' }),
    );
    return () => {
      isCurrent = false;
    };
  }, [secret]);

  if (joined !== undefined) return <Joined slug={joined} isSignedIn={signedInEmail !== null} />;
  if (read.kind === 'reading') return <p className="mt-5 text-ink-soft">Reading the invitation…</p>;
  if (read.kind === 'refused') {
    return (
      <div className="mt-5 max-w-sm" role="alert">
        <Notice tone="act" title="Not open">
          {read.message}
        </Notice>
      </div>
    );
  }
  const { organisationName, email, role, allPlants, hasAccount } = read.words;
  const mustSignIn = hasAccount && signedInEmail !== email;
  return (
    <>
      <p className="mt-3 max-w-sm">
        To <strong>{organisationName}</strong>, as <strong>{role}</strong>,{' '}
        {allPlants ? 'for all its plants' : 'for named plants'}; sent to {email}.
      </p>
      {mustSignIn ? (
        <div className="mt-4 max-w-sm">
          <Notice tone="calm" title="Sign in first">
            {signedInEmail === null
              ? 'This address has an account. '
              : `You are signed in as ${signedInEmail}; sign out there. `}
            <Link href={paths.signIn}>Sign in</Link> as {email}, then open the link in the letter
            again.
          </Notice>
        </div>
      ) : (
        <SimpleForm
          fields={
            hasAccount
              ? []
              : [
                  { name: 'name', label: 'Your name', autoComplete: 'name' },
                  {
                    name: 'password',
                    label: 'Password',
                    type: 'password',
                    autoComplete: 'new-password',
                    hint: 'At least 12 characters; three or four words do well',
                  },
                ]
          }
          submit={async ({ name = '', password = '' }) => {
            const account = hasAccount ? null : { name, password };
            const answer = await acceptInvitationAction({ secret: secret ?? '', account });
            if (answer.ok) setJoined(answer.value.organisationSlug);
            return answer;
          }}
          label={`Join ${organisationName}`}
          busyLabel="Joining…"
          failure="Not joined"
        />
      )}
    </>
  );
}

function Joined({ slug, isSignedIn }: { slug: string; isSignedIn: boolean }) {
  return (
    <div className="mt-5 max-w-sm" role="status">
      <Notice tone="calm" title="Joined">
        {isSignedIn ? (
          <Link href={paths.organisation(slug)}>Open its log</Link>
        ) : (
          <Link href={paths.signIn}>Sign in</Link>
        )}
        .
      </Notice>
    </div>
  );
}
