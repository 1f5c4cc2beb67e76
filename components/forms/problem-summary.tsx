'use client';

import { useEffect, useRef } from 'react';

export interface ListedProblem {
  readonly label: string;
  readonly message: string;
  readonly fieldId?: string;
}

/** After a refused save: every problem in one place at the top, each a link to its field; focus moves here. */
export function ProblemSummary({
  problems,
  serverProblem,
  submitCount,
}: {
  problems: readonly ListedProblem[];
  serverProblem?: string;
  submitCount: number;
}) {
  const box = useRef<HTMLDivElement>(null);
  const isShown = submitCount > 0 && (problems.length > 0 || serverProblem !== undefined);
  useEffect(() => {
    if (isShown) box.current?.focus();
  }, [isShown, submitCount, serverProblem]);
  if (!isShown) return null;
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      className="mb-5 border-l-4 border-rust bg-rust-wash px-4 py-3"
    >
      <p className="font-semibold text-rust">
        {serverProblem ?? 'Nothing was saved: some fields need another look.'}
      </p>
      <ul className="mt-1">
        {problems.map(({ label, message, fieldId }) => (
          <li key={`${label} ${message}`}>
            {fieldId === undefined ? (
              label
            ) : (
              <a
                href={`#${fieldId}`}
                onClick={(event) => {
                  event.preventDefault();
                  document.getElementById(fieldId)?.focus();
                }}
              >
                {label}
              </a>
            )}
            : {message}
          </li>
        ))}
      </ul>
    </div>
  );
}
