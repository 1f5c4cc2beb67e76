import { NuqsAdapter } from 'nuqs/adapters/next/app';
import type { ReactNode } from 'react';

/** Only trends keep their choice in the address by nuqs; other pages need not load it. */
export default function TrendsLayout({ children }: { children: ReactNode }) {
  return <NuqsAdapter>{children}</NuqsAdapter>;
}
