import {
  grams,
  minorUnits,
  ok,
  priceForGrams,
  priceTimes,
  refuse,
  type MinorUnits,
  type Result,
} from '@seamwright/shared/util';
import type { PriceBasis } from './price-candidate';

/** What a line will weigh, and its pieces; `cases` is null when they are not whole cases. */
export interface PricedWeights {
  readonly pieces: number;
  readonly cases: number | null;
  readonly minGrams: number;
  readonly estimateGrams: number;
  readonly maxGrams: number;
}

/** What a line will cost at least, most likely and at most, in minor units. */
export interface LineAmounts {
  readonly minMinor: MinorUnits;
  readonly estimateMinor: MinorUnits;
  readonly maxMinor: MinorUnits;
}

/**
 * By weight: `round_half_up(grams × price per kg / 1000)` at each of the three weights. By piece: `pieces × price`. By
 * case: `cases × price`, and a part of a case is refused with `price-case-only`.
 */
export function lineAmounts(basis: PriceBasis, priceMinor: number, weights: PricedWeights): Result<LineAmounts> {
  const price = minorUnits(priceMinor);
  switch (basis) {
    case 'kg':
      return ok({
        minMinor: priceForGrams(grams(weights.minGrams), price),
        estimateMinor: priceForGrams(grams(weights.estimateGrams), price),
        maxMinor: priceForGrams(grams(weights.maxGrams), price),
      });
    case 'piece':
      return ok(always(priceTimes(weights.pieces, price)));
    case 'case':
      return weights.cases === null ? refuse('price-case-only') : ok(always(priceTimes(weights.cases, price)));
  }
}

const always = (amount: MinorUnits): LineAmounts => ({ minMinor: amount, estimateMinor: amount, maxMinor: amount });
