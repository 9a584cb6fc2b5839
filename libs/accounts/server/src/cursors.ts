import { id, instant } from '@seamwright/shared/contracts';
import { readCursor } from '@seamwright/shared/server';
import * as z from 'zod';

/** The number after which a list goes on; null for its beginning. */
export const numberPlace = (cursor: string | undefined): number | null =>
  cursor === undefined ? null : readCursor(cursor, z.tuple([z.int().positive()]))[0];

/** The instant and id after which a list goes on; null for its beginning. */
export function instantPlace(cursor: string | undefined): { createdAt: string; id: string } | null {
  if (cursor === undefined) return null;
  const [createdAt, rowId] = readCursor(cursor, z.tuple([instant, id]));
  return { createdAt, id: rowId };
}
