import { readPlantSheet } from '@/db/queries/plant-sheet';
import { listSamplePage, type ListedSample } from '@/db/queries/sample-list';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { formatDayTime } from '@/lib/format';
import { judge } from '@/lib/plants/judge';
import type { Plant, PointQuantity, SamplingPoint, Target } from '@/lib/plants/schema';
import { describeAt, isSeriesKey, writeValue, type SeriesKey } from './describe';
import type { SampleCell, SampleTable } from './sample-rows';

const PAGE_SIZE = 50;
/** What is common to most points; a single point shows its own list. */
const ALL_POINTS_COLUMNS: readonly SeriesKey[] = [
  'pH',
  'alkalinity',
  'turbidity',
  'freeChlorine',
  'calciteIndex',
];
const QUALIFIER_SIGN = { '': '', '<': '<', '>': '>', nd: 'nd ', e: '≈' } as const;

/** One page of samples as the table shows them, of one point or of all. */
export async function listSamples(
  actor: Actor,
  plant: Plant,
  asked: { point: string | undefined; page: number },
): Promise<SampleTable & { points: readonly SamplingPoint[]; point: SamplingPoint | undefined }> {
  const { points, point, quantities, targets, samples, total } = await inTenant(
    actor,
    async (db) => {
      const scope = [db, actor.organisation.id, plant.id] as const;
      const sheet = await readPlantSheet(...scope);
      const chosen = sheet.points.find(({ slug }) => slug === asked.point);
      const page = await listSamplePage(...scope, {
        pointId: chosen?.id,
        limit: PAGE_SIZE,
        offset: (asked.page - 1) * PAGE_SIZE,
      });
      return { ...sheet, ...page, point: chosen };
    },
  );
  const own = quantities.filter(({ pointId }) => pointId === point?.id);
  const listed: readonly string[] =
    point === undefined ? ALL_POINTS_COLUMNS : [...own.map((row) => row.quantity), 'calciteIndex'];
  const keys = listed.filter(isSeriesKey);
  return {
    points,
    point,
    total,
    page: asked.page,
    pages: Math.max(1, Math.ceil(total / PAGE_SIZE)),
    columns: keys.map((key) => {
      const { short, label, unit } = describeAt(
        key,
        own.find(({ quantity }) => quantity === key),
      );
      return { key, short, label, unit: unit === label ? '' : unit };
    }),
    rows: samples.map((sample) => ({
      id: sample.id,
      taken: formatDayTime(sample.takenAt, plant.timeZone),
      point: points.find(({ id }) => id === sample.pointId)?.name ?? '',
      enteredBy: sample.enteredBy,
      cells: Object.fromEntries(
        keys.flatMap((key) => {
          const cell = cellOf(key, sample, own, targets);
          return cell === null ? [] : [[key, cell]];
        }),
      ),
    })),
  };
}

function cellOf(
  key: SeriesKey,
  sample: ListedSample,
  own: readonly PointQuantity[],
  targets: readonly Target[],
): SampleCell | null {
  const result = sample.results.find(({ quantity }) => quantity === key);
  const value = result?.value ?? sample.indices[key];
  if (value === undefined) return null;
  const as = describeAt(
    key,
    own.find(({ quantity }) => quantity === key),
  );
  const target = targets.find(
    ({ pointId, quantity }) => pointId === sample.pointId && quantity === key,
  );
  const written =
    result !== undefined && result.unit === as.unit ? result.text : writeValue(key, value, as);
  return {
    text: `${result === undefined ? '' : QUALIFIER_SIGN[result.qualifier]}${written}`,
    verdict: target === undefined ? null : judge(value, target),
  };
}
