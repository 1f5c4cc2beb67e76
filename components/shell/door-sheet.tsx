import type { ReactNode } from 'react';
import { Wordmark } from './wordmark';

/** The page before the log: who we are on the left, what is asked on the right. */
export function DoorSheet({ title, children }: { title: string; children: ReactNode }) {
  return (
    <main className="mx-auto grid min-h-dvh max-w-5xl content-center gap-x-16 gap-y-10 px-4 py-10 sm:px-8 md:grid-cols-2">
      <div className="self-center">
        <Wordmark large />
        <p className="mt-5 max-w-prose font-head text-xl leading-snug">
          From the morning&rsquo;s sample to a pump setting you can explain.
        </p>
        <p className="mt-3 max-w-prose text-ink-soft">
          Marlwick suggests; the licensed operator in charge decides. Confirm every dose by jar test
          or titration and at the tap, and stay within the permit and local codes.
        </p>
      </div>
      <div className="margin-rule self-center pl-6 sm:pl-8">
        <h1 className="text-2xl">{title}</h1>
        {children}
      </div>
    </main>
  );
}
