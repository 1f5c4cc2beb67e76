import { readPlantSheet } from '@/db/queries/plant-sheet';
import { insertSample } from '@/db/queries/samples';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { systemClock, type Clock } from '@/lib/clock';
import { CONSTANTS_HASH, ENGINE_VERSION } from '@/lib/engine';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { momentFromLocal } from '@/lib/plants/local-time';
import { getPlant } from '@/lib/plants/read-plants';
import { measuredValues } from './measured-values';
import type { SampleToKeep } from './schema';
import { solveSample, type SampleSolution } from './solve-sample';

/** A clock that runs ahead by a few minutes is no reason to refuse a sample. */
const CLOCK_TOLERANCE_MS = 10 * 60_000;

/**
 * Keeps a sample and what the engine makes of it, once, whatever number of times the form sends it.
 * Throws `notFound` for a plant or point that is not the actor's, `badInput` for an impossible time.
 */
export async function saveSample(
  actor: Actor,
  input: SampleToKeep,
  clock: Clock = systemClock,
): Promise<{ sampleId: string }> {
  const plant = await getPlant(actor, input.plantSlug);
  const { points, quantities } = await inTenant(actor, (db) =>
    readPlantSheet(db, actor.organisation.id, plant.id),
  );
  const point = points.find(({ slug }) => slug === input.pointSlug);
  if (point === undefined) throw notFound('sampling point');
  const takenAt = momentFromLocal(input.takenAtLocal, plant.timeZone);
  if (takenAt === null) {
    throw new AppError(
      'badInput',
      `There was no ${input.takenAtLocal.replace('T', ', ')} at this plant.`,
    );
  }
  if (takenAt.getTime() > clock().getTime() + CLOCK_TOLERANCE_MS) {
    throw new AppError(
      'badInput',
      'The sample would be taken in the future. Check the day and time.',
    );
  }
  const listed = new Set(
    quantities.filter(({ pointId }) => pointId === point.id).map(({ quantity }) => quantity),
  );
  const stray = input.results.find(({ quantity }) => !listed.has(quantity));
  if (stray !== undefined) {
    throw new AppError('badInput', `${point.name} does not list ${stray.quantity}.`);
  }
  const sampleId = await inTenant(actor, (db) =>
    insertSample(db, {
      id: newId('sample'),
      organisationId: actor.organisation.id,
      plantId: plant.id,
      pointId: point.id,
      clientKey: input.clientKey,
      takenAt,
      enteredBy: actor.personId,
      comment: input.comment,
      results: input.results,
      solution: solutionToKeep(solveSample(measuredValues(input.results))),
    }),
  );
  return { sampleId };
}

/** What is stored of a solution; nothing when the sample has too little in it to be asked about. */
export function solutionToKeep(solution: SampleSolution) {
  if (solution.analysis === null) return null;
  const evidence = {
    engineVersion: ENGINE_VERSION,
    constantsHash: CONSTANTS_HASH,
    analysis: solution.analysis,
  };
  return solution.ok
    ? { ...evidence, assumptions: solution.assumptions, refusal: null, indices: solution.indices }
    : { ...evidence, assumptions: [], refusal: solution.refusal, indices: {} };
}
