import type { Database } from '@/db/client';
import { inContext } from '@/db/tenant';
import type { Actor } from './door';

/** One transaction in the actor's organisation and plants. The tenant stands in every query as well: twice, on purpose. */
export const inTenant = <T>(
  { organisation, personId, plantIds }: Actor,
  work: (db: Database) => Promise<T>,
): Promise<T> => inContext({ organisationId: organisation.id, personId, plantIds }, work);
