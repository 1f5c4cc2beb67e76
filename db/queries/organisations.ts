import type { Database } from '../client';
import type { OrganisationRow } from '../tables/rows';

/** Every organisation, for upkeep: only the schema's owner sees more than the context's own. */
export async function listAllOrganisations(db: Database): Promise<{ id: string; name: string }[]> {
  return db<OrganisationRow>('organisations').orderBy('name').select('id', 'name');
}

/** False when the slug is taken; nothing is then written. Call in the new organisation's own context. */
export async function insertOrganisation(
  db: Database,
  organisation: { id: string; slug: string; name: string },
): Promise<boolean> {
  const inserted = await db<OrganisationRow>('organisations')
    .insert(organisation)
    .onConflict('slug')
    .ignore()
    .returning('id');
  return inserted.length === 1;
}

export async function findOrganisation(
  db: Database,
  id: string,
): Promise<{ id: string; slug: string; name: string; isDemo: boolean } | undefined> {
  const row = await db<OrganisationRow>('organisations').where({ id }).first();
  return row && { id: row.id, slug: row.slug, name: row.name, isDemo: row.is_demo };
}
