import { checkLineWeight, MOST_LINE_GRAMS } from './line-limits';
import { packedAmount } from './packed-amount';
import { unfinishedLines } from './packing-finished';

describe('the real amount of a line', () => {
  it('is its net weight by the price per kg, a half penny up', () => {
    const line = { basis: 'kg' as const, priceMinor: 2399, pieces: 10, estimateMinor: 6717 };
    // 2.815 kg × £23.99 = 67.53185
    expect(packedAmount(line, { pieces: 10, grams: 2815 })).toBe(6753);
  });

  it('is by the piece or case what of it was packed, whatever it weighs', () => {
    const pieces = { basis: 'piece' as const, priceMinor: 450, pieces: 12, estimateMinor: 5400 };
    expect(packedAmount(pieces, { pieces: 11, grams: 9999 })).toBe(4950);
    const cases = { basis: 'case' as const, priceMinor: 7990, pieces: 24, estimateMinor: 15_980 };
    expect(packedAmount(cases, { pieces: 12, grams: 1 })).toBe(7990);
    expect(packedAmount(cases, { pieces: 0, grams: 0 })).toBe(0);
  });
});

describe('packing', () => {
  it('is finished when each piece is packed or short', () => {
    const lines = [
      { id: 'a', pieces: 10, shortPieces: 2 },
      { id: 'b', pieces: 4, shortPieces: 0 },
      { id: 'c', pieces: 3, shortPieces: 3 },
    ];
    const packed = new Map([
      ['a', { pieces: 8 }],
      ['b', { pieces: 3 }],
    ] as const);
    expect(unfinishedLines(lines, packed).map(({ id }) => id)).toEqual(['b']);
  });
});

describe('the weight of a line', () => {
  it('is at most what a van carries', () => {
    expect(checkLineWeight(MOST_LINE_GRAMS).ok).toBe(true);
    expect(checkLineWeight(MOST_LINE_GRAMS + 1).ok).toBe(false);
  });
});
