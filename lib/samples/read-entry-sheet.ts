import { listLatestValues } from '@/db/queries/latest-values';
import { readPlantSheet } from '@/db/queries/plant-sheet';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import type { Clock } from '@/lib/clock';
import { formatAge } from '@/lib/format';
import { localFromMoment } from '@/lib/plants/local-time';
import type { Plant } from '@/lib/plants/schema';
import { describeAt, writeValue } from './describe';
import type { EntryField, EntrySheet } from './entry-sheet';
import { isQuantityKey } from './quantities';

const MEMORY_MS = 400 * 86_400_000;

/** What the form needs to be filled in: the point's own list, each with its last value and usual range. */
export async function readEntrySheet(
  actor: Actor,
  plant: Plant,
  wantedPoint: string | undefined,
  clock: Clock,
): Promise<EntrySheet | null> {
  const now = clock();
  const { points, quantities, latest } = await inTenant(actor, async (db) => {
    const scope = [db, actor.organisation.id, plant.id] as const;
    return {
      ...(await readPlantSheet(...scope)),
      latest: await listLatestValues(...scope, new Date(now.getTime() - MEMORY_MS)),
    };
  });
  const point = points.find(({ slug }) => slug === wantedPoint) ?? points[0];
  if (point === undefined) return null;
  const fields = quantities
    .filter(({ pointId }) => pointId === point.id)
    .flatMap(({ quantity, unit, decimals, usualLow, usualHigh }): EntryField[] => {
      if (!isQuantityKey(quantity)) return [];
      const as = describeAt(quantity, { unit, decimals });
      const last = latest.find((v) => v.pointId === point.id && v.quantity === quantity);
      return [
        {
          quantity,
          label: as.label,
          unit,
          decimals,
          usualLow,
          usualHigh,
          last:
            last === undefined
              ? null
              : {
                  text: `${last.qualifier === '<' || last.qualifier === '>' ? last.qualifier : ''}${
                    last.enteredUnit === unit && last.enteredText !== null
                      ? last.enteredText
                      : writeValue(quantity, last.value, as)
                  }`,
                  age: formatAge(last.takenAt, now),
                },
        },
      ];
    });
  return {
    points: points.map(({ slug, name }) => ({ slug, name })),
    pointSlug: point.slug,
    pointName: point.name,
    takenAtLocal: localFromMoment(now, plant.timeZone),
    fields,
  };
}
