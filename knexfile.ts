import { ownerKnexConfig } from './db/knex-config';

/** For the knex command line; the product migrates through `db/migrate.ts` with the same source. */
export default ownerKnexConfig(process.env.DATABASE_OWNER_URL ?? process.env.DATABASE_URL ?? '');
