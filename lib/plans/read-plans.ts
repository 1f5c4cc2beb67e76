import { findPlan, listPlans, listPlansBefore, type KeptPlan } from '@/db/queries/plans';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { notFound } from '@/lib/errors';
import type { Plant } from '@/lib/plants/schema';

const PLANS_SHOWN = 100;

/** Throws `notFound` for a plan that is not of this plant. */
export async function getPlan(actor: Actor, plant: Plant, planId: string): Promise<KeptPlan> {
  const plan = await inTenant(actor, (db) => findPlan(db, actor.organisation.id, plant.id, planId));
  if (plan === undefined) throw notFound('plan');
  return plan;
}

/** The newest plans of a plant, newest first. */
export const readPlans = (actor: Actor, plant: Plant): Promise<KeptPlan[]> =>
  inTenant(actor, (db) => listPlans(db, actor.organisation.id, plant.id, PLANS_SHOWN));

/** Plans before a place in the list, newest first. */
export const readPlansFrom = (
  actor: Actor,
  plant: Plant,
  asked: { before: readonly [Date, string] | null; limit: number },
): Promise<KeptPlan[]> =>
  inTenant(actor, (db) => listPlansBefore(db, actor.organisation.id, plant.id, asked));
