import { readPlantSheet, type PlantSheet } from '@/db/queries/plant-sheet';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { getPlant } from './read-plants';

/** Points, their quantities and targets of one of the actor's plants. Throws `notFound`. */
export async function readSheet(actor: Actor, plantSlug: string): Promise<PlantSheet> {
  const plant = await getPlant(actor, plantSlug);
  return inTenant(actor, (db) => readPlantSheet(db, actor.organisation.id, plant.id));
}
