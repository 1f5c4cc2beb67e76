import type { Knex } from 'knex';

/** How one column is filled: its name, its type in PostgreSQL, and its value from a thing. */
export interface Column<Thing> {
  readonly name: string;
  readonly type:
    'text' | 'uuid' | 'boolean' | 'integer' | 'double precision' | 'timestamptz' | 'jsonb';
  readonly of: (thing: Thing) => string | number | boolean | Date | null;
}

/** Rows a statement; large enough to be quick, small enough to keep the text of one in memory. */
const ROWS_AT_ONCE = 5000;

/** Inserts all things in as few statements as sense allows: one array a column, unnested by the server. */
export async function insertRows<Thing>(
  db: Knex,
  table: string,
  columns: readonly Column<Thing>[],
  things: readonly Thing[],
): Promise<void> {
  const arrays = columns.map(({ type }) => `?::${type}[]`).join(', ');
  const names = columns.map(() => '??').join(', ');
  for (let start = 0; start < things.length; start += ROWS_AT_ONCE) {
    const some = things.slice(start, start + ROWS_AT_ONCE);
    await db.raw(`insert into ?? (${names}) select * from unnest(${arrays})`, [
      table,
      ...columns.map(({ name }) => name),
      ...columns.map(({ of }) => some.map(of) as Knex.Value),
    ]);
  }
}
