import type { Database } from '../client';
import type { ResultRow, SampleIndexRow } from '../tables/rows';

export interface SeriesPointRow {
  sampleId: string;
  at: Date;
  /** Canonical unit. */
  value: number;
  qualifier: ResultRow['qualifier'];
}

type Joined = {
  sample_id: string;
  taken_at: Date;
  value: number;
  qualifier?: ResultRow['qualifier'];
};

/** Whose series, of what, at which point, from a moment up to but without another. */
type SeriesArguments = [
  organisationId: string,
  pointId: string,
  quantity: string,
  from: Date,
  to: Date,
];

const between = <Row extends ResultRow | SampleIndexRow>(
  db: Database,
  table: 'results' | 'sample_indices',
  ...[organisationId, pointId, quantity, from, to]: SeriesArguments
) =>
  db<Row>(`${table} as r`)
    .join('samples as s', 's.id', 'r.sample_id')
    .where('s.organisation_id', organisationId)
    .where('s.point_id', pointId)
    .where('r.quantity', quantity)
    .where('s.taken_at', '>=', from)
    .where('s.taken_at', '<', to)
    .orderBy('s.taken_at');

const toPoint = (row: Joined): SeriesPointRow => ({
  sampleId: row.sample_id,
  at: row.taken_at,
  value: row.value,
  qualifier: row.qualifier ?? '',
});

/** Every measured value of one quantity at one point, oldest first. */
export async function listResultSeries(
  db: Database,
  ...asked: SeriesArguments
): Promise<SeriesPointRow[]> {
  const rows = await between<ResultRow>(db, 'results', ...asked).select<Joined[]>(
    'r.sample_id',
    's.taken_at',
    'r.value',
    'r.qualifier',
  );
  return rows.map(toPoint);
}

/** Every value of one index at one point, oldest first. */
export async function listIndexSeries(
  db: Database,
  ...asked: SeriesArguments
): Promise<SeriesPointRow[]> {
  const rows = await between<SampleIndexRow>(db, 'sample_indices', ...asked).select<Joined[]>(
    'r.sample_id',
    's.taken_at',
    'r.value',
  );
  return rows.map(toPoint);
}
