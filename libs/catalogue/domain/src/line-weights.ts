import { grams, piecesNearest, toSafeNumber, type Grams, type Quantity } from '@seamwright/shared/util';
import type { ResolvedOffer } from './resolve-offer';

/** What an ordered quantity comes to. `cases` is null when the pieces don't fill whole cases. */
export interface LineWeights {
  readonly pieces: number;
  readonly cases: number | null;
  readonly minGrams: Grams;
  readonly estimateGrams: Grams;
  readonly maxGrams: Grams;
}

/**
 * Pieces and weights of a line: pieces as they are, cases × pieces per case, and for "about so many kg" the whole
 * number of pieces nearest to the target. The estimate is pieces × nominal weight. Throws RangeError past 2^53 − 1 g.
 */
export function lineWeights(
  { piece, piecesPerCase }: Pick<ResolvedOffer, 'piece' | 'piecesPerCase'>,
  quantity: Quantity,
): LineWeights {
  const pieces = piecesOf(quantity, piece.nominalGrams, piecesPerCase);
  const times = (each: Grams): Grams => grams(toSafeNumber(BigInt(pieces) * BigInt(each)));
  return {
    pieces,
    cases: pieces % piecesPerCase === 0 ? pieces / piecesPerCase : null,
    minGrams: times(piece.minGrams),
    estimateGrams: times(piece.nominalGrams),
    maxGrams: times(piece.maxGrams),
  };
}

function piecesOf(quantity: Quantity, nominalGrams: Grams, piecesPerCase: number): number {
  switch (quantity.unit) {
    case 'piece':
      return quantity.count;
    case 'case':
      return quantity.count * piecesPerCase;
    case 'kg':
      return piecesNearest(quantity.grams, nominalGrams, quantity.notLess);
  }
}
