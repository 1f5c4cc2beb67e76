'use client';

import { useId, type InputHTMLAttributes, type ReactNode, type Ref } from 'react';
import { FieldProblem } from './field-problem';
import { inputClass } from './input-class';

/** One line of text with its label above and its problem, if any, below. */
export function TextField({
  label,
  problem,
  hint,
  ref,
  ...rest
}: InputHTMLAttributes<HTMLInputElement> & {
  label: ReactNode;
  problem?: string;
  hint?: ReactNode;
  ref?: Ref<HTMLInputElement>;
}) {
  const id = useId();
  const hintId = hint === undefined ? undefined : `${id}-hint`;
  const problemId = problem === undefined ? undefined : `${id}-problem`;
  return (
    <div>
      <label htmlFor={id} className="block font-semibold">
        {label}
      </label>
      {hint === undefined ? null : (
        <p id={hintId} className="text-sm text-ink-soft">
          {hint}
        </p>
      )}
      <input
        {...rest}
        ref={ref}
        id={id}
        aria-invalid={problem !== undefined}
        aria-describedby={[hintId, problemId].filter(Boolean).join(' ') || undefined}
        className={`mt-1 ${inputClass(problem !== undefined)}`}
      />
      <FieldProblem id={problemId}>{problem}</FieldProblem>
    </div>
  );
}
