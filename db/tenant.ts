import { AppError } from '@/lib/errors';
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
  /** SHA-256 of a secret someone brings (a link from an e-mail, an API token): the one row it opens may be read. */
  readonly tokenHash?: string;
  /** The only plants to be seen; left out, all of the organisation's. */
  readonly plantIds?: readonly string[] | null;
}

const SETTINGS = {
  organisationId: 'marlwick.organisation_id',
  personId: 'marlwick.person_id',
  signInEmail: 'marlwick.sign_in_email',
  tokenHash: 'marlwick.token_hash',
  plantIds: 'marlwick.plant_ids',
} as const satisfies Record<keyof RowContext, string>;

/** Runs `work` in one transaction that sees the context's rows and no others: all of it is kept, or none. */
export function inContext<T>(
  context: RowContext,
  work: (transaction: Database) => Promise<T>,
): Promise<T> {
  return database()
    .transaction(async (transaction) => {
      await setContext(transaction, context);
      return work(transaction);
    })
    .catch((error: unknown) => {
      throw isUnkeepableText(error)
        ? new AppError('badInput', UNKEEPABLE, { cause: error })
        : error;
    });
}

const UNKEEPABLE = 'This text holds a character that cannot be kept.';
/** PostgreSQL's codes for text it cannot hold: a NUL, or half a surrogate pair in JSON. */
const UNKEEPABLE_CODES = ['22021', '22P05'];

const isUnkeepableText = (error: unknown): boolean =>
  typeof error === 'object' &&
  error !== null &&
  'code' in error &&
  UNKEEPABLE_CODES.includes(String(error.code));

/** Sets the row context of a transaction that is already open (seeds and tests bring their own connection). */
export async function setContext(transaction: Database, context: RowContext): Promise<void> {
  for (const key of Object.keys(SETTINGS) as (keyof RowContext)[]) {
    await transaction.raw('select set_config(?, ?, true)', [SETTINGS[key], textOf(context[key])]);
  }
}

/** An empty list of plants must match none, while an empty setting means all. */
const NO_PLANT = 'none';

function textOf(value: RowContext[keyof RowContext]): string {
  if (value === undefined || value === null) return '';
  if (typeof value === 'string') return value;
  return value.length === 0 ? NO_PLANT : value.join(',');
}
