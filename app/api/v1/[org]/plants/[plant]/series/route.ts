import { memberRoute } from '@/lib/api/member-route';
import { readSeries } from '@/lib/trends/read-series';
import { seriesQuery } from '@/lib/trends/schema';

export const GET = memberRoute('trend.read', seriesQuery, (actor, query, { plant = '' }) =>
  readSeries(actor, plant, query),
);
