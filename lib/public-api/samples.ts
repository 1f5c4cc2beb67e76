import * as z from 'zod';
import { page, pageOf, pageQuery, readCursor } from '@/lib/api/cursor';
import { operation } from '@/lib/api/operation';
import { getPlant } from '@/lib/plants/read-plants';
import { getSample } from '@/lib/samples/get-sample';
import { listSamplesFrom } from '@/lib/samples/list-samples-from';
import { saveSample } from '@/lib/samples/save-sample';
import { sampleInput } from '@/lib/samples/schema';
import { madeAnswer, sampleAnswer, wholeSampleAnswer } from './answers';

export const listSamples = operation({
  id: 'listSamples',
  method: 'get',
  path: '/{org}/plants/{plant}/samples',
  summary: 'Samples of a plant, newest first',
  permission: 'sample.read',
  query: z.strictObject({
    ...pageQuery,
    point: z.string().optional().meta({ description: 'Slug of a sampling point.' }),
  }),
  answer: pageOf(sampleAnswer),
  run: async (actor, { params, query }) => {
    const before = readCursor(query.cursor);
    const read = await listSamplesFrom(actor, params['plant'] ?? '', {
      point: query.point,
      before,
      limit: query.limit + 1,
    });
    const { items, next } = page(read, query.limit, ({ takenAt, id }) => [takenAt, id]);
    const told = items.map((item) => ({ ...item, takenAt: item.takenAt.toISOString() }));
    return { answer: { items: told, next } };
  },
});

export const readSample = operation({
  id: 'readSample',
  method: 'get',
  path: '/{org}/plants/{plant}/samples/{sample}',
  summary: 'One sample with its results, indices and how they were found',
  permission: 'sample.read',
  query: z.strictObject({}),
  answer: wholeSampleAnswer,
  run: async (actor, { params }) => {
    const plant = await getPlant(actor, params['plant'] ?? '');
    const sample = await getSample(actor, plant, params['sample'] ?? '');
    return {
      answer: {
        ...sample,
        takenAt: sample.takenAt.toISOString(),
        enteredAt: sample.enteredAt.toISOString(),
      },
    };
  },
});

export const createSample = operation({
  id: 'createSample',
  method: 'post',
  path: '/{org}/plants/{plant}/samples',
  summary: 'Enter a sample',
  description:
    'Results are given as text, as written; the time is the plant’s own wall-clock time. The sample is solved on the way in.',
  permission: 'sample.write',
  query: z.strictObject({}),
  body: sampleInput.omit({ plantSlug: true, clientKey: true }),
  answer: madeAnswer,
  creates: true,
  run: async (actor, { params, body, clientKey }) => {
    const plantSlug = params['plant'] ?? '';
    const { sampleId } = await saveSample(actor, { ...body, plantSlug, clientKey });
    return { answer: { id: sampleId } };
  },
});
