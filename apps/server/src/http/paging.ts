import { z } from 'zod';

/** `?limit=&cursor=`: how every list pages. */
export const Paging = z.strictObject({
  limit: z.coerce
    .number({ error: 'must be a whole number from 1 to 200' })
    .int({ error: 'must be a whole number from 1 to 200' })
    .min(1, { error: 'must be 1 to 200' })
    .max(200, { error: 'must be 1 to 200' })
    .default(50),
  cursor: z.string().max(200).optional(),
});

const notACursor = { error: 'must be the nextCursor of an earlier page' };

/** Lists that page by a sequence number, and those that page by a time: any other cursor is refused, not guessed at. */
export const PagingBySequence = Paging.extend({
  cursor: z
    .string()
    .regex(/^\d{1,15}$/, notACursor)
    .transform(Number)
    .optional(),
});
export const PagingByTime = Paging.extend({ cursor: z.iso.datetime(notACursor).optional() });

export function pageOf<S extends z.ZodType>(item: S) {
  return z.object({ items: z.array(item), nextCursor: z.string().nullable() });
}

/** One row more than asked for was read: whether there is a next page, and where it begins. */
export function toPage<Row, Item>(
  rows: readonly Row[],
  limit: number,
  { item, cursor }: { item: (row: Row) => Item; cursor: (row: Row) => string },
) {
  const page = rows.slice(0, limit);
  const last = page.at(-1);
  return {
    items: page.map(item),
    nextCursor: rows.length > limit && last !== undefined ? cursor(last) : null,
  };
}
