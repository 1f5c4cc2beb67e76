'use client';

import Link from 'next/link';
import { useMemo } from 'react';
import { DataTable, type PlainColumn } from '@/components/tables/data-table';
import { Formula } from '@/components/ui/formula';
import { paths } from '@/lib/paths';
import type { SampleCell, SampleTable, SampleTableRow } from '@/lib/samples/sample-rows';

/** One line a sample: when, where, what, by whom. */
export function SamplesTable({
  table,
  showPoint,
  organisationSlug,
  plantSlug,
}: {
  table: SampleTable;
  showPoint: boolean;
  organisationSlug: string;
  plantSlug: string;
}) {
  const columns = useMemo((): PlainColumn<SampleTableRow>[] => {
    const words = (id: string, header: string, value: (row: SampleTableRow) => string) => ({
      id,
      header,
      accessorFn: value,
    });
    return [
      {
        id: 'taken',
        header: 'Taken',
        cell: ({ row }) => (
          <Link
            href={paths.sample(organisationSlug, plantSlug, row.original.id)}
            className="inline-flex min-h-8 items-center"
          >
            {row.original.taken}
          </Link>
        ),
      },
      ...(showPoint ? [words('point', 'Point', (row) => row.point)] : []),
      ...table.columns.map(({ key, short, label, unit }): PlainColumn<SampleTableRow> => ({
        id: key,
        header: () => (
          <span className="block text-right" title={label}>
            <Formula>{short}</Formula>
            <span className="unit block">
              <Formula>{unit === '' ? '\u00a0' : unit}</Formula>
            </span>
          </span>
        ),
        cell: ({ row }) => <Cell cell={row.original.cells[key]} />,
      })),
      words('enteredBy', 'Entered by', (row) => row.enteredBy),
    ];
  }, [table.columns, showPoint, organisationSlug, plantSlug]);
  return (
    <DataTable
      label="Samples, newest first"
      columns={columns}
      rows={[...table.rows]}
      rowId={(row) => row.id}
    />
  );
}

const MISSED = {
  below: { sign: '▼', word: 'low' },
  above: { sign: '▲', word: 'high' },
} as const;

function Cell({ cell }: { cell: SampleCell | undefined }) {
  if (cell === undefined) return <span className="block text-right text-ink-soft">–</span>;
  const missed = cell.verdict === 'below' || cell.verdict === 'above' ? MISSED[cell.verdict] : null;
  return (
    <span className={`block text-right ${missed === null ? '' : 'font-semibold text-rust'}`}>
      {missed === null ? null : (
        <span className="mr-1 text-xs">
          <span aria-hidden="true">{missed.sign}</span> {missed.word}
        </span>
      )}
      <span className="figure">{cell.text}</span>
    </span>
  );
}
