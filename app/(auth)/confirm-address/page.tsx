import type { Metadata } from 'next';
import { DoorSheet } from '@/components/shell/door-sheet';
import { ConfirmForm } from './confirm-form';

export const metadata: Metadata = { title: 'Confirm your address' };

export default function ConfirmAddressPage() {
  return (
    <DoorSheet title="Confirm your address">
      <ConfirmForm />
    </DoorSheet>
  );
}
