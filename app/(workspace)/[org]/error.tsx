'use client';

import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';

/** A page that could not be shown says so, says that nothing was lost, and offers to try again. */
export default function WorkspaceError({ reset }: { error: Error; reset: () => void }) {
  return (
    <div className="mx-auto max-w-page px-4 py-10 sm:px-8">
      <h1 className="text-2xl">This page could not be read</h1>
      <div className="mt-4 max-w-prose">
        <Notice tone="act" title="Marlwick stumbled" role="alert">
          Nothing you saved is lost. Try again; if it keeps happening, tell whoever looks after
          Marlwick at your works.
        </Notice>
      </div>
      <Button shape="main" className="mt-6" onClick={reset}>
        Try again
      </Button>
    </div>
  );
}
