import type { Metadata } from 'next';
import Link from 'next/link';
import { redirect } from 'next/navigation';
import { DoorSheet } from '@/components/shell/door-sheet';
import { Notice } from '@/components/ui/notice';
import { signedInPerson } from '@/lib/auth/actor';
import { openIdName } from '@/lib/auth/open-id';
import { paths } from '@/lib/paths';
import { OpenIdButton } from './open-id-button';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage({
  searchParams,
}: {
  searchParams: Promise<{ refused?: string; error?: string }>;
}) {
  if ((await signedInPerson()) !== null) redirect(paths.home);
  const { refused, error } = await searchParams;
  const openId = openIdName();
  return (
    <DoorSheet title="Sign in">
      {refused === undefined && error === undefined ? null : (
        <div className="mt-4 max-w-sm">
          <Notice tone="act" title="Not signed in">
            {refused === 'unknown'
              ? 'Nobody here is known by that account. Ask your organisation to invite the address it has confirmed.'
              : 'That did not work. Try again, or sign in with your password.'}
          </Notice>
        </div>
      )}
      <SignInForm />
      {openId === null ? null : <OpenIdButton name={openId} />}
      <p className="mt-5 flex max-w-sm flex-wrap justify-between gap-x-6 gap-y-2">
        <Link href={paths.forgotten}>Forgotten password</Link>
        <Link href={paths.signUp}>Open an account</Link>
      </p>
    </DoorSheet>
  );
}
