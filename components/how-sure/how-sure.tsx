'use client';

import { Button } from '@/components/ui/button';
import { Figure } from '@/components/ui/figure';
import { Notice } from '@/components/ui/notice';
import { formatNumber } from '@/lib/format';
import type { IndexBand } from '@/lib/samples/how-sure';
import { INDICES, type IndexKey } from '@/lib/samples/indices';
import { QUANTITIES } from '@/lib/samples/quantities';
import type { MeasuredValues } from '@/lib/samples/solve-sample';
import { useBand } from './use-band';

const DRAWS = 2000;

/** The 90 % band of each index from the usual errors of a works laboratory, drawn on request. */
export function HowSure({ values, shown }: { values: MeasuredValues; shown: readonly IndexKey[] }) {
  const { state, ask, stop } = useBand();
  return (
    <section aria-labelledby="how-sure" className="mt-6 print:hidden">
      <h3 id="how-sure" className="text-lg">
        How sure is this?
      </h3>
      <p className="text-sm text-ink-soft">
        Carries the usual errors of measurement (pH ±0.05, alkalinity ±3 % and 1 mg/L, temperature
        ±0.3 °C, other results ±5 %; one standard deviation each) through {DRAWS} draws.
      </p>
      <div className="mt-2 flex min-h-touch items-center gap-4">
        {state.kind === 'drawing' ? (
          <>
            <label className="flex grow items-center gap-3">
              <span className="shrink-0">Drawing</span>
              <progress
                className="h-2 w-full max-w-xs accent-verdigris"
                value={state.share}
                max={1}
              />
              <span className="figure">{Math.round(100 * state.share)} %</span>
            </label>
            <Button onClick={stop}>Stop</Button>
          </>
        ) : (
          <Button onClick={() => ask({ values, shown, draws: DRAWS })}>
            {state.kind === 'done' ? 'Draw again' : 'Draw the band'}
          </Button>
        )}
      </div>
      <div aria-live="polite">
        {state.kind === 'broken' ? (
          <Notice tone="act" title="The drawing stopped">
            The browser ended it. Reload the page and try again.
          </Notice>
        ) : null}
        {state.kind === 'done' && !state.answer.ok ? (
          <Notice tone="watch" title="No band">
            {state.answer.message}
          </Notice>
        ) : null}
        {state.kind === 'done' && state.answer.ok ? (
          <BandTable
            bands={state.answer.bands}
            draws={state.answer.draws}
            failed={state.answer.failed}
          />
        ) : null}
      </div>
    </section>
  );
}

function BandTable({
  bands,
  draws,
  failed,
}: {
  bands: readonly IndexBand[];
  draws: number;
  failed: number;
}) {
  return (
    <table className="mt-2 w-full text-sm">
      <caption className="text-left text-ink-soft">
        In nine of ten draws the value lies between low and high.
        {failed > 0 ? ` ${failed} of ${draws} draws could not be solved and are left out.` : ''}
      </caption>
      <thead>
        <tr className="border-b border-rule-strong text-left">
          <th scope="col" className="py-1 font-normal">
            Index
          </th>
          <th scope="col" className="py-1 pl-2 text-right font-normal">
            Low
          </th>
          <th scope="col" className="py-1 pl-2 text-right font-normal">
            Middle
          </th>
          <th scope="col" className="py-1 pl-2 text-right font-normal">
            High
          </th>
        </tr>
      </thead>
      <tbody className="ruled">
        {bands.map(({ key, low, median, high, matters }) => {
          const { label, unit, decimals } = INDICES[key];
          return (
            <tr key={key}>
              <th scope="row" className="py-1.5 text-left font-normal">
                {label}
                {unit === '' ? null : <span className="unit ml-1">{unit}</span>}
                <span className="block text-ink-soft">
                  {matters.length === 0
                    ? 'no single input stands out'
                    : `mostly ${matters.map(({ quantity }) => QUANTITIES[quantity].label).join(', ')}`}
                </span>
              </th>
              {[low, median, high].map((value, i) => (
                <td key={i} className="py-1.5 pl-2 text-right align-top">
                  <Figure>{formatNumber(value, decimals)}</Figure>
                </td>
              ))}
            </tr>
          );
        })}
      </tbody>
    </table>
  );
}
