import fc from 'fast-check';
import { shareByLargestRemainder } from './largest-remainder';
import { minorUnits } from './money';

const totals = fc.maxSafeInteger();
const weights = fc.array(fc.maxSafeNat(), { minLength: 1, maxLength: 20 });
const exactSum = (values: readonly number[]): bigint => values.reduce((sum, value) => sum + BigInt(value), 0n);

describe('sharing by largest remainder', () => {
  it('gives the odd penny to the largest remainder', () => {
    expect(shareByLargestRemainder(minorUnits(100), [1, 1, 1])).toEqual([34, 33, 33]);
    expect(shareByLargestRemainder(minorUnits(100), [1, 2, 3])).toEqual([17, 33, 50]);
    expect(shareByLargestRemainder(minorUnits(10), [1n, 0n, 2n])).toEqual([3, 0, 7]);
  });

  it('splits a credit like its charge', () => {
    expect(shareByLargestRemainder(minorUnits(-100), [1, 1, 1])).toEqual([-34, -33, -33]);
    fc.assert(
      fc.property(totals, weights, (total, given) => {
        const shares = shareByLargestRemainder(total, given);
        expect(shareByLargestRemainder(-total, given)).toEqual(shares.map((share) => (share === 0 ? 0 : -share)));
      }),
    );
  });

  it('splits evenly when nothing has weight', () => {
    expect(shareByLargestRemainder(minorUnits(5), [0, 0, 0])).toEqual([2, 2, 1]);
  });

  it('adds up exactly', () => {
    fc.assert(
      fc.property(totals, weights, (total, given) => exactSum(shareByLargestRemainder(total, given)) === BigInt(total)),
    );
  });

  it('keeps each share within one unit of the exact one', () => {
    fc.assert(
      fc.property(totals, weights, (total, given) => {
        const sum = exactSum(given);
        fc.pre(sum > 0n);
        shareByLargestRemainder(total, given).forEach((share, index) => {
          const scaled = BigInt(share) * sum - BigInt(total) * BigInt(given[index] ?? 0);
          expect(scaled < sum && scaled > -sum).toBe(true);
        });
      }),
    );
  });

  it('never gives a smaller weight more than a larger one', () => {
    fc.assert(
      fc.property(fc.maxSafeNat(), weights, (total, given) => {
        const sorted = given.toSorted((a, b) => b - a);
        const shares = shareByLargestRemainder(total, sorted);
        expect(shares.toSorted((a, b) => b - a)).toEqual(shares);
      }),
    );
  });

  it('gives nothing to nobody, and throws when something would be lost', () => {
    expect(shareByLargestRemainder(0, [])).toEqual([]);
    expect(() => shareByLargestRemainder(1, [])).toThrow(RangeError);
    expect(() => shareByLargestRemainder(1, [2, -1])).toThrow(RangeError);
    expect(() => shareByLargestRemainder(1, [0.5])).toThrow(RangeError);
    expect(() => shareByLargestRemainder(0.5, [1])).toThrow(RangeError);
  });
});
