import type { Database } from '@/db/client';
import { listPlants } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
import { AppError } from '@/lib/errors';

/** Throws `badInput` unless every plant named is one the actor sees. Null names all, which only who sees all may give. */
export async function checkPlantIds(
  db: Database,
  actor: Actor,
  plantIds: readonly string[] | null,
): Promise<void> {
  if (plantIds === null) {
    if (actor.plantIds === null) return;
    throw new AppError('forbidden', 'You see some plants only, and can open no more to others.');
  }
  if (plantIds.length === 0) throw new AppError('badInput', 'Name at least one plant.');
  const seen = new Set((await listPlants(db, actor.organisation.id)).map(({ id }) => id));
  if (!plantIds.every((id) => seen.has(id)))
    throw new AppError('badInput', 'There is no such plant.');
}
