import knex, { type Knex } from 'knex';
import pg from 'pg';
import { appKnexConfig } from './knex-config';
import { env } from '@/lib/env';

// Double precision and bigint counts arrive as text by default; every bigint here is a count below 2^53.
pg.types.setTypeParser(pg.types.builtins.INT8, Number);

/** A connection or a transaction: every query function takes one as its first argument. */
export type Database = Knex;

const holder = globalThis as { marlwickKnex?: Knex };

/** The process's one pool; kept on globalThis so that a development reload does not open another. */
export function database(): Knex {
  holder.marlwickKnex ??= knex(appKnexConfig(env().DATABASE_URL));
  return holder.marlwickKnex;
}
