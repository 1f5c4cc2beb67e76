'use client';

import {
  FlexRender,
  tableFeatures,
  useTable,
  type ColumnDef,
  type RowData,
} from '@tanstack/react-table';

/** Sorting, filtering and paging happen on the server; the table itself only lays rows out. */
export const PLAIN_TABLE = tableFeatures({});

export type PlainColumn<Row extends RowData> = ColumnDef<typeof PLAIN_TABLE, Row>;

/** A ruled table with a head that stays, in a region of its own that scrolls when it must. */
export function DataTable<Row extends RowData>({
  label,
  columns,
  rows,
  rowId,
}: {
  label: string;
  columns: PlainColumn<Row>[];
  rows: Row[];
  rowId: (row: Row) => string;
}) {
  const table = useTable({ features: PLAIN_TABLE, columns, data: rows, getRowId: rowId });
  return (
    <div
      className="max-h-[75vh] overflow-auto border-y border-rule-strong print:max-h-none"
      tabIndex={0}
      role="region"
      aria-label={label}
    >
      <table className="w-full border-separate border-spacing-0">
        <thead>
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id}>
              {group.headers.map((header) => (
                <th
                  key={header.id}
                  scope="col"
                  className="sticky top-0 border-b border-rule-strong bg-chalk-sheet px-2 py-2 text-left align-bottom text-sm font-normal whitespace-nowrap text-ink-soft first:pl-0"
                >
                  <FlexRender header={header} />
                </th>
              ))}
            </tr>
          ))}
        </thead>
        <tbody>
          {table.getRowModel().rows.map((row) => (
            <tr key={row.id} className="hover:bg-chalk-shade">
              {row.getAllCells().map((cell) => (
                <td
                  key={cell.id}
                  className="border-b border-rule px-2 py-1.5 whitespace-nowrap first:pl-0"
                >
                  <FlexRender cell={cell} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
