import { lineWeights, type LineWeights, type ResolvedOffer } from '@seamwright/catalogue/domain';
import { quantity, type Quantity } from '@seamwright/shared/util';
import type { OrderUnit } from './buy-box';

const GRAMS_IN_A_TENTH = 100;

/** The quantity that the box's unit and amount say; null while the amount is none. */
export function quantityOf(unit: OrderUnit, amount: number | null): Quantity | null {
  if (amount === null) return null;
  const read = quantity(unit === 'kg' ? { unit, grams: amount * GRAMS_IN_A_TENTH } : { unit, count: amount });
  return read.ok ? read.value : null;
}

export const weightsOf = (resolved: ResolvedOffer | null, asked: Quantity | null): LineWeights | null =>
  resolved && asked && lineWeights(resolved, asked);

/** The amount that comes to about the same weight in another unit, so that changing the unit keeps what was meant. */
export function amountIn(unit: OrderUnit, { piecesPerCase }: ResolvedOffer, weights: LineWeights | null): number {
  if (weights === null) return 1;
  switch (unit) {
    case 'piece':
      return weights.pieces;
    case 'case':
      return Math.max(1, Math.round(weights.pieces / piecesPerCase));
    case 'kg':
      return Math.max(1, Math.round(weights.estimateGrams / GRAMS_IN_A_TENTH));
  }
}
