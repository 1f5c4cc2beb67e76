'use client';

import { useAction } from '@/components/forms/use-action';
import { Button } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { revokeTokenAction } from './actions';

export interface ShownToken {
  readonly id: string;
  readonly name: string;
  readonly prefix: string;
  readonly scopes: readonly string[];
  readonly where: string;
  readonly madeByName: string;
  readonly lastUsed: string;
  readonly state: string;
  readonly isInForce: boolean;
}

export function TokenList({
  organisationSlug,
  tokens,
}: {
  organisationSlug: string;
  tokens: readonly ShownToken[];
}) {
  const { run, problem, isBusy } = useAction();
  if (tokens.length === 0) {
    return <p className="mt-2 border-y border-rule py-6 text-ink-soft">No token was made yet.</p>;
  }
  return (
    <>
      {problem === undefined ? null : (
        <Notice tone="act" title="Not revoked" role="alert">
          {problem}
        </Notice>
      )}
      <ul className="mt-2 border-y border-rule-strong">
        {tokens.map((token) => (
          <li
            key={token.id}
            className="flex flex-wrap items-start justify-between gap-x-6 gap-y-2 border-b border-rule py-3 last:border-b-0"
          >
            <p className={`min-w-0 break-words ${token.isInForce ? '' : 'text-ink-soft'}`}>
              <strong>{token.name}</strong> <span className="figure">{token.prefix}…</span>
              <span className="block text-sm text-ink-soft">
                {token.state}; {token.lastUsed}; made by {token.madeByName}
                <br />
                {token.scopes.join(', ')}; {token.where}
              </span>
            </p>
            {token.isInForce ? (
              <Button
                disabled={isBusy}
                onClick={() =>
                  run(() => revokeTokenAction(organisationSlug, { tokenId: token.id }))
                }
              >
                Revoke<span className="sr-only"> {token.name}</span>
              </Button>
            ) : null}
          </li>
        ))}
      </ul>
    </>
  );
}
