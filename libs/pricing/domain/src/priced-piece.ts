import { grams, minorUnits, priceForGrams, type MinorUnits } from '@seamwright/shared/util';
import type { PriceBasis } from './price-candidate';

/** What a price must know of the cut with its choices. */
export interface PricedPiece {
  readonly nominalGrams: number;
  readonly piecesPerCase: number;
}

/**
 * The choices' price change in the price's basis: as it is per kg; for a piece or case on its nominal weight,
 * `change per kg × nominal grams / 1000`, a half penny away from zero.
 */
export function choicesChange(basis: PriceBasis, changeMinorPerKg: number, piece: PricedPiece): MinorUnits {
  const change = minorUnits(changeMinorPerKg);
  if (basis === 'kg') return change;
  return priceForGrams(grams(piece.nominalGrams * (basis === 'case' ? piece.piecesPerCase : 1)), change);
}
