import { divideHalfUp, grams, minorUnits, priceForGrams, toSafeNumber, type MinorUnits } from '@seamwright/shared/util';

/** A line as it was placed, with its price fixed. */
export interface PricedLine {
  readonly basis: 'kg' | 'piece' | 'case';
  readonly priceMinor: number;
  readonly pieces: number;
  readonly estimateMinor: number;
}

/** What of a line is in packs. */
export interface Packed {
  readonly pieces: number;
  readonly grams: number;
}

/**
 * The real amount of a line in minor units, from what was packed. By weight: `round_half_up(net grams × price per kg /
 * 1000)`. By piece or case: the placed amount × pieces packed / pieces ordered, half up, which is `count × price` for
 * whole pieces and whole cases.
 */
export function packedAmount(line: PricedLine, packed: Packed): MinorUnits {
  if (line.basis === 'kg') return priceForGrams(grams(packed.grams), minorUnits(line.priceMinor));
  const amount = divideHalfUp(BigInt(line.estimateMinor) * BigInt(packed.pieces), BigInt(line.pieces));
  return minorUnits(toSafeNumber(amount));
}
