import type { Ppm } from './ppm';
import { divideRounded, type Rounding } from './rounding';

/** An exact fraction in lowest terms; the denominator is above zero. For sums that are rounded once, at the end. */
export interface Fraction {
  readonly n: bigint;
  readonly d: bigint;
}

/** n/d in lowest terms. Throws RangeError when d is zero. */
export function fraction(n: bigint, d = 1n): Fraction {
  if (d === 0n) {
    throw new RangeError('A fraction needs a denominator other than zero');
  }
  const divisor = d < 0n ? -commonDivisor(n, d) : commonDivisor(n, d);
  return { n: n / divisor, d: d / divisor };
}

/** The rate as an exact fraction: 600,000 → 3/5. */
export function fractionOfPpm(rate: Ppm): Fraction {
  return fraction(BigInt(rate), 1_000_000n);
}

export function addFractions(a: Fraction, b: Fraction): Fraction {
  return fraction(a.n * b.d + b.n * a.d, a.d * b.d);
}

export function subtractFractions(a: Fraction, b: Fraction): Fraction {
  return fraction(a.n * b.d - b.n * a.d, a.d * b.d);
}

export function multiplyFractions(a: Fraction, b: Fraction): Fraction {
  return fraction(a.n * b.n, a.d * b.d);
}

/** a ÷ b. Throws RangeError when b is zero. */
export function divideFractions(a: Fraction, b: Fraction): Fraction {
  return fraction(a.n * b.d, a.d * b.n);
}

/** Below zero when a < b, zero when they are the same, above zero when a > b. */
export function compareFractions(a: Fraction, b: Fraction): -1 | 0 | 1 {
  const difference = a.n * b.d - b.n * a.d;
  return difference === 0n ? 0 : difference < 0n ? -1 : 1;
}

/** The fraction as a whole number, rounded as asked. */
export function roundFraction(value: Fraction, rounding: Rounding): bigint {
  return divideRounded(value.n, value.d, rounding);
}

function commonDivisor(a: bigint, b: bigint): bigint {
  let [left, right] = [a < 0n ? -a : a, b < 0n ? -b : b];
  while (right !== 0n) {
    [left, right] = [right, left % right];
  }
  return left;
}
