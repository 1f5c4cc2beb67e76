'use client';

import { signIn } from 'next-auth/react';
import { Button } from '@/components/ui/button';
import { paths } from '@/lib/paths';

/** Sign-in through the organisation's own provider. */
export function OpenIdButton({ name }: { name: string }) {
  return (
    <div className="mt-5 grid max-w-sm border-t border-rule pt-5">
      <Button onClick={() => void signIn('openid', { callbackUrl: paths.home })}>
        Sign in with {name}
      </Button>
    </div>
  );
}
