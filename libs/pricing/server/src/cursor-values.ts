import { id, plantDay } from '@seamwright/shared/contracts';
import { readCursor, type CursorValues } from '@seamwright/shared/server';
import * as z from 'zod';

/** Where a page of quotes ends: the number of the last one. */
const quotePlace = z.tuple([z.int().positive()]);
/** Where a page of price lists ends: rank, owner and id. */
const listPlace = z.tuple([z.int(), z.string(), id]);
/** Where a page of price lines ends: code, first day and id. */
const linePlace = z.tuple([z.string(), plantDay, id]);

const placeOf =
  <T extends CursorValues>(place: z.ZodType<T>) =>
  (cursor: string | undefined): T | null =>
    cursor === undefined ? null : readCursor(cursor, place);

export const readQuotePlace = placeOf(quotePlace);
export const readListPlace = placeOf(listPlace);
export const readLinePlace = placeOf(linePlace);
