import * as z from 'zod';
import { pageOf, pageOfAll, pageQuery } from '@/lib/api/cursor';
import { operation } from '@/lib/api/operation';
import { getPlant, readPlants } from '@/lib/plants/read-plants';
import { readSheet } from '@/lib/plants/read-sheet';
import { plantAnswer, pointAnswer } from './answers';

export const listPlants = operation({
  id: 'listPlants',
  method: 'get',
  path: '/{org}/plants',
  summary: 'The plants you may see',
  permission: 'plant.read',
  query: z.strictObject(pageQuery),
  answer: pageOf(plantAnswer),
  run: async (actor, { query }) => ({
    answer: pageOfAll(await readPlants(actor), query.limit, query.cursor),
  }),
});

export const readPlant = operation({
  id: 'readPlant',
  method: 'get',
  path: '/{org}/plants/{plant}',
  summary: 'One plant',
  permission: 'plant.read',
  query: z.strictObject({}),
  answer: plantAnswer,
  run: async (actor, { params }) => ({ answer: await getPlant(actor, params['plant'] ?? '') }),
});

export const listPoints = operation({
  id: 'listPoints',
  method: 'get',
  path: '/{org}/plants/{plant}/points',
  summary: 'The sampling points of a plant in train order, with the quantities each lists',
  permission: 'plant.read',
  query: z.strictObject(pageQuery),
  answer: pageOf(pointAnswer),
  run: async (actor, { params, query }) => {
    const { points, quantities } = await readSheet(actor, params['plant'] ?? '');
    const whole = points.map((point) => ({
      ...point,
      quantities: quantities.filter(({ pointId }) => pointId === point.id),
    }));
    return { answer: pageOfAll(whole, query.limit, query.cursor) };
  },
});
