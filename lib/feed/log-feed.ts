import { insertFeedEntry, listFeedEntries, type FeedEntry } from '@/db/queries/feed-log';
import { listDosingPoints } from '@/db/queries/plants';
import { recordChange } from '@/lib/audit/record-change';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError, notFound } from '@/lib/errors';
import { newId } from '@/lib/ids';
import { getPlant } from '@/lib/plants/read-plants';
import type { FeedEntryInput } from './schema';

const CLOCK_TOLERANCE_MS = 10 * 60_000;

/** Writes down what was really fed, once, whatever number of times it is sent. Throws `notFound`, `badInput`. */
export async function logFeed(
  actor: Actor,
  input: FeedEntryInput,
  clock: Clock = systemClock,
): Promise<{ entryId: string }> {
  const plant = await getPlant(actor, input.plantSlug);
  const fedTo = new Date(input.to);
  if (fedTo.getTime() > clock().getTime() + CLOCK_TOLERANCE_MS) {
    throw new AppError('badInput', 'What is still to be fed cannot be logged. Check the times.');
  }
  const ownId = newId('feedEntry');
  const organisationId = actor.organisation.id;
  const entryId = await inTenant(actor, async (db) => {
    const points = await listDosingPoints(db, organisationId, plant.id, clock());
    if (!points.some(({ id }) => id === input.dosingPointId)) throw notFound('dosing point');
    const kept = await insertFeedEntry(db, {
      id: ownId,
      organisationId,
      plantId: plant.id,
      dosingPointId: input.dosingPointId,
      clientKey: input.clientKey,
      fedFrom: new Date(input.from),
      fedTo,
      productKg: input.productKg,
      waterTreatedMl: input.waterTreatedMl,
      note: input.note,
      loggedBy: actor.personId,
    });
    if (kept === ownId) {
      const { dosingPointId, from, to, productKg } = input;
      await recordChange(
        db,
        actor,
        {
          action: 'feed.logged',
          subjectId: kept,
          detail: { dosingPointId, from, to, productKg },
        },
        clock,
      );
    }
    return kept;
  });
  return { entryId };
}

/** A page of a plant's feed log, newest first. */
export async function readFeedLog(
  actor: Actor,
  plantSlug: string,
  page: { before: readonly [Date, string] | null; limit: number },
): Promise<FeedEntry[]> {
  const plant = await getPlant(actor, plantSlug);
  return inTenant(actor, (db) => listFeedEntries(db, actor.organisation.id, plant.id, page));
}
