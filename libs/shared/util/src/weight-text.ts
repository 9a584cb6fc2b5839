import { readDecimal, toDecimalText } from './decimal-text';
import { numberFormat } from './number-format';
import { ok, refuse, type Result } from './result';
import { UNIT_SPACE } from './unit-space';
import { grams, type Grams } from './weight';

/** Kilograms with three decimals, without the unit: 12480 → "12.480". For columns headed "kg". */
export function formatKg(weight: Grams, locale = 'en-GB'): string {
  return numberFormat(locale, { minimumFractionDigits: 3, maximumFractionDigits: 3 }).format(
    toDecimalText(BigInt(weight), 3),
  );
}

/** Kilograms with three decimals, a space that never breaks and the unit: 12480 → "12.480 kg". */
export function formatKgWithUnit(weight: Grams, locale = 'en-GB'): string {
  return `${formatKg(weight, locale)}${UNIT_SPACE}kg`;
}

/**
 * Reads a typed weight in kilograms, with or without "kg": "12.48" and "12,48" are 12,480 g. A single point or comma is
 * always the decimal mark; thousands may be grouped only where that is plain ("1,234.500").
 * Refuses with `weight-unreadable`, `weight-too-many-decimals` (digits), `weight-negative` or `weight-too-large`.
 */
export function parseKg(text: string): Result<Grams> {
  const weight = readDecimal(text.trim().replace(/\s*kg$/i, ''), 3, 'decimal');
  if (weight === 'unreadable') {
    return refuse('weight-unreadable', { text });
  }
  if (weight === 'too-many-decimals') {
    return refuse('weight-too-many-decimals', { text, digits: 3 });
  }
  if (weight < 0n) {
    return refuse('weight-negative', { text });
  }
  const size = Number(weight);
  return Number.isSafeInteger(size) ? ok(grams(size)) : refuse('weight-too-large', { text });
}
