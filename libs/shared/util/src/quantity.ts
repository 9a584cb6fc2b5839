import { divideHalfUp, divideUp, toSafeNumber } from './rounding';
import { ok, refuse, type Result } from './result';
import { grams, type Grams } from './weight';

/**
 * What is ordered: so many pieces, so many cases, or about so many grams of a piece cut. `notLess` asks for pieces that
 * weigh at least that much.
 */
export type Quantity =
  | { readonly unit: 'piece' | 'case'; readonly count: number }
  | { readonly unit: 'kg'; readonly grams: Grams; readonly notLess: boolean };

export type QuantityInput =
  | { readonly unit: 'piece' | 'case'; readonly count: number }
  | { readonly unit: 'kg'; readonly grams: number; readonly notLess?: boolean };

const MOST_COUNT = 100_000;
const MOST_GRAMS = 100_000_000;

/**
 * Checks an ordered quantity: whole, above zero, at most 100,000 pieces or cases, at most 100 t. Refuses with
 * `quantity-not-whole`, `quantity-not-positive` or `quantity-too-large` (most), pointing at `/count` or `/grams`.
 */
export function quantity(input: QuantityInput): Result<Quantity> {
  if (input.unit === 'kg') {
    const weight = withinLimits(input.grams, MOST_GRAMS, '/grams');
    return weight.ok ? ok({ unit: 'kg', grams: grams(weight.value), notLess: input.notLess ?? false }) : weight;
  }
  const count = withinLimits(input.count, MOST_COUNT, '/count');
  return count.ok ? ok({ unit: input.unit, count: count.value }) : count;
}

/**
 * The whole number of pieces nearest to a target weight; halfway takes the piece more. At least one piece, and never
 * under the target (at nominal weight) when `notLess`. Throws RangeError when the nominal weight is not above zero.
 */
export function piecesNearest(targetGrams: Grams, nominalPieceGrams: Grams, notLess: boolean): number {
  if (nominalPieceGrams <= 0) {
    throw new RangeError('The nominal weight of a piece must be above zero');
  }
  const divide = notLess ? divideUp : divideHalfUp;
  return Math.max(1, toSafeNumber(divide(BigInt(targetGrams), BigInt(nominalPieceGrams))));
}

function withinLimits(value: number, most: number, pointer: string): Result<number> {
  if (!Number.isInteger(value)) {
    return refuse('quantity-not-whole', {}, pointer);
  }
  if (value <= 0) {
    return refuse('quantity-not-positive', {}, pointer);
  }
  return value > most ? refuse('quantity-too-large', { most }, pointer) : ok(value);
}
