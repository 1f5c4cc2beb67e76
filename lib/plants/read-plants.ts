import { cache } from 'react';
import { database } from '@/db/client';
import { findPlant, listPlants } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
import { notFound } from '@/lib/errors';
import type { Plant } from './schema';

/** The works of the actor's organisation, in its own order. */
export const readPlants = cache((actor: Actor): Promise<Plant[]> =>
  listPlants(database(), actor.organisation.id),
);

/** Throws `notFound` for a works that is not the actor's. */
export const getPlant = cache(async (actor: Actor, slug: string): Promise<Plant> => {
  const plant = await findPlant(database(), actor.organisation.id, slug);
  if (plant === undefined) throw notFound('works');
  return plant;
});
