'use client';

import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { endSessionAction } from './actions';

export interface ShownSession {
  readonly sessionHash: string;
  readonly browser: string;
  readonly lastSeen: string;
  readonly isThis: boolean;
}

/** Where one is signed in now; any but this one can be ended here. */
export function SessionList({ sessions }: { sessions: readonly ShownSession[] }) {
  const { run, problem, isBusy } = useAction();
  return (
    <>
      {problem === undefined ? null : (
        <Notice tone="act" title="Not ended" role="alert">
          {problem}
        </Notice>
      )}
      <ul className="mt-2 border-y border-rule-strong">
        {sessions.map(({ sessionHash, browser, lastSeen, isThis }) => (
          <li
            key={sessionHash}
            className="flex flex-wrap items-center justify-between gap-x-4 border-b border-rule py-2 last:border-b-0"
          >
            <p className="min-w-0 break-words">
              {browser === '' ? 'A browser' : browser}
              <span className="block text-sm text-ink-soft">
                {isThis ? 'this one' : `last used ${lastSeen}`}
              </span>
            </p>
            {isThis ? null : (
              <Button
                disabled={isBusy}
                onClick={() => run(() => endSessionAction({ sessionHash }))}
              >
                End it
              </Button>
            )}
          </li>
        ))}
      </ul>
    </>
  );
}
