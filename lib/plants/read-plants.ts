import { cache } from 'react';
import { findPlant, listPlants } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { notFound } from '@/lib/errors';
import type { Plant } from './schema';

/** The works of the actor's organisation, in its own order. */
export const readPlants = cache((actor: Actor): Promise<Plant[]> =>
  inTenant(actor, (db) => listPlants(db, actor.organisation.id)),
);

/** Throws `notFound` for a works that is not the actor's. */
export const getPlant = cache(async (actor: Actor, slug: string): Promise<Plant> => {
  const plant = await inTenant(actor, (db) => findPlant(db, actor.organisation.id, slug));
  if (plant === undefined) throw notFound('works');
  return plant;
});
