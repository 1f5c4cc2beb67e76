'use client';

import Link from 'next/link';
import { useState } from 'react';
import { formatDayTime, formatNumber } from '@/lib/format';
import { paths } from '@/lib/paths';
import type { Series } from '@/lib/trends/schema';
import { isMissed } from './series-words';

const QUALIFIER_SIGN = { '': '', '<': '<', '>': '>', nd: 'not detected at ', e: '≈' } as const;

/** The same points as rows, newest first; built only once it is opened. */
export function SeriesTable({
  series,
  organisationSlug,
  plantSlug,
  timeZone,
}: {
  series: Series;
  organisationSlug: string;
  plantSlug: string;
  timeZone: string;
}) {
  const [isOpen, setOpen] = useState(false);
  const { points, count, decimals, target } = series;
  return (
    <details
      className="screen-only border-b border-rule"
      onToggle={(event) => setOpen(event.currentTarget.open)}
    >
      <summary className="flex min-h-touch items-center text-sm text-verdigris">
        ▸ {pointWords(points.length, count)} as a table
      </summary>
      {isOpen ? (
        <div
          className="max-h-80 max-w-2xl overflow-auto pb-3"
          tabIndex={0}
          role="region"
          aria-label={`${series.label} as a table`}
        >
          <table className="w-full">
            <thead>
              <tr className="text-left text-sm text-ink-soft">
                <th scope="col" className="font-normal">
                  Taken
                </th>
                <th scope="col" className="pl-4 text-right font-normal">
                  {series.label}
                </th>
                <th scope="col" className="pl-4 font-normal">
                  Target
                </th>
              </tr>
            </thead>
            <tbody className="ruled">
              {[...points].reverse().map(({ at, value, qualifier, sampleId }) => (
                <tr key={sampleId}>
                  <td className="py-1">
                    <Link href={paths.sample(organisationSlug, plantSlug, sampleId)}>
                      {formatDayTime(new Date(at), timeZone)}
                    </Link>
                  </td>
                  <td className="figure py-1 pl-4 text-right">
                    {QUALIFIER_SIGN[qualifier]}
                    {formatNumber(value, decimals)}
                  </td>
                  <td className="py-1 pl-4 text-sm">
                    {target === null ? (
                      '–'
                    ) : isMissed(value, target) ? (
                      <strong className="text-rust">missed</strong>
                    ) : (
                      'within'
                    )}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      ) : null}
    </details>
  );
}

function pointWords(shown: number, count: number): string {
  if (shown < count) return `${shown} of ${count} points`;
  return count === 1 ? 'This one point' : `These ${count} points`;
}
