'use client';

import { useRouter } from 'next/navigation';
import { useCallback, useState, useTransition } from 'react';

type Answer<Value> =
  | { readonly ok: true; readonly value: Value }
  | {
      readonly ok: false;
      readonly message: string;
      readonly problems: readonly { readonly message: string }[];
    };

/** Runs an action once at a time, keeps what it refused as one sentence, and reads the page again when it worked. */
export function useAction() {
  const router = useRouter();
  const [problem, setProblem] = useState<string>();
  const [isBusy, startBusy] = useTransition();

  const run = useCallback(
    <Value>(action: () => Promise<Answer<Value>>, done?: (value: Value) => void) => {
      setProblem(undefined);
      startBusy(async () => {
        try {
          const answer = await action();
          if (answer.ok) {
            done?.(answer.value);
            router.refresh();
          } else {
            setProblem(
              answer.problems.length === 0
                ? answer.message
                : answer.problems.map(({ message }) => message).join(' '),
            );
          }
        } catch {
          setProblem('Marlwick could not be reached, so nothing was changed. Try again.');
        }
      });
    },
    [router],
  );
  return { run, problem, isBusy };
}
