import { multiplyPpm, type Ppm } from './ppm';
import type { Rounding } from './rounding';
import { sumWhole, wholeNumber } from './whole-number';

/** A weight in whole grams. */
export type Grams = number & { readonly __unit: 'gram' };

/** Brands a whole number of grams; a difference may be negative. Throws RangeError when it is not a safe integer. */
export function grams(weight: number): Grams {
  return wholeNumber(weight, 'A weight in grams') as Grams;
}

/** Sum of weights. Throws RangeError past ±(2^53 − 1). */
export function sumGrams(weights: Iterable<Grams>): Grams {
  return grams(sumWhole(weights));
}

/** Part of a weight by a yield or rate over 1,000,000, rounded to whole grams as asked. */
export function applyPpm(weight: Grams, rate: Ppm, rounding: Rounding): Grams {
  return grams(multiplyPpm(weight, rate, rounding));
}
