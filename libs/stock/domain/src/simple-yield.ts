import { divideUp, grams, toSafeNumber, type Grams } from '@seamwright/shared/util';

const WHOLE = 1_000_000n;

/**
 * Grams of primal that must go in for so many grams out: out / yield, rounded up to the whole gram once. The yield is a
 * whole number over 1,000,000. Throws RangeError when it is not above zero.
 * Source: the textbook's "quantity to buy = portions × portion size / yield".
 */
export function gramsIn(outGrams: number, yieldPpm: number): Grams {
  if (yieldPpm <= 0) throw new RangeError('A yield must be above zero');
  return grams(toSafeNumber(divideUp(BigInt(outGrams) * WHOLE, BigInt(yieldPpm))));
}
