'use client';

import { TZDate } from '@date-fns/tz';
import { useQuery } from '@tanstack/react-query';
import { addDays, parseISO } from 'date-fns';
import dynamic from 'next/dynamic';
import { Button } from '@/components/ui/button';
import { Formula } from '@/components/ui/formula';
import { Notice } from '@/components/ui/notice';
import { formatNumber } from '@/lib/format';
import { describe, type SeriesKey } from '@/lib/samples/describe';
import { fetchSeries } from './fetch-series';
import { SeriesTable } from './series-table';
import { isMissed, summaryWords } from './series-words';

// chart.js touches the window, and is loaded only where a chart is shown.
const TrendChart = dynamic(() => import('@/components/charts/trend-chart'), {
  ssr: false,
  loading: () => <div className="h-56" />,
});

/** One quantity: its title, the drawing, what it says in words, and its points as a table. */
export function TrendPanel({
  organisationSlug,
  plantSlug,
  timeZone,
  point,
  pointName,
  quantity,
  from,
  to,
}: {
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
  point: string;
  pointName: string;
  quantity: SeriesKey;
  from: string;
  to: string;
}) {
  const asked = { organisationSlug, plantSlug, point, quantity, from, to };
  const { data, error, isPending, refetch } = useQuery({
    queryKey: ['series', asked],
    queryFn: ({ signal }) => fetchSeries(asked, signal),
  });
  const { label, unit } = data ?? { ...describe(quantity), unit: '' };
  return (
    <figure>
      <figcaption>
        <h2 className="text-xl">
          <Formula>{label}</Formula>{' '}
          {unit === '' ? null : (
            <span className="unit">
              <Formula>{unit}</Formula>
            </span>
          )}
          <span className="font-text text-base font-normal text-ink-soft">
            {' '}
            {pointName.toLowerCase()}
          </span>
        </h2>
        {data === undefined ? null : (
          <p className="text-sm text-ink-soft">
            <Formula>{summaryWords(data)}</Formula>
          </p>
        )}
      </figcaption>
      {isPending ? (
        <p
          role="status"
          className="grid h-56 place-items-center border-y border-rule text-ink-soft"
        >
          Reading the samples…
        </p>
      ) : error !== null ? (
        <div className="mt-2 grid gap-3">
          <Notice tone="act" title="Not read" role="alert">
            {error.message}
          </Notice>
          <Button className="justify-self-start" onClick={() => void refetch()}>
            Try again
          </Button>
        </div>
      ) : data.points.length === 0 ? (
        <p className="grid h-56 place-items-center border-y border-rule text-center text-ink-soft">
          No sample of these days has it. Choose a longer span or another point.
        </p>
      ) : (
        <>
          <TrendChart
            points={data.points.map(({ at, value, qualifier }) => ({
              at,
              value,
              isBelowLimit: qualifier === '<' || qualifier === 'nd',
              isMissed: isMissed(value, data.target),
            }))}
            target={data.target}
            gapMs={data.gapMs}
            from={dayStart(from, timeZone)}
            to={dayStart(to, timeZone, 1)}
            decimals={data.decimals}
            unit={data.unit}
            timeZone={timeZone}
            label={`${label}, ${pointName.toLowerCase()}, ${from} to ${to}. ${summaryWords(data)} ${formatNumber(data.points.length, 0)} points, listed in the table below.`}
          />
          <SeriesTable
            series={data}
            organisationSlug={organisationSlug}
            plantSlug={plantSlug}
            timeZone={timeZone}
          />
        </>
      )}
    </figure>
  );
}

function dayStart(day: string, timeZone: string, plusDays = 0): number {
  const date = addDays(parseISO(day), plusDays);
  return new TZDate(date.getFullYear(), date.getMonth(), date.getDate(), timeZone).getTime();
}
