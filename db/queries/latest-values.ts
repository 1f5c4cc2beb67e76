import type { Database } from '../client';
import type { ResultRow, SampleIndexRow, SampleRow } from '../tables/rows';

export interface LatestValue {
  pointId: string;
  sampleId: string;
  takenAt: Date;
  quantity: string;
  /** Canonical unit. */
  value: number;
  /** As written; null for an index, which nobody wrote. */
  enteredText: string | null;
  enteredUnit: string | null;
  qualifier: ResultRow['qualifier'];
}

type Latest = Pick<SampleRow, 'point_id' | 'taken_at'> & {
  sample_id: string;
  quantity: string;
  value: number;
  entered_text: string | null;
  entered_unit: string | null;
  qualifier: ResultRow['qualifier'] | null;
};

/** The newest result and the newest index of every quantity at every point of a plant, not older than `since`. */
export async function listLatestValues(
  db: Database,
  organisationId: string,
  plantId: string,
  since: Date,
): Promise<LatestValue[]> {
  const newest = <Row extends ResultRow | SampleIndexRow>(table: 'results' | 'sample_indices') =>
    db<Row>(`${table} as r`)
      .join('samples as s', 's.id', 'r.sample_id')
      .distinctOn('s.point_id', 'r.quantity')
      .where('s.organisation_id', organisationId)
      .where('s.plant_id', plantId)
      .where('s.taken_at', '>=', since)
      .orderBy([
        { column: 's.point_id' },
        { column: 'r.quantity' },
        { column: 's.taken_at', order: 'desc' },
      ])
      .select('s.point_id', 's.taken_at', 'r.sample_id', 'r.quantity', 'r.value');
  const results = await newest<ResultRow>('results').select<Latest[]>(
    'r.entered_text',
    'r.entered_unit',
    'r.qualifier',
  );
  const indices = await newest<SampleIndexRow>('sample_indices').select<Latest[]>();
  return [...results, ...indices].map((row) => ({
    pointId: row.point_id,
    sampleId: row.sample_id,
    takenAt: row.taken_at,
    quantity: row.quantity,
    value: row.value,
    enteredText: row.entered_text ?? null,
    enteredUnit: row.entered_unit ?? null,
    qualifier: row.qualifier ?? '',
  }));
}
