import type { ReactNode } from 'react';
import { SectionLinks } from '@/components/shell/section-links';

export default function PlantLayout({ children }: { children: ReactNode }) {
  return (
    <>
      <SectionLinks />
      <main className="mx-auto max-w-page px-4 py-6 sm:px-8 sm:py-8">{children}</main>
    </>
  );
}
