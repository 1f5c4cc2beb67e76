import type { Database } from '../client';
import type { PersonRow, ResultRow, SampleIndexRow, SampleRow } from '../tables/rows';

export interface ListedSample {
  id: string;
  pointId: string;
  takenAt: Date;
  enteredBy: string;
  results: {
    quantity: string;
    text: string;
    unit: string;
    qualifier: ResultRow['qualifier'];
    value: number;
  }[];
  indices: Record<string, number>;
}

export interface SamplePage {
  samples: ListedSample[];
  total: number;
}

/** Samples of a plant before a place in the list, newest first: pages that stay whole while samples arrive. */
export async function listSamplesBefore(
  db: Database,
  organisationId: string,
  plantId: string,
  filter: { pointId?: string; before: readonly [at: Date, id: string] | null; limit: number },
): Promise<ListedSample[]> {
  const query = db<SampleRow>('samples as s')
    .join<PersonRow>('people as p', 'p.id', 's.entered_by')
    .where('s.organisation_id', organisationId)
    .where('s.plant_id', plantId);
  if (filter.pointId !== undefined) void query.where('s.point_id', filter.pointId);
  if (filter.before !== null)
    void query.whereRaw('(s.taken_at, s.id) < (?, ?)', [...filter.before]);
  const rows = await query
    .orderBy([
      { column: 's.taken_at', order: 'desc' },
      { column: 's.id', order: 'desc' },
    ])
    .limit(filter.limit)
    .select<(Pick<SampleRow, 'id' | 'point_id' | 'taken_at'> & { person_name: string })[]>(
      's.id',
      's.point_id',
      's.taken_at',
      'p.name as person_name',
    );
  return withResults(db, organisationId, rows);
}

/** One page of a plant's samples, newest first, with all that belongs to them: four queries, whatever the page. */
export async function listSamplePage(
  db: Database,
  organisationId: string,
  plantId: string,
  filter: { pointId?: string; limit: number; offset: number },
): Promise<SamplePage> {
  const filtered = () => {
    const query = db<SampleRow>('samples as s')
      .where('s.organisation_id', organisationId)
      .where('s.plant_id', plantId);
    return filter.pointId === undefined ? query : query.where('s.point_id', filter.pointId);
  };
  const rows = await filtered()
    .join<PersonRow>('people as p', 'p.id', 's.entered_by')
    // The id breaks ties, so that no sample falls between two pages.
    .orderBy([{ column: 's.taken_at', order: 'desc' }, { column: 's.id' }])
    .limit(filter.limit)
    .offset(filter.offset)
    .select<(Pick<SampleRow, 'id' | 'point_id' | 'taken_at'> & { person_name: string })[]>(
      's.id',
      's.point_id',
      's.taken_at',
      'p.name as person_name',
    );
  const counted = await filtered().count<{ count: number }[]>('* as count');
  return {
    total: counted[0]?.count ?? 0,
    samples: await withResults(db, organisationId, rows),
  };
}

/** Results and indices of all the rows in two queries. */
async function withResults(
  db: Database,
  organisationId: string,
  rows: readonly (Pick<SampleRow, 'id' | 'point_id' | 'taken_at'> & { person_name: string })[],
): Promise<ListedSample[]> {
  const ids = rows.map(({ id }) => id);
  const results = await db<ResultRow>('results')
    .where({ organisation_id: organisationId })
    .whereIn('sample_id', ids);
  const indices = await db<SampleIndexRow>('sample_indices')
    .where({ organisation_id: organisationId })
    .whereIn('sample_id', ids);
  return rows.map((row) => ({
    id: row.id,
    pointId: row.point_id,
    takenAt: row.taken_at,
    enteredBy: row.person_name,
    results: results
      .filter(({ sample_id }) => sample_id === row.id)
      .map((result) => ({
        quantity: result.quantity,
        text: result.entered_text,
        unit: result.entered_unit,
        qualifier: result.qualifier,
        value: result.value,
      })),
    indices: Object.fromEntries(
      indices
        .filter(({ sample_id }) => sample_id === row.id)
        .map(({ quantity, value }) => [quantity, value]),
    ),
  }));
}
