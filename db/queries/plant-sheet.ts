import type { Database } from '../client';
import { listPointQuantities, listSamplingPoints, listTargets } from './plants';
import type { PointQuantity, SamplingPoint, Target } from '@/lib/plants/schema';

/** What a plant samples where, in which unit, and what it aims at. */
export interface PlantSheet {
  readonly points: SamplingPoint[];
  readonly quantities: PointQuantity[];
  readonly targets: Target[];
}

/** Three queries on one connection. */
export async function readPlantSheet(
  db: Database,
  organisationId: string,
  plantId: string,
): Promise<PlantSheet> {
  return {
    points: await listSamplingPoints(db, organisationId, plantId),
    quantities: await listPointQuantities(db, organisationId, plantId),
    targets: await listTargets(db, organisationId, plantId),
  };
}
