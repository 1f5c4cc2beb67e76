'use client';

import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { useState } from 'react';
import type { TrendChoices } from '@/lib/trends/choices';
import { TrendControls } from './trend-controls';
import { TrendPanel } from './trend-panel';
import { useTrendState } from './use-trend-state';

/** Choice above, panels below; the address holds the choice, so a trend can be sent to a colleague. */
export function TrendsView(props: {
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  choices: TrendChoices;
}) {
  const [client] = useState(
    () => new QueryClient({ defaultOptions: { queries: { staleTime: 60_000, retry: 1 } } }),
  );
  return (
    <QueryClientProvider client={client}>
      <Panels {...props} />
    </QueryClientProvider>
  );
}

function Panels({
  organisationSlug,
  plantSlug,
  timeZone,
  choices,
}: {
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  choices: TrendChoices;
}) {
  const { point, quantities, from, to, choose } = useTrendState(choices);
  return (
    <>
      <TrendControls
        choices={choices}
        point={point}
        quantities={quantities}
        from={from}
        to={to}
        onChoose={choose}
      />
      {quantities.length === 0 ? (
        <p className="mt-6 text-ink-soft">Choose at least one quantity to draw.</p>
      ) : (
        <div className="mt-6 grid gap-10">
          {quantities.map((quantity) => (
            <TrendPanel
              key={quantity}
              organisationSlug={organisationSlug}
              plantSlug={plantSlug}
              timeZone={timeZone}
              point={point.slug}
              pointName={point.name}
              quantity={quantity}
              from={from}
              to={to}
            />
          ))}
        </div>
      )}
    </>
  );
}
