import * as z from 'zod';
import { operation } from '@/lib/api/operation';
import { readSeries as read } from '@/lib/trends/read-series';
import { seriesQuery } from '@/lib/trends/schema';

const bound = z.number().nullable();

const seriesAnswer = z
  .object({
    quantity: z.string(),
    label: z.string(),
    unit: z.string(),
    decimals: z.int(),
    target: z.object({ lowest: bound, highest: bound, basis: z.string() }).nullable(),
    points: z.array(
      z.object({
        at: z.iso.datetime(),
        value: z.number(),
        qualifier: z.enum(['', '<', '>', 'nd', 'e']),
        sampleId: z.string(),
      }),
    ),
    count: z.int().meta({ description: 'Points there are, before thinning.' }),
    summary: z
      .object({ lowest: z.number(), median: z.number(), highest: z.number(), missed: z.int() })
      .nullable(),
    gapMs: z.number(),
  })
  .meta({ id: 'Series' });

export const readSeries = operation({
  id: 'readSeries',
  method: 'get',
  path: '/{org}/plants/{plant}/series',
  summary: 'One quantity or index of one point over a span of days',
  description:
    'At most 2500 points: thinned so that every extreme and every value outside its target stays.',
  permission: 'trend.read',
  query: seriesQuery,
  answer: seriesAnswer,
  run: async (actor, { params, query }) => ({
    answer: await read(actor, params['plant'] ?? '', query),
  }),
});
