import * as z from 'zod';
import { noSuch } from './errors';
import { text, wholeNumber } from './parameters';

/** A page of a list as the API answers it. */
export interface ApiList<Item> {
  object: 'list';
  data: Item[];
  has_more: boolean;
  url: string;
}

const createdFilter = z.union([
  wholeNumber,
  z.strictObject({
    gt: wholeNumber.optional(),
    gte: wholeNumber.optional(),
    lt: wholeNumber.optional(),
    lte: wholeNumber.optional(),
  }),
]);

/** The parameters every list takes; a resource spreads them into its own schema. */
export const listParameters = {
  limit: wholeNumber.refine((limit) => limit >= 1 && limit <= 100, 'must be between 1 and 100').optional(),
  starting_after: text.optional(),
  ending_before: text.optional(),
  created: createdFilter.optional(),
};

/** Those parameters, read. */
export interface ListQuery {
  limit?: number | undefined;
  starting_after?: string | undefined;
  ending_before?: string | undefined;
  created?: z.output<typeof createdFilter> | undefined;
}

const DEFAULT_LIMIT = 10;

function createdWithin(filter: ListQuery['created'], created: number): boolean {
  if (filter === undefined) return true;
  if (typeof filter === 'number') return created === filter;
  return (
    (filter.gt === undefined || created > filter.gt) &&
    (filter.gte === undefined || created >= filter.gte) &&
    (filter.lt === undefined || created < filter.lt) &&
    (filter.lte === undefined || created <= filter.lte)
  );
}

/**
 * A page of `items` (oldest first, as kept), newest first. `starting_after` goes on to older ones, `ending_before` back
 * to the newer ones next to it; `has_more` speaks of the direction of travel.
 * @throws ApiError 400 when the cursor is not in the list
 */
export function listPage<Item extends { id: string; created: number }>(
  items: Item[],
  query: ListQuery,
  kind: string,
  url: string,
): ApiList<Item> {
  const limit = query.limit ?? DEFAULT_LIMIT;
  const newestFirst = items.filter((item) => createdWithin(query.created, item.created)).reverse();
  const position = (cursor: string, param: string) => {
    const index = newestFirst.findIndex((item) => item.id === cursor);
    if (index < 0) throw noSuch(kind, cursor, param);
    return index;
  };
  if (query.ending_before !== undefined) {
    const end = position(query.ending_before, 'ending_before');
    const start = Math.max(0, end - limit);
    return { object: 'list', data: newestFirst.slice(start, end), has_more: start > 0, url };
  }
  const start = query.starting_after === undefined ? 0 : position(query.starting_after, 'starting_after') + 1;
  const data = newestFirst.slice(start, start + limit);
  return { object: 'list', data, has_more: start + limit < newestFirst.length, url };
}
