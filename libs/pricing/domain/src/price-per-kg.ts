import { divideHalfUp, minorUnits, toSafeNumber, type MinorUnits } from '@seamwright/shared/util';
import type { PriceBasis } from './price-candidate';
import type { PricedPiece } from './priced-piece';

const GRAMS_PER_KG = 1_000n;

/** A price put per kg of nominal weight, half up, to compare prices of any basis; nothing is charged by it. */
export function pricePerKg(basis: PriceBasis, priceMinor: number, piece: PricedPiece): MinorUnits {
  if (basis === 'kg') return minorUnits(priceMinor);
  const pieces = basis === 'piece' ? 1 : piece.piecesPerCase;
  const nominal = BigInt(piece.nominalGrams) * BigInt(pieces);
  return minorUnits(toSafeNumber(divideHalfUp(BigInt(priceMinor) * GRAMS_PER_KG, nominal)));
}
