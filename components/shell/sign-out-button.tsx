'use client';

import { signOut } from 'next-auth/react';
import { buttonClass } from '@/components/ui/button';
import { paths } from '@/lib/paths';

export function SignOutButton() {
  return (
    <button
      type="button"
      className={buttonClass('quiet')}
      onClick={() => void signOut({ callbackUrl: paths.signIn })}
    >
      Sign out
    </button>
  );
}
