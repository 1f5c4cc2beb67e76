import type { Metadata } from 'next';
import Link from 'next/link';
import { DoorSheet } from '@/components/shell/door-sheet';
import { paths } from '@/lib/paths';
import { ForgottenForm } from './forgotten-form';

export const metadata: Metadata = { title: 'Forgotten password' };

export default function ForgottenPage() {
  return (
    <DoorSheet title="Forgotten password">
      <ForgottenForm />
      <p className="mt-5">
        <Link href={paths.signIn}>Back to the sign-in</Link>
      </p>
    </DoorSheet>
  );
}
