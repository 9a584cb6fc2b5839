import { RefusalError } from '@seamwright/shared/util';
import * as z from 'zod';
import { pageFrom, readCursor, writeCursor } from './paging';

const place = z.tuple([z.string(), z.int()]);

describe('paging', () => {
  it('reads back the cursor it wrote', () => {
    expect(readCursor(writeCursor(['Ash & Ö', 12]), place)).toEqual(['Ash & Ö', 12]);
  });

  it.each([
    ['nonsense'],
    [''],
    [writeCursor(['one'])],
    [writeCursor(['one', 0.5])],
    [writeCursor([1, 'one'])],
    [Buffer.from('{"a":1}').toString('base64url')],
    [Buffer.from('[null,1]').toString('base64url')],
  ])('refuses the cursor %j', (cursor) => {
    expect(() => readCursor(cursor, place)).toThrow(RefusalError);
  });

  it('says that there is more only when there is', () => {
    const rows = [1, 2, 3];
    const page = (limit: number) =>
      pageFrom(
        rows,
        limit,
        (row) => [row],
        (row) => row * 10,
      );
    expect(page(3)).toEqual({ items: [10, 20, 30], nextCursor: null });
    expect(page(2)).toEqual({ items: [10, 20], nextCursor: writeCursor([2]) });
  });
});
