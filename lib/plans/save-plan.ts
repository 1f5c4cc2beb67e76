import { insertPlan } from '@/db/queries/plans';
import { recordChange } from '@/lib/audit/record-change';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { applyDose, CONSTANTS_HASH, ENGINE_VERSION } from '@/lib/engine';
import { AppError } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { getPlant } from '@/lib/plants/read-plants';
import { getSample } from '@/lib/samples/get-sample';
import { measuredValues } from '@/lib/samples/measured-values';
import { solveSample } from '@/lib/samples/solve-sample';
import { planQuantitiesOf } from './quantities';
import type { PlanInput } from './schema';

/** Browser and server run the same code; only the last bits of exp and log may differ between their engines. */
const PREVIEW_TOLERANCE_PH = 1e-6;

/**
 * Solves the plan again on the server and keeps that answer. Throws `engineRefused` with the engine's sentence, and
 * `conflict` when what the person saw is not what the server finds.
 */
export async function savePlan(actor: Actor, input: PlanInput): Promise<{ planId: string }> {
  const plant = await getPlant(actor, input.plantSlug);
  const sample = await getSample(actor, plant, input.sampleId);
  const before = solveSample(measuredValues(sample.results));
  if (!before.ok) throw new AppError('engineRefused', before.refusal);
  const after = applyDose(before.water, { reagent: input.reagent, doseMgL: input.doseMgL });
  if (!after.ok) throw new AppError('engineRefused', after.message);
  const { previewedPH = after.water.pH } = input;
  if (Math.abs(after.water.pH - previewedPH) > PREVIEW_TOLERANCE_PH) {
    throw new AppError(
      'conflict',
      'The plan on your screen no longer matches this sample. Load the page again and look at the new figures before saving.',
    );
  }
  const doses = [{ reagent: input.reagent, doseMgL: input.doseMgL }];
  const ownId = newId('plan');
  const planId = await inTenant(actor, async (db) => {
    const kept = await insertPlan(db, {
      id: ownId,
      organisationId: actor.organisation.id,
      plantId: plant.id,
      sampleId: sample.id,
      clientKey: input.clientKey,
      targetQuantity: input.target.quantity,
      targetValue: input.target.value,
      engineVersion: ENGINE_VERSION,
      constantsHash: CONSTANTS_HASH,
      analysis: before.analysis,
      predicted: {
        before: planQuantitiesOf(before.water),
        equilibrium: planQuantitiesOf(after.water),
      },
      reason: input.reason,
      createdBy: actor.personId,
      doses,
    });
    // A repeated send finds the first plan, and its entry.
    if (kept === ownId) {
      await recordChange(db, actor, {
        action: 'plan.saved',
        subjectId: kept,
        detail: {
          sampleId: sample.id,
          target: input.target,
          doses,
          engineVersion: ENGINE_VERSION,
          reason: input.reason,
        },
      });
    }
    return kept;
  });
  return { planId };
}
