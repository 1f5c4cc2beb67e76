import { lockTarget, updateTarget } from '@/db/queries/plants';
import { recordChange } from '@/lib/audit/record-change';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { systemClock, type Clock } from '@/lib/clock';
import { AppError, notFound } from '@/lib/errors';
import { getPlant } from '@/lib/plants/read-plants';
import type { Target } from '@/lib/plants/schema';
import { QUANTITIES, isQuantityKey } from '@/lib/samples/quantities';
import type { ChangeTargetInput } from './schema';

/**
 * Sets a target's bounds, from the version the person saw and no other: of several at once one wins, the rest are told.
 * Throws `preconditionFailed` with what stands now, `badInput` for bounds no water can have.
 */
export async function changeTarget(
  actor: Actor,
  { plantSlug, targetId, version, bounds }: ChangeTargetInput,
  clock: Clock = systemClock,
): Promise<Target> {
  const plant = await getPlant(actor, plantSlug);
  const organisationId = actor.organisation.id;
  return inTenant(actor, async (db) => {
    const before = await lockTarget(db, organisationId, plant.id, targetId);
    if (before === undefined) throw notFound('target');
    if (before.version !== version) throw outrun(version, before);
    refuseImpossible(before.quantity, bounds);
    const { reason, ...after } = bounds;
    const changed = await updateTarget(db, organisationId, { ...before, ...after }, clock());
    await recordChange(
      db,
      actor,
      {
        action: 'target.changed',
        subjectId: targetId,
        detail: {
          quantity: before.quantity,
          before: boundsOf(before),
          after: boundsOf(changed),
          version: changed.version,
          reason,
        },
      },
      clock,
    );
    return changed;
  });
}

const boundsOf = ({ lowest, highest, preferred, basis }: Target) => ({
  lowest,
  highest,
  preferred,
  basis,
});

const outrun = (seen: number, now: Target): AppError =>
  new AppError(
    'preconditionFailed',
    `Someone else changed this target meanwhile: you saw version ${seen}, it is version ${now.version} now, ` +
      `from ${now.lowest ?? 'open'} to ${now.highest ?? 'open'}. Look at it and change it from there.`,
  );

/** An index may be negative; a measured quantity keeps to what is physically possible. */
function refuseImpossible(
  quantity: string,
  {
    lowest,
    highest,
    preferred,
  }: { lowest: number | null; highest: number | null; preferred: number | null },
): void {
  if (!isQuantityKey(quantity)) return;
  const [least, most] = QUANTITIES[quantity].possible;
  for (const value of [lowest, highest, preferred]) {
    if (value !== null && (value < least || value > most)) {
      throw new AppError(
        'badInput',
        `${QUANTITIES[quantity].label} lies between ${least} and ${most}.`,
      );
    }
  }
}
