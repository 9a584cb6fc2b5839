import { RefusalError } from '@seamwright/shared/util';

/** The values of a row by which the list is ordered, last one unique. */
export type CursorValues = readonly (string | number)[];

export function writeCursor(values: CursorValues): string {
  return Buffer.from(JSON.stringify(values)).toString('base64url');
}

/** Reads a cursor back; refuses one that was not written here for a list with this many sort values. */
export function readCursor(cursor: string, length: number): CursorValues {
  try {
    const values: unknown = JSON.parse(Buffer.from(cursor, 'base64url').toString('utf8'));
    if (
      Array.isArray(values) &&
      values.length === length &&
      values.every((v) => ['string', 'number'].includes(typeof v))
    ) {
      return values as CursorValues;
    }
  } catch {
    // Falls through: what can't be read is refused the same way as what has another shape.
  }
  throw new RefusalError({ code: 'invalid', params: {}, pointer: '/cursor' });
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
