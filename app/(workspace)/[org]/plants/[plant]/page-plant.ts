import { notFound } from 'next/navigation';
import { pageActor } from '@/lib/auth/actor';
import type { Actor } from '@/lib/auth/door';
import type { Permission } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import { getPlant } from '@/lib/plants/read-plants';
import type { Plant } from '@/lib/plants/schema';

/** Actor and works of a page under `plants/[plant]`; what is not theirs is not found. */
export async function pagePlant(
  params: Promise<{ org: string; plant: string }>,
  permission: Permission,
): Promise<{ actor: Actor; plant: Plant }> {
  const { org, plant: slug } = await params;
  const actor = await pageActor(org, permission);
  return { actor, plant: await orNotFound(getPlant(actor, slug)) };
}

/** Turns a use case's "not found" into the page's. */
export async function orNotFound<Value>(found: Promise<Value>): Promise<Value> {
  try {
    return await found;
  } catch (error) {
    if (error instanceof AppError && error.code === 'notFound') notFound();
    throw error;
  }
}
