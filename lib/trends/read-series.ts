import { readPlantSheet } from '@/db/queries/plant-sheet';
import { listIndexSeries, listResultSeries } from '@/db/queries/series';
import type { Actor } from '@/lib/auth/door';
import { inTenant } from '@/lib/auth/in-tenant';
import { AppError, notFound } from '@/lib/errors';
import { momentFromLocal } from '@/lib/plants/local-time';
import { getPlant } from '@/lib/plants/read-plants';
import type { Plant, SamplingPoint, Target } from '@/lib/plants/schema';
import { describeAt, inUnit } from '@/lib/samples/describe';
import { isIndexKey } from '@/lib/samples/indices';
import { judge } from '@/lib/plants/judge';
import { downsample } from './downsample';
import type { Series, SeriesQuery } from './schema';

/** About two values a pixel of a wide screen; more cannot be seen. */
const POINTS_ON_THE_WIRE = 2_500;
const HOUR_MS = 3_600_000;
const DAY_MS = 24 * HOUR_MS;
/** Three missed samples in a row are a gap. */
const GAP_INTERVALS = 3.5;

/** One quantity or index of one point over a span of plant-local days, both included. */
export async function readSeries(
  actor: Actor,
  plantSlug: string,
  query: SeriesQuery,
): Promise<Series> {
  const plant = await getPlant(actor, plantSlug);
  const key = query.quantity;
  const [from, to] = spanOf(query, plant);
  const { point, quantities, targets, rows } = await inTenant(actor, async (db) => {
    const sheet = await readPlantSheet(db, actor.organisation.id, plant.id);
    const found = sheet.points.find(({ slug }) => slug === query.point);
    if (found === undefined) throw notFound('sampling point');
    const list = isIndexKey(key) ? listIndexSeries : listResultSeries;
    const read = await list(db, actor.organisation.id, found.id, key, from, to);
    return { ...sheet, point: found, rows: read };
  });
  const of = (row: { pointId: string; quantity: string }) =>
    row.pointId === point.id && row.quantity === key;
  const as = describeAt(key, quantities.find(of));
  const target = targets.find(of) ?? null;
  const gapMs = gapOf(point);
  const missed = (row: { value: number }) =>
    target !== null && judge(row.value, target) !== 'within';
  const thinned = downsample(
    rows.map((row) => ({ ...row, moment: row.at, at: row.at.getTime() })),
    POINTS_ON_THE_WIRE,
    gapMs,
    missed,
  );
  const written = (canonical: number) => inUnit(key, canonical, as.unit);
  return {
    quantity: key,
    label: as.label,
    unit: as.unit === as.label ? '' : as.unit,
    decimals: as.decimals,
    target: target && targetIn(target, written),
    points: thinned.map(({ moment, value, qualifier, sampleId }) => ({
      at: moment.toISOString(),
      value: written(value),
      qualifier,
      sampleId,
    })),
    count: rows.length,
    summary: summaryOf(
      rows.map(({ value }) => written(value)),
      rows.filter(missed).length,
    ),
    gapMs,
  };
}

function spanOf({ from, to }: SeriesQuery, plant: Plant): [Date, Date] {
  const start = momentFromLocal(`${from}T00:00`, plant.timeZone);
  const lastDay = momentFromLocal(`${to}T00:00`, plant.timeZone);
  if (start === null || lastDay === null) {
    throw new AppError('badInput', 'There is no such day at this plant.');
  }
  return [start, new Date(lastDay.getTime() + DAY_MS)];
}

const gapOf = ({ sampleEveryH }: SamplingPoint): number =>
  GAP_INTERVALS * (sampleEveryH ?? 24) * HOUR_MS;

const targetIn = (
  { lowest, highest, basis }: Target,
  written: (canonical: number) => number,
): Series['target'] => ({
  lowest: lowest === null ? null : written(lowest),
  highest: highest === null ? null : written(highest),
  basis,
});

function summaryOf(values: readonly number[], missed: number): Series['summary'] {
  if (values.length === 0) return null;
  const sorted = [...values].sort((a, b) => a - b);
  const middle = sorted.length >> 1;
  const upper = sorted[middle] ?? 0;
  const median = sorted.length % 2 === 1 ? upper : ((sorted[middle - 1] ?? upper) + upper) / 2;
  return { lowest: sorted[0] ?? 0, median, highest: sorted.at(-1) ?? 0, missed };
}
