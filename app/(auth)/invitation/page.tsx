import type { Metadata } from 'next';
import { DoorSheet } from '@/components/shell/door-sheet';
import { signedInPerson } from '@/lib/auth/actor';
import { InvitationForm } from './invitation-form';

export const metadata: Metadata = { title: 'Invitation' };

export default async function InvitationPage() {
  const person = await signedInPerson();
  return (
    <DoorSheet title="Invitation">
      <InvitationForm signedInEmail={person?.email ?? null} />
    </DoorSheet>
  );
}
