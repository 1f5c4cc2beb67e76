import type { Database } from '../client';
import type { OrganisationRow } from '../tables/rows';

/** Every organisation, for upkeep: only the schema's owner sees more than the context's own. */
export async function listAllOrganisations(db: Database): Promise<{ id: string; name: string }[]> {
  return db<OrganisationRow>('organisations').orderBy('name').select('id', 'name');
}
