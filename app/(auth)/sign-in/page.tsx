import type { Metadata } from 'next';
import { redirect } from 'next/navigation';
import { Wordmark } from '@/components/shell/wordmark';
import { signedInPersonId } from '@/lib/auth/actor';
import { paths } from '@/lib/paths';
import { SignInForm } from './sign-in-form';

export const metadata: Metadata = { title: 'Sign in' };

export default async function SignInPage() {
  if ((await signedInPersonId()) !== null) redirect(paths.home);
  return (
    <main className="mx-auto grid min-h-dvh max-w-5xl content-center gap-x-16 gap-y-10 px-4 py-10 sm:px-8 md:grid-cols-2">
      <div className="self-center">
        <Wordmark large />
        <p className="mt-5 max-w-prose font-head text-xl leading-snug">
          From the morning&rsquo;s sample to a pump setting you can explain.
        </p>
        <p className="mt-3 max-w-prose text-ink-soft">
          Marlwick suggests; the licensed operator in charge decides. Confirm every dose by jar test
          or titration and at the tap, and stay within the permit and local codes.
        </p>
      </div>
      <div className="margin-rule self-center pl-6 sm:pl-8">
        <h1 className="text-2xl">Sign in</h1>
        <SignInForm />
      </div>
    </main>
  );
}
