import {
  divideDown,
  divideUp,
  grams,
  sumGrams,
  toSafeNumber,
  type Grams,
  type PlantDate,
} from '@seamwright/shared/util';
import { firstExpiredFirst, lotFit, type DayOfUse, type Lot } from '@seamwright/stock/domain';
import { byPrimal, type CuttingListRow } from './cutting-list';
import type { Primal } from './cutting-line';

/** Whole pieces to take from one lot. */
export interface Pull {
  readonly lotId: string;
  readonly lotCode: string;
  readonly useBy: PlantDate | null;
  readonly pieces: number;
  /** Pieces × the lot's mean piece weight, rounded down to the gram. */
  readonly pulledGrams: Grams;
}

/** What to fetch of one primal. Left over and short exclude each other. */
export interface PullListRow {
  readonly primal: Primal;
  readonly outGrams: Grams;
  readonly neededGrams: Grams;
  readonly pulls: readonly Pull[];
  readonly pieces: number;
  readonly pulledGrams: Grams;
  readonly leftOverGrams: Grams;
  readonly shortGrams: Grams;
}

export type PullTotals = Omit<PullListRow, 'primal' | 'pulls'>;

/**
 * What to pull for a cutting list by simple yield: for each primal the grams in of its rows, covered with whole pieces
 * of lots that fit the day, first expired first, until it is covered or nothing is left. What is missing is named.
 */
export function pullList(rows: readonly CuttingListRow[], lots: readonly Lot[], day: DayOfUse): PullListRow[] {
  const fit = lots.filter((lot) => lotFit(lot, day).ok).sort(firstExpiredFirst);
  return byPrimal(rows).map(({ primal, totals }) => {
    const pulls = pullFrom(
      fit.filter(({ nodeId }) => nodeId === primal.id),
      totals.inGrams,
    );
    const pulledGrams = sumGrams(pulls.map((pull) => pull.pulledGrams));
    return {
      primal,
      outGrams: totals.outGrams,
      neededGrams: totals.inGrams,
      pulls,
      pieces: pulls.reduce((total, { pieces }) => total + pieces, 0),
      pulledGrams,
      leftOverGrams: grams(Math.max(0, pulledGrams - totals.inGrams)),
      shortGrams: grams(Math.max(0, totals.inGrams - pulledGrams)),
    };
  });
}

function pullFrom(lots: readonly Lot[], neededGrams: Grams): Pull[] {
  const pulls: Pull[] = [];
  let open = neededGrams as number;
  for (const lot of lots) {
    if (open <= 0) break;
    const pieces = Math.min(piecesOf(lot, open, 'up'), piecesOf(lot, lot.remainingGrams, 'down'));
    if (pieces === 0) continue;
    const pulledGrams = weightOf(lot, pieces);
    pulls.push({ lotId: lot.id, lotCode: lot.code, useBy: lot.useBy, pieces, pulledGrams });
    open -= pulledGrams;
  }
  return pulls;
}

/** Whole pieces for a weight at the lot's mean piece weight: enough of them (`up`), or no more than it (`down`). */
function piecesOf({ receivedGrams, receivedPieces }: Lot, weight: number, rounding: 'up' | 'down'): number {
  const divide = rounding === 'up' ? divideUp : divideDown;
  return toSafeNumber(divide(BigInt(weight) * BigInt(receivedPieces), BigInt(receivedGrams)));
}

function weightOf({ receivedGrams, receivedPieces }: Lot, pieces: number): Grams {
  return grams(toSafeNumber(divideDown(BigInt(pieces) * BigInt(receivedGrams), BigInt(receivedPieces))));
}

export function pullTotals(rows: readonly PullListRow[]): PullTotals {
  const sum = (of: (row: PullListRow) => Grams): Grams => sumGrams(rows.map(of));
  return {
    outGrams: sum((row) => row.outGrams),
    neededGrams: sum((row) => row.neededGrams),
    pieces: rows.reduce((total, { pieces }) => total + pieces, 0),
    pulledGrams: sum((row) => row.pulledGrams),
    leftOverGrams: sum((row) => row.leftOverGrams),
    shortGrams: sum((row) => row.shortGrams),
  };
}
