import { findSample, type KeptSample } from '@/db/queries/samples';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { notFound } from '@/lib/errors';
import type { Plant } from '@/lib/plants/schema';

/** Throws `notFound` for a sample that is not of this plant. */
export async function getSample(actor: Actor, plant: Plant, sampleId: string): Promise<KeptSample> {
  const sample = await inTenant(actor, (db) =>
    findSample(db, actor.organisation.id, plant.id, sampleId),
  );
  if (sample === undefined) throw notFound('sample');
  return sample;
}
