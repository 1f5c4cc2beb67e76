import { notFound } from 'next/navigation';
import { AppError } from '@/lib/errors';

/** Turns a use case's "not found" into the page's. */
export async function orNotFound<Value>(found: Promise<Value>): Promise<Value> {
  try {
    return await found;
  } catch (error) {
    if (error instanceof AppError && error.code === 'notFound') notFound();
    throw error;
  }
}
