import type { Metadata } from 'next';
import { DoorSheet } from '@/components/shell/door-sheet';
import { NewPasswordForm } from './new-password-form';

export const metadata: Metadata = { title: 'A new password' };

export default function NewPasswordPage() {
  return (
    <DoorSheet title="A new password">
      <NewPasswordForm />
    </DoorSheet>
  );
}
