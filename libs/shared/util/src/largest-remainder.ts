import type { MinorUnits } from './money';
import { toSafeNumber } from './rounding';
import type { Grams } from './weight';
import { wholeNumber } from './whole-number';

/**
 * Splits a whole total by weights so that the shares add up to it exactly: each gets its exact share cut to a whole
 * number, and the units left over go to the largest remainders, the earlier of equals first. A negative total is split
 * like its opposite. When all weights are zero the split is even, the earlier shares taking the odd units.
 * Throws RangeError on a weight that is negative or not whole, and when a total other than zero has nobody to go to.
 */
export function shareByLargestRemainder(total: MinorUnits, weights: readonly (bigint | number)[]): MinorUnits[];
export function shareByLargestRemainder(total: Grams, weights: readonly (bigint | number)[]): Grams[];
export function shareByLargestRemainder(total: number, weights: readonly (bigint | number)[]): number[];
export function shareByLargestRemainder(total: number, weights: readonly (bigint | number)[]): number[] {
  const size = BigInt(Math.abs(wholeNumber(total, 'A total to share')));
  const given = weights.map(asWeight);
  if (given.length === 0 && size !== 0n) {
    throw new RangeError('A total cannot be shared among nobody');
  }
  const used = given.some((weight) => weight > 0n) ? given : given.map(() => 1n);
  const sum = used.reduce((left, right) => left + right, 0n);

  const exact = used.map((weight, index) => ({
    index,
    share: (size * weight) / sum,
    remainder: (size * weight) % sum,
  }));
  const left = size - exact.reduce((given, { share }) => given + share, 0n);
  const byRemainder = exact.toSorted((a, b) =>
    a.remainder === b.remainder ? a.index - b.index : a.remainder > b.remainder ? -1 : 1,
  );
  const lucky = new Set(byRemainder.slice(0, toSafeNumber(left)).map(({ index }) => index));

  return exact.map(({ index, share }) => {
    const whole = lucky.has(index) ? share + 1n : share;
    return toSafeNumber(total < 0 ? -whole : whole);
  });
}

function asWeight(weight: bigint | number): bigint {
  const whole = BigInt(weight);
  if (whole < 0n) {
    throw new RangeError(`A weight to share by must not be negative: ${weight}`);
  }
  return whole;
}
