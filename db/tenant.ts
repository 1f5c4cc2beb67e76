import { database, type Database } from './client';

/**
 * Who is asking, as PostgreSQL's row policies know it. Set for one transaction only, so that a pooled connection never
 * carries one person's view into another's; without any, the app's role sees no row at all.
 */
export interface RowContext {
  readonly organisationId?: string;
  readonly personId?: string;
  /** While someone proves who they are: the one address whose person may be read. */
  readonly signInEmail?: string;
}

const SETTINGS = {
  organisationId: 'marlwick.organisation_id',
  personId: 'marlwick.person_id',
  signInEmail: 'marlwick.sign_in_email',
} as const satisfies Record<keyof RowContext, string>;

/** Runs `work` in one transaction that sees the context's rows and no others: all of it is kept, or none. */
export function inContext<T>(
  context: RowContext,
  work: (transaction: Database) => Promise<T>,
): Promise<T> {
  return database().transaction(async (transaction) => {
    await setContext(transaction, context);
    return work(transaction);
  });
}

/** Sets the row context of a transaction that is already open (seeds and tests bring their own connection). */
export async function setContext(transaction: Database, context: RowContext): Promise<void> {
  for (const key of Object.keys(SETTINGS) as (keyof RowContext)[]) {
    await transaction.raw('select set_config(?, ?, true)', [SETTINGS[key], context[key] ?? '']);
  }
}
