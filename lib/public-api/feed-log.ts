import * as z from 'zod';
import { page, pageOf, pageQuery, readCursor } from '@/lib/api/cursor';
import { operation } from '@/lib/api/operation';
import { logFeed, readFeedLog } from '@/lib/feed/log-feed';
import { feedEntryInput } from '@/lib/feed/schema';
import { feedEntryAnswer, madeAnswer } from './answers';

export const listFeedLog = operation({
  id: 'listFeedLog',
  method: 'get',
  path: '/{org}/plants/{plant}/feed-log',
  summary: 'What was really fed, newest first',
  permission: 'feed.read',
  query: z.strictObject(pageQuery),
  answer: pageOf(feedEntryAnswer),
  run: async (actor, { params, query }) => {
    const read = await readFeedLog(actor, params['plant'] ?? '', {
      before: readCursor(query.cursor),
      limit: query.limit + 1,
    });
    const { items, next } = page(read, query.limit, ({ fedFrom, id }) => [fedFrom, id]);
    const told = items.map(({ fedFrom, fedTo, loggedAt, ...entry }) => ({
      ...entry,
      from: fedFrom.toISOString(),
      to: fedTo.toISOString(),
      loggedAt: loggedAt.toISOString(),
    }));
    return { answer: { items: told, next } };
  },
});

export const createFeedEntry = operation({
  id: 'createFeedEntry',
  method: 'post',
  path: '/{org}/plants/{plant}/feed-log',
  summary: 'Log what was fed at a dosing point',
  permission: 'feed.write',
  query: z.strictObject({}),
  body: z.object(feedEntryInput.shape).omit({ plantSlug: true, clientKey: true }),
  answer: madeAnswer,
  creates: true,
  run: async (actor, { params, body, clientKey }) => {
    const input = feedEntryInput.parse({ ...body, plantSlug: params['plant'], clientKey });
    const { entryId } = await logFeed(actor, input);
    return { answer: { id: entryId } };
  },
});
