import knex, { type Knex } from 'knex';
import { ownerKnexConfig } from '../knex-config';
import { setContext } from '../tenant';
import type { OrganisationRow } from '../tables/rows';
import { insertDemo, type DemoToInsert } from './insert-demo';

/** Any fixed number: two processes starting at once take turns, and the second finds the first one's work. */
const SEEDING_LOCK = 7_260_118;

/** Builds and inserts the demo in one transaction, unless that organisation exists. True when it did. */
export async function insertDemoOnce(
  ownerUrl: string,
  organisationId: string,
  build: () => Promise<DemoToInsert>,
): Promise<boolean> {
  const db = knex(ownerKnexConfig(ownerUrl));
  try {
    return await db.transaction(async (transaction: Knex.Transaction) => {
      await transaction.raw('select pg_advisory_xact_lock(?)', [SEEDING_LOCK]);
      // The owner is held to the row policies as well: it sees and fills this organisation and no other.
      await setContext(transaction, { organisationId });
      const existing = await transaction<OrganisationRow>('organisations')
        .where({ id: organisationId })
        .first('id');
      if (existing !== undefined) return false;
      await insertDemo(transaction, await build());
      return true;
    });
  } finally {
    await db.destroy();
  }
}
