import fc from 'fast-check';
import { piecesNearest, quantity, type QuantityInput } from './quantity';
import { grams } from './weight';

describe('an ordered quantity', () => {
  it('is pieces, cases, or about a weight', () => {
    expect(quantity({ unit: 'piece', count: 12 })).toEqual({ ok: true, value: { unit: 'piece', count: 12 } });
    expect(quantity({ unit: 'case', count: 100_000 })).toEqual({ ok: true, value: { unit: 'case', count: 100_000 } });
    expect(quantity({ unit: 'kg', grams: 12_000 })).toEqual({
      ok: true,
      value: { unit: 'kg', grams: 12_000, notLess: false },
    });
    expect(quantity({ unit: 'kg', grams: 100_000_000, notLess: true })).toEqual({
      ok: true,
      value: { unit: 'kg', grams: 100_000_000, notLess: true },
    });
  });

  it.each<[QuantityInput, string, string]>([
    [{ unit: 'piece', count: 0 }, 'quantity-not-positive', '/count'],
    [{ unit: 'case', count: -1 }, 'quantity-not-positive', '/count'],
    [{ unit: 'piece', count: 1.5 }, 'quantity-not-whole', '/count'],
    [{ unit: 'piece', count: NaN }, 'quantity-not-whole', '/count'],
    [{ unit: 'piece', count: 100_001 }, 'quantity-too-large', '/count'],
    [{ unit: 'piece', count: 1e300 }, 'quantity-too-large', '/count'],
    [{ unit: 'kg', grams: 0 }, 'quantity-not-positive', '/grams'],
    [{ unit: 'kg', grams: 12.5 }, 'quantity-not-whole', '/grams'],
    [{ unit: 'kg', grams: 100_000_001 }, 'quantity-too-large', '/grams'],
  ])('is refused when %j: %s', (input, code, pointer) => {
    expect(quantity(input)).toMatchObject({ ok: false, refusal: { code, pointer } });
  });
});

describe('pieces nearest to a target weight', () => {
  it('goes to the nearer number, halfway to the piece more', () => {
    expect(piecesNearest(grams(12_000), grams(2300), false)).toBe(5);
    expect(piecesNearest(grams(2500), grams(1000), false)).toBe(3);
    expect(piecesNearest(grams(2499), grams(1000), false)).toBe(2);
  });

  it('never falls under the target when the buyer says not less', () => {
    expect(piecesNearest(grams(12_000), grams(2300), true)).toBe(6);
    expect(piecesNearest(grams(2000), grams(1000), true)).toBe(2);
  });

  it('is at least one piece', () => {
    expect(piecesNearest(grams(100), grams(2300), false)).toBe(1);
  });

  it('has no nearer number of pieces', () => {
    const weights = fc.integer({ min: 1, max: 100_000_000 });
    fc.assert(
      fc.property(weights, weights, fc.boolean(), (target, nominal, notLess) => {
        const pieces = piecesNearest(grams(target), grams(nominal), notLess);
        const miss = (count: number): number => Math.abs(count * nominal - target);
        expect(pieces).toBeGreaterThanOrEqual(1);
        if (notLess) {
          expect(pieces * nominal).toBeGreaterThanOrEqual(target);
          expect((pieces - 1) * nominal).toBeLessThan(target);
        } else {
          expect(miss(pieces)).toBeLessThan(miss(pieces + 1));
          expect(pieces === 1 || miss(pieces) <= miss(pieces - 1)).toBe(true);
        }
      }),
    );
  });

  it('needs a piece that weighs something', () => {
    expect(() => piecesNearest(grams(1000), grams(0), false)).toThrow(RangeError);
  });
});
