import { readPlantSheet } from '@/db/queries/plant-sheet';
import { listDosingPoints } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import type { Clock } from '@/lib/clock';
import type { Plant } from '@/lib/plants/schema';
import { getSample } from '@/lib/samples/get-sample';
import { measuredValues } from '@/lib/samples/measured-values';
import type { PlanDeskData } from './plan-desk';
import { TARGET_KEYS } from './quantities';

/** What the plan screen starts from: the sample, what the plant feeds, and what its finished water should be. */
export async function readPlanDesk(
  actor: Actor,
  plant: Plant,
  sampleId: string,
  clock: Clock,
): Promise<PlanDeskData> {
  const sample = await getSample(actor, plant, sampleId);
  const { dosing, points, targets } = await inTenant(actor, async (db) => {
    const scope = [db, actor.organisation.id, plant.id] as const;
    return {
      dosing: await listDosingPoints(...scope, clock()),
      ...(await readPlantSheet(...scope)),
    };
  });
  const finished = points.find(({ kind }) => kind === 'finished');
  return {
    sample: { id: sample.id, pointName: sample.pointName, takenAt: sample.takenAt },
    measured: measuredValues(sample.results),
    plantReagents: [
      ...new Set(dosing.flatMap(({ reagent }) => (reagent === null ? [] : [reagent]))),
    ],
    plantTargets: targets.flatMap(({ pointId, quantity, lowest, highest, preferred }) => {
      const key = TARGET_KEYS.find((candidate) => candidate === quantity);
      return pointId === finished?.id && key !== undefined
        ? [{ quantity: key, lowest, highest, preferred }]
        : [];
    }),
  };
}
