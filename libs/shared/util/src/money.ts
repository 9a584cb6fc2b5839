import { multiplyPpm, type Ppm } from './ppm';
import { divideHalfUp, toSafeNumber } from './rounding';
import type { Grams } from './weight';
import { sumWhole, wholeNumber } from './whole-number';

/** An amount, or a price per kg, piece or case, in whole minor units (pence) of the currency its document names. */
export type MinorUnits = number & { readonly __unit: 'minor' };

/** Brands a whole number of minor units; negative for credits. Throws RangeError when it is not a safe integer. */
export function minorUnits(amount: number): MinorUnits {
  return wholeNumber(amount, 'An amount of money') as MinorUnits;
}

/** Sum of the amounts of one currency. Throws RangeError past ±(2^53 − 1). */
export function sumMoney(amounts: Iterable<MinorUnits>): MinorUnits {
  return minorUnits(sumWhole(amounts));
}

/** `sumMoney` of the amounts given one by one. */
export function addMoney(...amounts: MinorUnits[]): MinorUnits {
  return sumMoney(amounts);
}

/** Line amount of goods sold by weight: net grams × price per kg ÷ 1000, a half penny away from zero. */
export function priceForGrams(netGrams: Grams, priceMinorPerKg: MinorUnits): MinorUnits {
  return minorUnits(toSafeNumber(divideHalfUp(BigInt(netGrams) * BigInt(priceMinorPerKg), 1000n)));
}

/** Line amount of goods sold by piece or case: count × price. Throws RangeError when the count is not whole. */
export function priceTimes(count: number, priceMinor: MinorUnits): MinorUnits {
  return minorUnits(toSafeNumber(BigInt(count) * BigInt(priceMinor)));
}

/** Tax on a net amount, a half penny away from zero. The rate is over 1,000,000: 20 % = 200,000. */
export function taxOn(netMinor: MinorUnits, ratePpm: Ppm): MinorUnits {
  return minorUnits(multiplyPpm(netMinor, ratePpm, 'half-up'));
}
