import type { Metadata } from 'next';
import Link from 'next/link';
import { DoorSheet } from '@/components/shell/door-sheet';
import { paths } from '@/lib/paths';
import { SignUpForm } from './sign-up-form';

export const metadata: Metadata = { title: 'Open an account' };

export default function SignUpPage() {
  return (
    <DoorSheet title="Open an account">
      <p className="mt-2 max-w-sm text-ink-soft">
        For a utility or a consultancy. If yours is here already, ask for an invitation instead.
      </p>
      <SignUpForm />
      <p className="mt-5">
        <Link href={paths.signIn}>I have an account</Link>
      </p>
    </DoorSheet>
  );
}
