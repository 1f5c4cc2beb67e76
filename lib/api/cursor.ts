import * as z from 'zod';
import { AppError } from '@/lib/errors';

const MOST = 200;
const USUAL = 50;

/** The query of every list. */
export const pageQuery = {
  limit: z.coerce
    .number()
    .int()
    .min(1)
    .max(MOST)
    .default(USUAL)
    .meta({ description: `Items on a page, at most ${MOST}.` }),
  cursor: z.string().max(200).optional().meta({ description: 'The `next` of the page before.' }),
};

/** A page of items and where the next begins; null on the last. */
export const pageOf = <Item extends z.ZodType>(item: Item) =>
  z.object({
    items: z.array(item),
    next: z.string().nullable().meta({ description: 'Give it as `cursor` for the next page.' }),
  });

const place = z.tuple([z.iso.datetime(), z.string().min(1).max(100)]);

/** A place in a list that is ordered by moment and id, as opaque text. */
export const cursorOf = (at: Date, id: string): string =>
  Buffer.from(JSON.stringify([at.toISOString(), id])).toString('base64url');

/** Throws `badInput` for text that no page gave. */
export function readCursor(text: string | undefined): readonly [Date, string] | null {
  if (text === undefined) return null;
  try {
    const [at, id] = place.parse(JSON.parse(Buffer.from(text, 'base64url').toString('utf8')));
    return [new Date(at), id];
  } catch {
    throw new AppError('badInput', 'cursor: is not one that a page gave.');
  }
}

/** One page out of `limit + 1` items that were read to see whether there are more. */
export function page<Item>(
  read: readonly Item[],
  limit: number,
  placeOf: (item: Item) => readonly [Date, string],
): { items: readonly Item[]; next: string | null } {
  const items = read.slice(0, limit);
  const last = items.at(-1);
  return { items, next: read.length > limit && last ? cursorOf(...placeOf(last)) : null };
}

/** A page of a short list that is read whole and ordered by itself. */
export function pageOfAll<Item extends { readonly id: string }>(
  all: readonly Item[],
  limit: number,
  cursor: string | undefined,
): { items: readonly Item[]; next: string | null } {
  const before = readCursor(cursor);
  const from = before === null ? 0 : all.findIndex(({ id }) => id === before[1]) + 1;
  if (before !== null && from === 0) throw new AppError('badInput', 'cursor: its item is gone.');
  return page(all.slice(from, from + limit + 1), limit, ({ id }) => [new Date(0), id]);
}
