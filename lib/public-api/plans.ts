import * as z from 'zod';
import type { KeptPlan } from '@/db/queries/plans';
import { page, pageOf, pageQuery, readCursor } from '@/lib/api/cursor';
import { operation } from '@/lib/api/operation';
import { cautionsFor } from '@/lib/plans/cautions';
import { getPlan, readPlansFrom } from '@/lib/plans/read-plans';
import { savePlan } from '@/lib/plans/save-plan';
import { planInput } from '@/lib/plans/schema';
import { getPlant } from '@/lib/plants/read-plants';
import { madeAnswer, planAnswer } from './answers';

/** No dose leaves without its cautions. */
const told = (plan: KeptPlan) => ({
  ...plan,
  takenAt: plan.takenAt.toISOString(),
  createdAt: plan.createdAt.toISOString(),
  cautions: [...new Set(plan.doses.flatMap(({ reagent }) => cautionsFor(reagent)))],
});

export const listPlans = operation({
  id: 'listPlans',
  method: 'get',
  path: '/{org}/plants/{plant}/plans',
  summary: 'Plans of a plant, newest first',
  permission: 'plan.read',
  query: z.strictObject(pageQuery),
  answer: pageOf(planAnswer),
  run: async (actor, { params, query }) => {
    const before = readCursor(query.cursor);
    const plant = await getPlant(actor, params['plant'] ?? '');
    const read = await readPlansFrom(actor, plant, { before, limit: query.limit + 1 });
    const { items, next } = page(read, query.limit, ({ createdAt, id }) => [createdAt, id]);
    return { answer: { items: items.map(told), next } };
  },
});

export const readPlan = operation({
  id: 'readPlan',
  method: 'get',
  path: '/{org}/plants/{plant}/plans/{plan}',
  summary: 'One plan with its doses and what the engine predicts',
  permission: 'plan.read',
  query: z.strictObject({}),
  answer: planAnswer,
  run: async (actor, { params }) => {
    const plant = await getPlant(actor, params['plant'] ?? '');
    return { answer: told(await getPlan(actor, plant, params['plan'] ?? '')) };
  },
});

export const createPlan = operation({
  id: 'createPlan',
  method: 'post',
  path: '/{org}/plants/{plant}/plans',
  summary: 'Keep a plan: one reagent into one sample’s water',
  description:
    'The server solves the plan and keeps its own answer. `previewedPH`, if given, must agree with it.',
  permission: 'plan.write',
  query: z.strictObject({}),
  body: planInput.omit({ plantSlug: true, clientKey: true }),
  answer: madeAnswer,
  creates: true,
  run: async (actor, { params, body, clientKey }) => {
    const plantSlug = params['plant'] ?? '';
    const { planId } = await savePlan(actor, { ...body, plantSlug, clientKey });
    return { answer: { id: planId } };
  },
});
