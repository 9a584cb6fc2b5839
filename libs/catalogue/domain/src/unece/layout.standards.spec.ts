// The layout of the UNECE meat code. Only what was read in a standard, and arithmetic, is checked against the outside.
import { gs1MeatCut } from './gs1-meat-cut';
import { UNECE_LAYOUT, UNECE_LENGTH } from './layout';

describe('the UNECE meat code', () => {
  // Source: UNECE standard for llama and alpaca meat (2006), section 4.1: 14 fields, 20 characters.
  it('has 14 fields in 20 characters', () => {
    expect(UNECE_LAYOUT).toHaveLength(14);
    expect(2 + 4 + 2 + 1 + 1 + 1 + 2 + 1 + 1 + 1 + 1 + 1 + 1 + 1).toBe(20);
    expect(UNECE_LAYOUT.map(({ digits }) => digits)).toEqual([2, 4, 2, 1, 1, 1, 2, 1, 1, 1, 1, 1, 1, 1]);
    expect(UNECE_LENGTH).toBe(20);
  });

  // Source: the same section: field 1 species 00–99, field 2 product 0000–9999, field 3 not used 00–99, field 4
  // refrigeration 0–9. The other ten fields are from memory and must say so.
  it('has its first four fields as they were read, the others marked as from memory', () => {
    const read = UNECE_LAYOUT.filter(({ seen }) => seen);
    expect(read.map(({ number, field, digits, start }) => [number, field, digits, start])).toEqual([
      [1, 'species', 2, 0],
      [2, 'item', 4, 2],
      [3, 'unused', 2, 6],
      [4, 'refrigeration', 1, 8],
    ]);
    expect(UNECE_LAYOUT.filter(({ seen }) => !seen).map(({ number }) => number)).toEqual([
      5, 6, 7, 8, 9, 10, 11, 12, 13, 14,
    ]);
  });

  // Source: GS1 General Specifications, application identifier 7002: up to 30 characters. The element is one that the GS1
  // Barcode Syntax Engine accepts; its code tests syntax only and is of no real cut.
  it('goes into a GS1 bar code under 7002', () => {
    expect(UNECE_LENGTH).toBeLessThanOrEqual(30);
    expect(gs1MeatCut('10499000000000000000')).toBe('(7002)10499000000000000000');
  });
});
