import { findPlan, listPlans, type KeptPlan } from '@/db/queries/plans';
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
