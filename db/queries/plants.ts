import type { Database } from '../client';
import type {
  DosingPointRow,
  FeedSettingRow,
  PlantRow,
  PointQuantityRow,
  SamplingPointRow,
  ShiftNoteRow,
  TargetRow,
  TrainStepRow,
} from '../tables/rows';
import type {
  DosingPoint,
  Plant,
  PointQuantity,
  SamplingPoint,
  ShiftNote,
  Target,
  TrainStep,
} from '@/lib/plants/schema';

const toPlant = (row: PlantRow): Plant => ({
  id: row.id,
  slug: row.slug,
  name: row.name,
  sourceSummary: row.source_summary,
  timeZone: row.time_zone,
  designFlowMlPerD: row.design_flow_ml_per_d,
});

export async function listPlants(db: Database, organisationId: string): Promise<Plant[]> {
  const rows = await db<PlantRow>('plants')
    .where({ organisation_id: organisationId })
    .orderBy('position');
  return rows.map(toPlant);
}

export async function findPlant(
  db: Database,
  organisationId: string,
  slug: string,
): Promise<Plant | undefined> {
  const row = await db<PlantRow>('plants').where({ organisation_id: organisationId, slug }).first();
  return row && toPlant(row);
}

export async function listSamplingPoints(
  db: Database,
  organisationId: string,
  plantId: string,
): Promise<SamplingPoint[]> {
  const rows = await db<SamplingPointRow>('sampling_points')
    .where({ organisation_id: organisationId, plant_id: plantId })
    .orderBy('position');
  return rows.map((row) => ({
    id: row.id,
    slug: row.slug,
    name: row.name,
    kind: row.kind,
    position: row.position,
    sampleEveryH: row.sample_every_h,
  }));
}

/** The quantities of every point of a plant, in the order each point lists them. */
export async function listPointQuantities(
  db: Database,
  organisationId: string,
  plantId: string,
): Promise<PointQuantity[]> {
  const rows = await db<PointQuantityRow>('point_quantities')
    .where({ organisation_id: organisationId })
    .whereIn('point_id', pointIdsOf(db, organisationId, plantId))
    .orderBy(['point_id', 'position']);
  return rows.map((row) => ({
    pointId: row.point_id,
    quantity: row.quantity,
    unit: row.unit,
    decimals: row.decimals,
    usualLow: row.usual_low,
    usualHigh: row.usual_high,
  }));
}

export async function listTargets(
  db: Database,
  organisationId: string,
  plantId: string,
): Promise<Target[]> {
  const rows = await db<TargetRow>('targets')
    .where({ organisation_id: organisationId })
    .whereIn('point_id', pointIdsOf(db, organisationId, plantId))
    .orderBy('quantity');
  return rows.map(toTarget);
}

const toTarget = (row: TargetRow): Target => ({
  id: row.id,
  version: row.version,
  pointId: row.point_id,
  quantity: row.quantity,
  lowest: row.lowest,
  highest: row.highest,
  preferred: row.preferred,
  basis: row.basis,
});

/** One target of a plant, held until the transaction ends, or nothing. */
export async function lockTarget(
  db: Database,
  organisationId: string,
  plantId: string,
  targetId: string,
): Promise<Target | undefined> {
  const row = await db<TargetRow>('targets')
    .where({ organisation_id: organisationId, id: targetId })
    .whereIn('point_id', pointIdsOf(db, organisationId, plantId))
    .forUpdate()
    .first();
  return row && toTarget(row);
}

/** Writes new bounds under the next version. */
export async function updateTarget(
  db: Database,
  organisationId: string,
  target: Target,
  now: Date,
): Promise<Target> {
  const { lowest, highest, preferred, basis, version } = target;
  const next = version + 1;
  await db<TargetRow>('targets')
    .where({ organisation_id: organisationId, id: target.id })
    .update({ lowest, highest, preferred, basis, version: next, changed_at: now });
  return { ...target, version: next };
}

const pointIdsOf = (db: Database, organisationId: string, plantId: string) =>
  db<SamplingPointRow>('sampling_points')
    .where({ organisation_id: organisationId, plant_id: plantId })
    .select('id');

export async function listTrainSteps(
  db: Database,
  organisationId: string,
  plantId: string,
): Promise<TrainStep[]> {
  const rows = await db<TrainStepRow>('train_steps')
    .where({ organisation_id: organisationId, plant_id: plantId })
    .orderBy('position');
  return rows.map(({ id, position, kind, name }) => ({ id, position, kind, name }));
}

/** Every dosing point with the setting in force at `at`. */
export async function listDosingPoints(
  db: Database,
  organisationId: string,
  plantId: string,
  at: Date,
): Promise<DosingPoint[]> {
  const inForce = db<FeedSettingRow>('feed_settings')
    .distinctOn('dosing_point_id')
    .where('organisation_id', organisationId)
    .where('set_at', '<=', at)
    .orderBy([{ column: 'dosing_point_id' }, { column: 'set_at', order: 'desc' }])
    .as('in_force');
  const rows = await db<DosingPointRow>('dosing_points')
    .leftJoin(inForce, 'in_force.dosing_point_id', 'dosing_points.id')
    .where({
      'dosing_points.organisation_id': organisationId,
      'dosing_points.plant_id': plantId,
    })
    .orderBy('dosing_points.position')
    .select<(DosingPointRow & { dose_mg_per_l: number | null; set_at: Date | null })[]>(
      'dosing_points.*',
      'in_force.dose_mg_per_l',
      'in_force.set_at',
    );
  return rows.map((row) => ({
    id: row.id,
    trainStepId: row.train_step_id,
    reagent: row.reagent as DosingPoint['reagent'],
    productName: row.product_name,
    doseBasis: row.dose_basis,
    doseMgPerL: row.dose_mg_per_l,
    setAt: row.set_at,
  }));
}

export async function listShiftNotes(
  db: Database,
  organisationId: string,
  plantId: string,
  limit: number,
): Promise<ShiftNote[]> {
  const rows = await db<ShiftNoteRow>('shift_notes')
    .join('people', 'people.id', 'shift_notes.written_by')
    .where({ 'shift_notes.organisation_id': organisationId, plant_id: plantId })
    .orderBy('written_at', 'desc')
    .limit(limit)
    .select<(ShiftNoteRow & { author: string })[]>('shift_notes.*', 'people.name as author');
  return rows.map((row) => ({
    id: row.id,
    body: row.body,
    writtenAt: row.written_at,
    author: row.author,
  }));
}
