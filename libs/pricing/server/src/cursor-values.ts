import { id, plantDay } from '@seamwright/shared/contracts';
import { readCursor } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import { z } from 'zod';

/** Where a page of quotes ends: the number of the last one. */
const quotePlace = z.tuple([z.int().positive()]);
/** Where a page of price lists ends: rank, owner and id. */
const listPlace = z.tuple([z.int(), z.string(), id]);
/** Where a page of price lines ends: code, first day and id. */
const linePlace = z.tuple([z.string(), plantDay, id]);

/** Reads a cursor back; one that was not written for this list is refused, whatever stands in it. */
const placeOf =
  <T extends readonly unknown[]>(place: z.ZodType<T>, length: number) =>
  (cursor: string | undefined): T | null => {
    if (cursor === undefined) return null;
    const read = place.safeParse(readCursor(cursor, length));
    if (!read.success) throw new RefusalError({ code: 'invalid', params: {}, pointer: '/cursor' });
    return read.data;
  };

export const readQuotePlace = placeOf(quotePlace, 1);
export const readListPlace = placeOf(listPlace, 3);
export const readLinePlace = placeOf(linePlace, 3);
