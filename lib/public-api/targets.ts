import * as z from 'zod';
import { pageOf, pageOfAll, pageQuery } from '@/lib/api/cursor';
import { operation } from '@/lib/api/operation';
import { notFound } from '@/lib/errors';
import { readSheet } from '@/lib/plants/read-sheet';
import type { Target } from '@/lib/plants/schema';
import { changeTarget } from '@/lib/targets/change-target';
import { targetBounds } from '@/lib/targets/schema';
import { targetAnswer } from './answers';

const tagOf = ({ version }: Target): string => `v${version}`;

export const listTargets = operation({
  id: 'listTargets',
  method: 'get',
  path: '/{org}/plants/{plant}/targets',
  summary: 'The targets of a plant',
  permission: 'plant.read',
  query: z.strictObject(pageQuery),
  answer: pageOf(targetAnswer),
  run: async (actor, { params, query }) => {
    const { targets } = await readSheet(actor, params['plant'] ?? '');
    return { answer: pageOfAll(targets, query.limit, query.cursor) };
  },
});

export const readTarget = operation({
  id: 'readTarget',
  method: 'get',
  path: '/{org}/plants/{plant}/targets/{target}',
  summary: 'One target, with the ETag a change needs',
  permission: 'plant.read',
  query: z.strictObject({}),
  answer: targetAnswer,
  run: async (actor, { params }) => {
    const { targets } = await readSheet(actor, params['plant'] ?? '');
    const target = targets.find(({ id }) => id === params['target']);
    if (target === undefined) throw notFound('target');
    return { answer: target, tag: tagOf(target) };
  },
});

export const putTarget = operation({
  id: 'putTarget',
  method: 'put',
  path: '/{org}/plants/{plant}/targets/{target}',
  summary: 'Change a target’s bounds',
  description:
    'Of several changes from the same version one wins; the others get 412 with what stands now.',
  permission: 'target.write',
  query: z.strictObject({}),
  body: targetBounds,
  answer: targetAnswer,
  needsMatch: true,
  run: async (actor, { params, body, ifMatch }) => {
    const changed = await changeTarget(actor, {
      plantSlug: params['plant'] ?? '',
      targetId: params['target'] ?? '',
      version: /^v\d{1,9}$/.test(ifMatch) ? Number(ifMatch.slice(1)) : 0,
      bounds: body,
    });
    return { answer: changed, tag: tagOf(changed) };
  },
});
