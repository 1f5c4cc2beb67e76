import type { Database } from '../client';
import type { PlanDoseRow, PlanRow } from '../tables/rows';
import type { ReagentKey, WaterAnalysis } from '@/lib/engine';
import type { Predicted } from '@/lib/plans/frozen';

export interface NewPlan {
  id: string;
  organisationId: string;
  plantId: string;
  sampleId: string;
  clientKey: string;
  targetQuantity: string;
  targetValue: number;
  engineVersion: string;
  constantsHash: string;
  analysis: WaterAnalysis;
  predicted: Predicted;
  reason: string;
  createdBy: string;
  doses: readonly { reagent: ReagentKey; doseMgL: number }[];
}

/** Keeps a plan with its doses; call inside a transaction. Returns the id kept under this client key. */
export async function insertPlan(db: Database, plan: NewPlan): Promise<string> {
  const inserted = await db<PlanRow>('plans')
    .insert({
      id: plan.id,
      organisation_id: plan.organisationId,
      plant_id: plan.plantId,
      sample_id: plan.sampleId,
      client_key: plan.clientKey,
      target_quantity: plan.targetQuantity,
      target_value: plan.targetValue,
      engine_version: plan.engineVersion,
      constants_hash: plan.constantsHash,
      analysis: JSON.stringify(plan.analysis),
      predicted: JSON.stringify(plan.predicted),
      reason: plan.reason,
      created_by: plan.createdBy,
    })
    .onConflict(['organisation_id', 'client_key'])
    .ignore()
    .returning('id');
  if (inserted.length === 0) {
    const kept = await db<PlanRow>('plans')
      .where({ organisation_id: plan.organisationId, client_key: plan.clientKey })
      .first('id');
    if (kept === undefined) throw new Error('A plan with this key vanished while it was saved.');
    return kept.id;
  }
  await db<PlanDoseRow>('plan_doses').insert(
    plan.doses.map(({ reagent, doseMgL }, position) => ({
      organisation_id: plan.organisationId,
      plan_id: plan.id,
      position,
      reagent,
      dose_mg_per_l: doseMgL,
    })),
  );
  return plan.id;
}

export interface KeptPlan {
  id: string;
  sampleId: string;
  pointName: string;
  takenAt: Date;
  status: PlanRow['status'];
  targetQuantity: string;
  targetValue: number;
  engineVersion: string;
  constantsHash: string;
  analysis: WaterAnalysis;
  predicted: Predicted;
  reason: string;
  createdBy: string;
  createdAt: Date;
  doses: { reagent: ReagentKey; doseMgL: number }[];
}

type PlanJoin = PlanRow & { person_name: string; point_name: string; taken_at: Date };

const plansOf = (db: Database, organisationId: string, plantId: string) =>
  db<PlanRow>('plans')
    .join('people', 'people.id', 'plans.created_by')
    .join('samples', 'samples.id', 'plans.sample_id')
    .join('sampling_points', 'sampling_points.id', 'samples.point_id')
    .where({ 'plans.organisation_id': organisationId, 'plans.plant_id': plantId })
    .select<PlanJoin[]>(
      'plans.*',
      'people.name as person_name',
      'sampling_points.name as point_name',
      'samples.taken_at',
    );

async function withDoses(
  db: Database,
  organisationId: string,
  plans: readonly PlanJoin[],
): Promise<KeptPlan[]> {
  const doses = await db<PlanDoseRow>('plan_doses')
    .where({ organisation_id: organisationId })
    .whereIn(
      'plan_id',
      plans.map(({ id }) => id),
    )
    .orderBy('position');
  return plans.map((row) => ({
    id: row.id,
    sampleId: row.sample_id,
    pointName: row.point_name,
    takenAt: row.taken_at,
    status: row.status,
    targetQuantity: row.target_quantity,
    targetValue: row.target_value,
    engineVersion: row.engine_version,
    constantsHash: row.constants_hash,
    // Written only by insertPlan, from these types.
    analysis: row.analysis as WaterAnalysis,
    predicted: row.predicted as Predicted,
    reason: row.reason,
    createdBy: row.person_name,
    createdAt: row.created_at,
    doses: doses
      .filter(({ plan_id }) => plan_id === row.id)
      .map(({ reagent, dose_mg_per_l }) => ({
        reagent: reagent as ReagentKey,
        doseMgL: dose_mg_per_l,
      })),
  }));
}

/** One plan of one plant, or nothing. */
export async function findPlan(
  db: Database,
  organisationId: string,
  plantId: string,
  planId: string,
): Promise<KeptPlan | undefined> {
  const rows = await plansOf(db, organisationId, plantId).where('plans.id', planId);
  const [plan] = await withDoses(db, organisationId, rows);
  return plan;
}

/** The newest plans of a plant. */
export async function listPlans(
  db: Database,
  organisationId: string,
  plantId: string,
  limit: number,
): Promise<KeptPlan[]> {
  const rows = await plansOf(db, organisationId, plantId)
    .orderBy('plans.created_at', 'desc')
    .limit(limit);
  return withDoses(db, organisationId, rows);
}

/** Plans of a plant before a place in the list, newest first. */
export async function listPlansBefore(
  db: Database,
  organisationId: string,
  plantId: string,
  { before, limit }: { before: readonly [at: Date, id: string] | null; limit: number },
): Promise<KeptPlan[]> {
  const query = plansOf(db, organisationId, plantId)
    // A place in the list is told to the millisecond, so the order must not look closer.
    .orderByRaw(`date_trunc('milliseconds', plans.created_at) desc, plans.id desc`)
    .limit(limit);
  if (before !== null) {
    void query.whereRaw(`(date_trunc('milliseconds', plans.created_at), plans.id) < (?, ?)`, [
      ...before,
    ]);
  }
  return withDoses(db, organisationId, await query);
}
