'use client';

import { useRef, useState, useTransition, type FormEvent, type ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { TextField } from './text-field';

export interface SimpleField {
  readonly name: string;
  readonly label: string;
  readonly type?: 'text' | 'email' | 'password';
  readonly autoComplete: string;
  readonly hint?: string;
}

/** What a form's action answers (the shape of a server action's result). */
export type Submitted =
  | { readonly ok: true }
  | {
      readonly ok: false;
      readonly message: string;
      readonly problems: readonly { readonly path: string; readonly message: string }[];
    };

/**
 * A few lines of text and a button. The server checks; what it says stands at the field it is about, what was typed stays.
 * Sent before its script runs, it goes as a POST: a password never stands in an address. Focus moves to the first field with a problem, or to the sentence above.
 */
export function SimpleForm({
  fields,
  submit,
  label,
  busyLabel,
  failure,
  children,
}: {
  fields: readonly SimpleField[];
  submit: (values: Readonly<Record<string, string>>) => Promise<Submitted>;
  label: string;
  busyLabel: string;
  /** Heads the sentence when it failed: “Not signed in”. */
  failure: string;
  children?: ReactNode;
}) {
  const form = useRef<HTMLFormElement>(null);
  const [problem, setProblem] = useState<Extract<Submitted, { ok: false }>>();
  const [isBusy, startBusy] = useTransition();

  const send = (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    const data = new FormData(event.currentTarget);
    const values = Object.fromEntries(
      fields.map(({ name }) => {
        const value = data.get(name);
        return [name, typeof value === 'string' ? value : ''];
      }),
    );
    startBusy(async () => {
      const answer = await submit(values).catch((): Submitted => unreachable);
      setProblem(answer.ok ? undefined : answer);
      if (answer.ok) return;
      const first = fields.find(({ name }) => problemAt(answer, name) !== undefined);
      const target = first === undefined ? '[role=alert]' : `[name="${first.name}"]`;
      // After the sentences stand in the page.
      setTimeout(() => form.current?.querySelector<HTMLElement>(target)?.focus());
    });
  };

  return (
    <form ref={form} method="post" onSubmit={send} noValidate className="mt-5 grid max-w-sm gap-5">
      {problem === undefined ? null : (
        <div role="alert" tabIndex={-1}>
          <Notice tone="act" title={failure}>
            {problem.message}
          </Notice>
        </div>
      )}
      {fields.map(({ name, label: fieldLabel, type = 'text', autoComplete, hint }) => (
        <TextField
          key={name}
          name={name}
          label={fieldLabel}
          type={type}
          autoComplete={autoComplete}
          hint={hint}
          problem={problem && problemAt(problem, name)}
        />
      ))}
      {children}
      <Button type="submit" shape="main" disabled={isBusy}>
        {isBusy ? busyLabel : label}
      </Button>
    </form>
  );
}

const unreachable: Submitted = {
  ok: false,
  message: 'Marlwick did not answer. Check the connection and try again.',
  problems: [],
};

/** A field's own sentence; `account.name` belongs to the field `name`. */
const problemAt = (
  { problems }: Extract<Submitted, { ok: false }>,
  name: string,
): string | undefined =>
  problems.find(({ path }) => path === name || path.endsWith(`.${name}`))?.message;
