import type { Database } from '../client';
import type { ResultRow, SampleIndexRow, SampleRow, SolutionRow } from '../tables/rows';

export interface NewSample {
  id: string;
  organisationId: string;
  plantId: string;
  pointId: string;
  clientKey: string;
  takenAt: Date;
  enteredBy: string;
  comment: string;
  results: readonly {
    quantity: string;
    text: string;
    unit: string;
    qualifier: ResultRow['qualifier'];
    value: number;
  }[];
  solution: {
    engineVersion: string;
    constantsHash: string;
    analysis: unknown;
    assumptions: readonly string[];
    refusal: string | null;
    indices: Readonly<Record<string, number>>;
  } | null;
}

/**
 * Keeps a sample with its results and solution. Call inside a transaction. Returns the id kept: the new one, or that of
 * the sample already kept under the same client key.
 */
export async function insertSample(db: Database, sample: NewSample): Promise<string> {
  const inserted = await db<SampleRow>('samples')
    .insert({
      id: sample.id,
      organisation_id: sample.organisationId,
      plant_id: sample.plantId,
      point_id: sample.pointId,
      client_key: sample.clientKey,
      taken_at: sample.takenAt,
      entered_by: sample.enteredBy,
      comment: sample.comment,
    })
    .onConflict(['organisation_id', 'client_key'])
    .ignore()
    .returning('id');
  if (inserted.length === 0) {
    const kept = await db<SampleRow>('samples')
      .where({ organisation_id: sample.organisationId, client_key: sample.clientKey })
      .first('id');
    if (kept === undefined) throw new Error('A sample with this key vanished while it was saved.');
    return kept.id;
  }
  await db<ResultRow>('results').insert(
    sample.results.map((result) => ({
      organisation_id: sample.organisationId,
      sample_id: sample.id,
      quantity: result.quantity,
      entered_text: result.text,
      entered_unit: result.unit,
      qualifier: result.qualifier,
      value: result.value,
    })),
  );
  if (sample.solution !== null) await insertSolution(db, sample, sample.solution);
  return sample.id;
}

async function insertSolution(
  db: Database,
  sample: NewSample,
  solution: NonNullable<NewSample['solution']>,
): Promise<void> {
  await db<SolutionRow>('solutions').insert({
    sample_id: sample.id,
    organisation_id: sample.organisationId,
    engine_version: solution.engineVersion,
    constants_hash: solution.constantsHash,
    analysis: JSON.stringify(solution.analysis),
    assumptions: JSON.stringify(solution.assumptions),
    refusal: solution.refusal,
  });
  const indices = Object.entries(solution.indices);
  if (indices.length === 0) return;
  await db<SampleIndexRow>('sample_indices').insert(
    indices.map(([quantity, value]) => ({
      organisation_id: sample.organisationId,
      sample_id: sample.id,
      quantity,
      value,
    })),
  );
}

export interface KeptSample {
  id: string;
  pointId: string;
  pointSlug: string;
  pointName: string;
  takenAt: Date;
  enteredAt: Date;
  enteredBy: string;
  comment: string;
  results: {
    quantity: string;
    text: string;
    unit: string;
    qualifier: ResultRow['qualifier'];
    value: number;
  }[];
  indices: Record<string, number>;
  solution: {
    engineVersion: string;
    constantsHash: string;
    assumptions: readonly string[];
    refusal: string | null;
  } | null;
}

/** One sample of one plant with all that belongs to it, or nothing. */
export async function findSample(
  db: Database,
  organisationId: string,
  plantId: string,
  sampleId: string,
): Promise<KeptSample | undefined> {
  const sample = await db<SampleRow>('samples')
    .join('sampling_points', 'sampling_points.id', 'samples.point_id')
    .join('people', 'people.id', 'samples.entered_by')
    .where({
      'samples.organisation_id': organisationId,
      'samples.plant_id': plantId,
      'samples.id': sampleId,
    })
    .first<
      (SampleRow & { point_slug: string; point_name: string; person_name: string }) | undefined
    >(
      'samples.*',
      'sampling_points.slug as point_slug',
      'sampling_points.name as point_name',
      'people.name as person_name',
    );
  if (sample === undefined) return undefined;
  const own = { organisation_id: organisationId, sample_id: sampleId };
  const results = await db<ResultRow>('results').where(own);
  const indices = await db<SampleIndexRow>('sample_indices').where(own);
  const solution = await db<SolutionRow>('solutions').where(own).first();
  return {
    id: sample.id,
    pointId: sample.point_id,
    pointSlug: sample.point_slug,
    pointName: sample.point_name,
    takenAt: sample.taken_at,
    enteredAt: sample.entered_at,
    enteredBy: sample.person_name,
    comment: sample.comment,
    results: results.map((row) => ({
      quantity: row.quantity,
      text: row.entered_text,
      unit: row.entered_unit,
      qualifier: row.qualifier,
      value: row.value,
    })),
    indices: Object.fromEntries(indices.map(({ quantity, value }) => [quantity, value])),
    solution:
      solution === undefined
        ? null
        : {
            engineVersion: solution.engine_version,
            constantsHash: solution.constants_hash,
            assumptions: solution.assumptions as string[],
            refusal: solution.refusal,
          },
  };
}
