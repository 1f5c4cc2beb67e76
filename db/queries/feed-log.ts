import type { Database } from '../client';
import type { DosingPointRow, FeedLogRow, PersonRow } from '../tables/rows';

export interface NewFeedEntry {
  id: string;
  organisationId: string;
  plantId: string;
  dosingPointId: string;
  clientKey: string;
  fedFrom: Date;
  fedTo: Date;
  /** Product as delivered. */
  productKg: number;
  waterTreatedMl: number | null;
  note: string;
  loggedBy: string;
}

export interface FeedEntry {
  id: string;
  dosingPointId: string;
  productName: string;
  fedFrom: Date;
  fedTo: Date;
  productKg: number;
  waterTreatedMl: number | null;
  note: string;
  loggedBy: string;
  loggedAt: Date;
}

/** Keeps an entry; returns the id kept under this client key, the earlier one for a repeated send. */
export async function insertFeedEntry(db: Database, entry: NewFeedEntry): Promise<string> {
  const inserted = await db<FeedLogRow>('feed_log')
    .insert({
      id: entry.id,
      organisation_id: entry.organisationId,
      plant_id: entry.plantId,
      dosing_point_id: entry.dosingPointId,
      client_key: entry.clientKey,
      fed_from: entry.fedFrom,
      fed_to: entry.fedTo,
      product_kg: entry.productKg,
      water_treated_ml: entry.waterTreatedMl,
      note: entry.note,
      logged_by: entry.loggedBy,
    })
    .onConflict(['organisation_id', 'client_key'])
    .ignore()
    .returning('id');
  if (inserted.length > 0) return entry.id;
  const kept = await db<FeedLogRow>('feed_log')
    .where({ organisation_id: entry.organisationId, client_key: entry.clientKey })
    .first('id');
  if (kept === undefined)
    throw new Error('A feed entry with this key vanished while it was saved.');
  return kept.id;
}

/** Entries of a plant before a place in the list, newest first. */
export async function listFeedEntries(
  db: Database,
  organisationId: string,
  plantId: string,
  { before, limit }: { before: readonly [at: Date, id: string] | null; limit: number },
): Promise<FeedEntry[]> {
  const query = db<FeedLogRow>('feed_log as f')
    .join<DosingPointRow>('dosing_points as d', 'd.id', 'f.dosing_point_id')
    .join<PersonRow>('people as p', 'p.id', 'f.logged_by')
    .where('f.organisation_id', organisationId)
    .where('f.plant_id', plantId);
  if (before !== null) void query.whereRaw('(f.fed_from, f.id) < (?, ?)', [...before]);
  const rows = await query
    .orderBy([
      { column: 'f.fed_from', order: 'desc' },
      { column: 'f.id', order: 'desc' },
    ])
    .limit(limit)
    .select<(FeedLogRow & { product_name: string; person_name: string })[]>(
      'f.*',
      'd.product_name',
      'p.name as person_name',
    );
  return rows.map((row) => ({
    id: row.id,
    dosingPointId: row.dosing_point_id,
    productName: row.product_name,
    fedFrom: row.fed_from,
    fedTo: row.fed_to,
    productKg: row.product_kg,
    waterTreatedMl: row.water_treated_ml,
    note: row.note,
    loggedBy: row.person_name,
    loggedAt: row.logged_at,
  }));
}
