import { listLatestValues, type LatestValue } from '@/db/queries/latest-values';
import { readPlantSheet } from '@/db/queries/plant-sheet';
import { listDosingPoints, listShiftNotes, listTrainSteps } from '@/db/queries/plants';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import type { Clock } from '@/lib/clock';
import type { Plant, PointQuantity, SamplingPoint, Target } from '@/lib/plants/schema';
import { describeAt, isSeriesKey, writeValue } from '@/lib/samples/describe';
import { judge } from '@/lib/plants/judge';
import { dueState } from './rules';
import type { Reading, Station, Today } from './schema';

const NOTES_SHOWN = 3;
const MEMORY_MS = 60 * 86_400_000;
/** Shown at every point that has them, after pH and the targets and before the rest of its list. */
const ALWAYS_SHOWN = ['calciteIndex', 'turbidity', 'alkalinity', 'temperature'] as const;

/** Everything the first screen needs: eight queries on one connection, however many points the plant has. */
export async function readToday(actor: Actor, plant: Plant, clock: Clock): Promise<Today> {
  const now = clock();
  const { steps, points, quantities, targets, dosing, latest, notes } = await inTenant(
    actor,
    async (db) => {
      const scope = [db, actor.organisation.id, plant.id] as const;
      return {
        ...(await readPlantSheet(...scope)),
        steps: await listTrainSteps(...scope),
        dosing: await listDosingPoints(...scope, now),
        latest: await listLatestValues(...scope, new Date(now.getTime() - MEMORY_MS)),
        notes: await listShiftNotes(...scope, NOTES_SHOWN),
      };
    },
  );
  return {
    now,
    notes,
    steps: steps.map((step) => {
      const point = points.find(({ position }) => position === step.position);
      return {
        id: step.id,
        kind: step.kind,
        name: step.name,
        dosing: dosing.filter(({ trainStepId }) => trainStepId === step.id),
        station: point === undefined ? null : stationOf(point, quantities, targets, latest, now),
      };
    }),
  };
}

function stationOf(
  point: SamplingPoint,
  quantities: readonly PointQuantity[],
  targets: readonly Target[],
  latest: readonly LatestValue[],
  now: Date,
): Station {
  const values = latest.filter(({ pointId }) => pointId === point.id);
  const newest = values.reduce<LatestValue | null>(
    (best, value) => (best === null || value.takenAt > best.takenAt ? value : best),
    null,
  );
  const own = quantities.filter(({ pointId }) => pointId === point.id);
  const ownTargets = targets.filter(({ pointId }) => pointId === point.id);
  const order = [
    'pH',
    ...ownTargets.map(({ quantity }) => quantity),
    ...ALWAYS_SHOWN,
    ...own.map(({ quantity }) => quantity),
  ];
  const readings = [...new Set(order)]
    .map((quantity) => readingOf(quantity, values, own, ownTargets))
    .filter((reading): reading is Reading => reading !== null);
  return {
    pointId: point.id,
    slug: point.slug,
    name: point.name,
    kind: point.kind,
    readings,
    lastSample: newest && { id: newest.sampleId, takenAt: newest.takenAt },
    due:
      point.sampleEveryH === null
        ? null
        : dueState(newest?.takenAt ?? null, point.sampleEveryH, now),
  };
}

function readingOf(
  quantity: string,
  values: readonly LatestValue[],
  own: readonly PointQuantity[],
  targets: readonly Target[],
): Reading | null {
  const value = values.find((candidate) => candidate.quantity === quantity);
  if (value === undefined || !isSeriesKey(quantity)) return null;
  const as = describeAt(
    quantity,
    own.find((candidate) => candidate.quantity === quantity),
  );
  const target = targets.find((candidate) => candidate.quantity === quantity) ?? null;
  // A value written in another unit than the point writes today is shown converted.
  const asWritten = value.enteredText !== null && value.enteredUnit === as.unit;
  const written = asWritten ? value.enteredText : writeValue(quantity, value.value, as);
  return {
    key: quantity,
    as,
    text: `${QUALIFIER_SIGN[value.qualifier]}${written}`,
    takenAt: value.takenAt,
    verdict: target && judge(value.value, target),
    target,
  };
}

const QUALIFIER_SIGN = { '': '', '<': '<', '>': '>', nd: 'nd <', e: '≈' } as const;
