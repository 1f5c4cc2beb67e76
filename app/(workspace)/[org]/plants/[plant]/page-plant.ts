import { orNotFound } from '@/app/or-not-found';
import { pageActor } from '@/lib/auth/actor';
import type { Actor } from '@/lib/auth/door';
import type { Permission } from '@/lib/auth/permissions';
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
