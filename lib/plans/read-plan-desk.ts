import { database } from '@/db/client';
import { listDosingPoints, listSamplingPoints, listTargets } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
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
  const scope = [database(), actor.organisation.id, plant.id] as const;
  const [sample, dosing, points, targets] = await Promise.all([
    getSample(actor, plant, sampleId),
    listDosingPoints(...scope, clock()),
    listSamplingPoints(...scope),
    listTargets(...scope),
  ]);
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
