'use client';

import { useDeferredValue, useMemo } from 'react';
import { IndexList } from '@/components/ledger/index-list';
import { checkResult, type WrittenResult } from '@/lib/samples/check-result';
import type { IndexKey } from '@/lib/samples/indices';
import { solveSample, type MeasuredValues } from '@/lib/samples/solve-sample';

const SHOWN: readonly IndexKey[] = [
  'calciteIndex',
  'langelier',
  'precipitationPotential',
  'saturationPH',
  'inorganicCarbon',
  'carbonDioxide',
  'bufferIntensity',
  'chargeBalance',
];

/** What the water says while it is being typed: the engine runs here, in the browser, on every change. */
export function LiveFindings({ results }: { results: readonly WrittenResult[] }) {
  const settled = useDeferredValue(results);
  const solution = useMemo(() => solveSample(understood(settled)), [settled]);
  return (
    <aside
      aria-label="What this water says"
      className="margin-rule self-start pl-5 lg:sticky lg:top-4"
    >
      <h2 className="text-xl">What this water says</h2>
      {solution.ok ? (
        <>
          <IndexList indices={solution.indices} shown={SHOWN} />
          {solution.assumptions.length === 0 ? null : (
            <details className="mt-3 text-sm">
              <summary className="min-h-6 text-ink-soft">
                {solution.assumptions.length === 1
                  ? 'One assumption'
                  : `${solution.assumptions.length} assumptions`}{' '}
                behind these figures
              </summary>
              <ul className="mt-1 list-disc pl-5">
                {solution.assumptions.map((sentence) => (
                  <li key={sentence}>{sentence}</li>
                ))}
              </ul>
            </details>
          )}
        </>
      ) : (
        <p className="mt-2 text-ink-soft">{solution.refusal}</p>
      )}
    </aside>
  );
}

const understood = (results: readonly WrittenResult[]): MeasuredValues =>
  Object.fromEntries(
    results.flatMap((result) => {
      const checked = checkResult(result);
      return checked.kind === 'value'
        ? [[result.quantity, { value: checked.value, qualifier: checked.qualifier }]]
        : [];
    }),
  );
