import { grams, ok, piecesNearest, refuse, type Quantity, type Result } from '@seamwright/shared/util';
import type { PriceBasis, PriceBreak } from './price-candidate';
import type { PricedPiece } from './priced-piece';

/**
 * The ordered quantity counted in a price's basis: grams, pieces, or whole cases. "About 12 kg" counts as 12 kg under a
 * price per kg, whatever its whole pieces weigh. The break that it reaches stands, also when we send short.
 */
export function orderedInBasis(basis: PriceBasis, quantity: Quantity, piece: PricedPiece): number {
  if (basis === 'kg' && quantity.unit === 'kg') return quantity.grams;
  const pieces = piecesOrdered(quantity, piece);
  if (basis === 'kg') return pieces * piece.nominalGrams;
  return basis === 'piece' ? pieces : Math.floor(pieces / piece.piecesPerCase);
}

/** The highest break that the ordered quantity reaches, or null under the first. */
export function breakReached(breaks: readonly PriceBreak[], ordered: number): PriceBreak | null {
  return breaks.reduce<PriceBreak | null>(
    (reached, each) =>
      each.fromQuantity <= ordered && each.fromQuantity > (reached?.fromQuantity ?? 0) ? each : reached,
    null,
  );
}

/** Checks that quantities rise from break to break. Refuses with `price-breaks-not-rising`, pointing at the break. */
export function checkBreaks(breaks: readonly PriceBreak[]): Result<readonly PriceBreak[]> {
  const wrong = breaks.findIndex((each, at) => at > 0 && each.fromQuantity <= (breaks[at - 1]?.fromQuantity ?? 0));
  return wrong < 0 ? ok(breaks) : refuse('price-breaks-not-rising', {}, `/breaks/${wrong}/fromQuantity`);
}

function piecesOrdered(quantity: Quantity, { nominalGrams, piecesPerCase }: PricedPiece): number {
  switch (quantity.unit) {
    case 'piece':
      return quantity.count;
    case 'case':
      return quantity.count * piecesPerCase;
    case 'kg':
      return piecesNearest(quantity.grams, grams(nominalGrams), quantity.notLess);
  }
}
