import { readPlantSheet } from '@/db/queries/plant-sheet';
import { listSamplesBefore, type ListedSample } from '@/db/queries/sample-list';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { notFound } from '@/lib/errors';
import { getPlant } from '@/lib/plants/read-plants';

/** Samples before a place in the list, newest first, of one point (by slug) or of all. Throws `notFound`. */
export async function listSamplesFrom(
  actor: Actor,
  plantSlug: string,
  asked: { point: string | undefined; before: readonly [Date, string] | null; limit: number },
): Promise<ListedSample[]> {
  const plant = await getPlant(actor, plantSlug);
  return inTenant(actor, async (db) => {
    const scope = [db, actor.organisation.id, plant.id] as const;
    const { before, limit } = asked;
    if (asked.point === undefined) return listSamplesBefore(...scope, { before, limit });
    const { points } = await readPlantSheet(...scope);
    const point = points.find(({ slug }) => slug === asked.point);
    if (point === undefined) throw notFound('sampling point');
    return listSamplesBefore(...scope, { pointId: point.id, before, limit });
  });
}
