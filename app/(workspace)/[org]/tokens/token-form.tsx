'use client';

import { useState } from 'react';
import { CheckList } from '@/components/forms/check-list';
import { ChoiceField } from '@/components/forms/choice-field';
import { TextField } from '@/components/forms/text-field';
import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { isTokenScope, TOKEN_SCOPES } from '@/lib/auth/permissions';
import { makeTokenAction } from './actions';

const LIVES = [
  { value: '30', label: '30 days' },
  { value: '90', label: '90 days' },
  { value: '365', label: 'a year' },
] as const;
const DAYS = { '30': 30, '90': 90, '365': 365 } as const;

const SCOPE_WORDS: Readonly<Record<(typeof TOKEN_SCOPES)[number], string>> = {
  'plant.read': 'Read plants, points, targets',
  'sample.read': 'Read samples',
  'sample.write': 'Enter samples',
  'plan.read': 'Read plans',
  'plan.write': 'Save plans',
  'trend.read': 'Read series',
  'target.write': 'Change targets',
  'feed.read': 'Read the feed log',
  'feed.write': 'Log what was fed',
  'audit.read': 'Read the audit trail',
};

/** What a token may do and where; its text is shown once, here. */
export function TokenForm({
  organisationSlug,
  plants,
}: {
  organisationSlug: string;
  plants: readonly { readonly id: string; readonly name: string }[];
}) {
  const { run, problem, isBusy } = useAction();
  const [name, setName] = useState('');
  const [scopes, setScopes] = useState<readonly string[]>(['plant.read', 'sample.read']);
  const [plantIds, setPlantIds] = useState<readonly string[]>([]);
  const [life, setLife] = useState<(typeof LIVES)[number]['value']>('90');
  const [text, setText] = useState<string>();

  const make = () =>
    run(
      () =>
        makeTokenAction(organisationSlug, {
          name,
          scopes: scopes.filter(isTokenScope),
          plantIds: plantIds.length === 0 ? null : [...plantIds],
          days: DAYS[life],
        }),
      (made) => {
        setText(made.text);
        setName('');
      },
    );

  return (
    <form
      className="mt-3 grid max-w-md gap-4"
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setText(undefined);
        make();
      }}
    >
      <TextField
        label="Name"
        hint="What will use it: “level logger”, “laboratory export”"
        autoComplete="off"
        value={name}
        onChange={({ target }) => setName(target.value)}
      />
      <CheckList
        legend="It may"
        choices={TOKEN_SCOPES.map((scope) => ({ value: scope, label: SCOPE_WORDS[scope] }))}
        chosen={scopes}
        onChange={setScopes}
      />
      {plants.length < 2 ? null : (
        <CheckList
          legend="Only at (none ticked: all you see)"
          choices={plants.map((plant) => ({ value: plant.id, label: plant.name }))}
          chosen={plantIds}
          onChange={setPlantIds}
        />
      )}
      <ChoiceField label="For" choices={LIVES} value={life} onChange={setLife} />
      {problem === undefined ? null : (
        <Notice tone="act" title="Not made" role="alert">
          {problem}
        </Notice>
      )}
      {text === undefined ? null : (
        <div role="status">
          <Notice tone="watch" title="Copy it now">
            Marlwick keeps no copy: once you leave this page, nobody can read it again.
          </Notice>
          <p className="figure mt-2 border border-rule-strong bg-chalk p-3 break-all whitespace-normal">
            {text}
          </p>
        </div>
      )}
      <div>
        <Button type="submit" shape="main" disabled={isBusy}>
          {isBusy ? 'Making…' : 'Make the token'}
        </Button>
      </div>
    </form>
  );
}
