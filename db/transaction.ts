import { database, type Database } from './client';

/** Runs `work` in one transaction: all of it is kept, or none. */
export function inTransaction<T>(work: (transaction: Database) => Promise<T>): Promise<T> {
  return database().transaction((transaction) => work(transaction));
}
