import {
  addFractions,
  divideFractions,
  fraction,
  multiplyFractions,
  subtractFractions,
  type Fraction,
} from '@seamwright/shared/util';

interface Part {
  /** Weight in any one unit. */
  readonly weight: Fraction;
  /** Worth per unit of weight; may be below zero. */
  readonly value: Fraction;
}

interface Bought {
  readonly weight: Fraction;
  readonly price: Fraction;
  /** What comes off, with what it is worth; the loss too, at nothing. */
  readonly parts: readonly Part[];
}

/** What a cut costs once the rest of the piece is credited, all exact. */
export interface CutCost {
  readonly cost: Fraction;
  readonly credit: Fraction;
  /** Cost less credit: below zero when the rest is worth more than the whole piece. */
  readonly netCost: Fraction;
  readonly usableWeight: Fraction;
  readonly yield: Fraction;
  readonly usableCost: Fraction;
  /** Usable cost over the price paid: times tomorrow's price it gives tomorrow's usable cost. */
  readonly factor: Fraction;
}

/**
 * The trade's cutting test in money: price and weights in one unit give what the usable part costs. Throws RangeError
 * when nothing usable is left or nothing was paid.
 */
export function cutCost({ weight, price, parts }: Bought): CutCost {
  const zero = fraction(0n);
  const cost = multiplyFractions(weight, price);
  const credit = parts.reduce((sum, part) => addFractions(sum, multiplyFractions(part.weight, part.value)), zero);
  const usableWeight = subtractFractions(
    weight,
    parts.reduce((sum, part) => addFractions(sum, part.weight), zero),
  );
  const netCost = subtractFractions(cost, credit);
  const usableCost = divideFractions(netCost, usableWeight);
  return {
    cost,
    credit,
    netCost,
    usableWeight,
    yield: divideFractions(usableWeight, weight),
    usableCost,
    factor: divideFractions(usableCost, price),
  };
}
