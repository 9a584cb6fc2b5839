import { grams, sumGrams, toSafeNumber, type Grams } from '@seamwright/shared/util';
import type { CuttingLine } from './cutting-line';

/** How much of a cut. Cases are those that were ordered as cases; the pieces beyond them are loose. */
export interface CutQuantity {
  readonly pieces: number;
  readonly cases: number;
  readonly loosePieces: number;
  /** Expected weight: pieces × nominal weight. */
  readonly outGrams: Grams;
}

/** What one line asks for. A case line that fell short keeps its whole cases; the rest is loose. */
export function lineQuantity({ cut, inCases, pieces }: CuttingLine): CutQuantity {
  const cases = inCases ? Math.floor(pieces / cut.piecesPerCase) : 0;
  return {
    pieces,
    cases,
    loosePieces: pieces - cases * cut.piecesPerCase,
    outGrams: grams(toSafeNumber(BigInt(pieces) * BigInt(cut.pieceNominalGrams))),
  };
}

export function addQuantities(quantities: readonly CutQuantity[]): CutQuantity {
  const sum = (of: (each: CutQuantity) => number): number => quantities.reduce((total, each) => total + of(each), 0);
  return {
    pieces: sum(({ pieces }) => pieces),
    cases: sum(({ cases }) => cases),
    loosePieces: sum(({ loosePieces }) => loosePieces),
    outGrams: sumGrams(quantities.map(({ outGrams }) => outGrams)),
  };
}
