/** Where a quotient goes that is not whole: `up` to plus infinity, `down` to minus infinity, `half-up` to the nearest. */
export type Rounding = 'up' | 'down' | 'half-up';

/** Quotient rounded to minus infinity: 7/2 → 3, -7/2 → -4. Throws RangeError when the denominator is zero. */
export function divideDown(numerator: bigint, denominator: bigint): bigint {
  const quotient = numerator / denominator;
  const remainder = numerator % denominator;
  return remainder !== 0n && remainder < 0n !== denominator < 0n ? quotient - 1n : quotient;
}

/** Quotient rounded to plus infinity: 7/2 → 4, -7/2 → -3. Throws RangeError when the denominator is zero. */
export function divideUp(numerator: bigint, denominator: bigint): bigint {
  return -divideDown(-numerator, denominator);
}

/**
 * Quotient rounded to the nearest whole number. A half goes away from zero, so that a credit undoes a charge to the
 * penny: 0.5 → 1, -0.5 → -1. Throws RangeError when the denominator is zero.
 */
export function divideHalfUp(numerator: bigint, denominator: bigint): bigint {
  const size = absolute(denominator);
  const rounded = (2n * absolute(numerator) + size) / (2n * size);
  return numerator < 0n === denominator < 0n ? rounded : -rounded;
}

/** Quotient rounded as asked. Throws RangeError when the denominator is zero. */
export function divideRounded(numerator: bigint, denominator: bigint, rounding: Rounding): bigint {
  switch (rounding) {
    case 'up':
      return divideUp(numerator, denominator);
    case 'down':
      return divideDown(numerator, denominator);
    case 'half-up':
      return divideHalfUp(numerator, denominator);
  }
}

/** The same whole number as a `number`. Throws RangeError past ±(2^53 − 1), where a number would lose digits. */
export function toSafeNumber(whole: bigint): number {
  const value = Number(whole);
  if (!Number.isSafeInteger(value)) {
    throw new RangeError(`${whole} is past the largest exact whole number`);
  }
  return value;
}

function absolute(whole: bigint): bigint {
  return whole < 0n ? -whole : whole;
}
