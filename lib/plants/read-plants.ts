import { cache } from 'react';
import { findPlant, listPlants } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { notFound } from '@/lib/errors';
import type { Plant } from './schema';

/** Named plants twice as well: here, and by the row policies of every table that names a plant. */
const sees = ({ plantIds }: Actor, { id }: Plant): boolean =>
  plantIds === null || plantIds.includes(id);

/** The works the actor sees, in the organisation's own order. */
export const readPlants = cache(async (actor: Actor): Promise<Plant[]> => {
  const plants = await inTenant(actor, (db) => listPlants(db, actor.organisation.id));
  return plants.filter((plant) => sees(actor, plant));
});

/** Throws `notFound` for a works that is not the actor's. */
export const getPlant = cache(async (actor: Actor, slug: string): Promise<Plant> => {
  const plant = await inTenant(actor, (db) => findPlant(db, actor.organisation.id, slug));
  if (plant === undefined || !sees(actor, plant)) throw notFound('works');
  return plant;
});
