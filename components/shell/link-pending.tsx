'use client';

import { useLinkStatus } from 'next/link';

/** Stands inside a link while its page is on the way: a word for readers, a moving rule for the eye. */
export function LinkPending() {
  const { pending } = useLinkStatus();
  return pending ? (
    <span role="status" className="pending-rule">
      <span className="sr-only">, opening</span>
    </span>
  ) : null;
}
