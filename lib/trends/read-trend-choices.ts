import { readPlantSheet } from '@/db/queries/plant-sheet';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import type { Clock } from '@/lib/clock';
import { localFromMoment } from '@/lib/plants/local-time';
import type { Plant } from '@/lib/plants/schema';
import { describe, isSeriesKey, type SeriesKey } from '@/lib/samples/describe';
import { INDEX_KEYS } from '@/lib/samples/indices';
import type { TrendChoices } from './choices';

const PANELS_AT_FIRST = 3;
/** A point is solved when it lists what the engine needs. */
const NEEDED = ['temperature', 'pH', 'alkalinity'] as const;

/** Points with their quantities, and the indices of those whose water is solved; targets lead. */
export async function readTrendChoices(
  actor: Actor,
  plant: Plant,
  clock: Clock,
): Promise<TrendChoices> {
  const { points, quantities, targets } = await inTenant(actor, (db) =>
    readPlantSheet(db, actor.organisation.id, plant.id),
  );
  return {
    today: localFromMoment(clock(), plant.timeZone).slice(0, 10),
    points: points.map(({ id, slug, name }) => {
      const own = quantities.filter(({ pointId }) => pointId === id).map((row) => row.quantity);
      const isSolved = NEEDED.every((key) => own.includes(key));
      const keys = [...own, ...(isSolved ? INDEX_KEYS : [])].filter(isSeriesKey);
      const aimed = targets.filter(({ pointId }) => pointId === id).map((row) => row.quantity);
      const leading: SeriesKey[] = ['pH', ...(isSolved ? (['calciteIndex'] as const) : [])];
      const order = [...leading, ...aimed, ...keys];
      return {
        slug,
        name,
        quantities: keys.map((key) => ({ key, label: describe(key).label })),
        first: [...new Set(order)]
          .filter(isSeriesKey)
          .filter((key) => keys.includes(key))
          .slice(0, PANELS_AT_FIRST),
      };
    }),
  };
}
