import { toSafeNumber } from './rounding';

/** The number itself when it is an exact whole number (-0 becomes 0). Throws RangeError, naming `what`, otherwise. */
export function wholeNumber(value: number, what: string): number {
  if (!Number.isSafeInteger(value)) {
    throw new RangeError(`${what} must be a whole number within ±(2^53 − 1), not ${value}`);
  }
  return value === 0 ? 0 : value;
}

/** Exact sum of whole numbers. Throws RangeError when one is not whole or the sum is past ±(2^53 − 1). */
export function sumWhole(values: Iterable<number>): number {
  let sum = 0n;
  for (const value of values) {
    sum += BigInt(value);
  }
  return toSafeNumber(sum);
}
