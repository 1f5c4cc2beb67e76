import { notFound } from 'next/navigation';
import { AppError } from '@/lib/errors';

const NOWHERE: readonly string[] = ['notFound', 'badInput'];

/** Turns a use case's "not found" into the page's; an address that makes no sense leads nowhere either. */
export async function orNotFound<Value>(found: Promise<Value>): Promise<Value> {
  try {
    return await found;
  } catch (error) {
    if (error instanceof AppError && NOWHERE.includes(error.code)) notFound();
    throw error;
  }
}
