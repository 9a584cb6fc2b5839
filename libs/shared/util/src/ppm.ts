import { toDecimalText } from './decimal-text';
import { numberFormat } from './number-format';
import { divideRounded, toSafeNumber, type Rounding } from './rounding';
import { UNIT_SPACE } from './unit-space';
import { wholeNumber } from './whole-number';

/** A yield, rate or margin as a whole number over 1,000,000: 0.605 = 605,000. */
export type Ppm = number & { readonly __unit: 'ppm' };

/** Brands a whole number over 1,000,000. Throws RangeError when it is not a safe integer. */
export function ppm(parts: number): Ppm {
  return wholeNumber(parts, 'A rate over 1,000,000') as Ppm;
}

/** A whole number × a rate, rounded to a whole number as asked. Throws RangeError past ±(2^53 − 1). */
export function multiplyPpm(whole: number, rate: Ppm, rounding: Rounding): number {
  return toSafeNumber(divideRounded(BigInt(whole) * BigInt(rate), 1_000_000n, rounding));
}

/** The rate in per cent: 605,000 → "60.5 %". Shows what digits it has, or as many as `decimals` says. */
export function formatPercent(rate: Ppm, locale = 'en-GB', decimals?: number): string {
  const parts = numberFormat(locale, {
    style: 'percent',
    minimumFractionDigits: decimals ?? 0,
    maximumFractionDigits: decimals ?? 4,
  }).formatToParts(toDecimalText(BigInt(rate), 6));
  // English sets the sign tight against the digits; every other unit of the house stands apart, and so does this one.
  const isTight = (at: number): boolean =>
    parts[at]?.type === 'percentSign' && ['integer', 'fraction'].includes(parts[at - 1]?.type ?? '');
  return parts.map(({ value }, at) => (isTight(at) ? `${UNIT_SPACE}${value}` : value)).join('');
}
