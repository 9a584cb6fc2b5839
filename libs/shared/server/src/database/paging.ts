import type * as z from 'zod';
import { RefusalError } from '@seamwright/shared/util';

/** The values of a row by which the list is ordered, last one unique. */
export type CursorValues = readonly (string | number)[];

export function writeCursor(values: CursorValues): string {
  return Buffer.from(JSON.stringify(values)).toString('base64url');
}

/** Reads a cursor back; whatever was not written for a list that is ordered by values of this shape is refused. */
export function readCursor<T extends CursorValues>(cursor: string, shape: z.ZodType<T>): T {
  const read = shape.safeParse(parsed(cursor));
  if (!read.success) throw new RefusalError({ code: 'invalid', params: {}, pointer: '/cursor' });
  return read.data;
}

function parsed(cursor: string): unknown {
  try {
    return JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
  } catch {
    return null;
  }
}

/** Cuts one row more than the page to know whether another page follows. */
export function pageFrom<Row, Item>(
  rows: readonly Row[],
  limit: number,
  cursorOf: (row: Row) => CursorValues,
  present: (row: Row) => Item,
): { items: Item[]; nextCursor: string | null } {
  const shown = rows.slice(0, limit);
  const last = shown.at(-1);
  return {
    items: shown.map(present),
    nextCursor: rows.length > limit && last !== undefined ? writeCursor(cursorOf(last)) : null,
  };
}
