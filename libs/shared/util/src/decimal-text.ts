/** A decimal number as text, the form in which `Intl.NumberFormat` takes it without passing through a float. */
export type DecimalText = `${number}`;

/** What a comma means that stands alone before exactly three digits: "12,480". */
export type LoneComma = 'decimal' | 'group';

export type DecimalFault = 'unreadable' | 'too-many-decimals';

/** Whole number of the smallest unit written with its point: (12480, 3) → "12.480", (-5, 2) → "-0.05". */
export function toDecimalText(smallest: bigint, decimals: number): DecimalText {
  const sign = smallest < 0n ? '-' : '';
  const digits = (smallest < 0n ? -smallest : smallest).toString().padStart(decimals + 1, '0');
  const point = digits.length - decimals;
  return `${sign}${digits.slice(0, point)}${decimals === 0 ? '' : `.${digits.slice(point)}`}` as DecimalText;
}

const SIGN = /^[-\u2212]/;
const SPACED_GROUPS = /^\d{1,3}(?:[ \u00a0\u2009\u202f]\d{3})+(?=[.,]|$)/;
const SPACES = /[ \u00a0\u2009\u202f]/g;
const PLAIN = /^(\d*)(?:[.,](\d+))?$/;
const POINT_LAST = /^(\d{1,3}(?:,\d{3})+)\.(\d+)$/;
const COMMA_LAST = /^(\d{1,3}(?:\.\d{3})+),(\d+)$/;
const COMMA_GROUPS = /^[1-9]\d{0,2}(?:,\d{3})+$/;

/**
 * Reads what a person typed, point or comma, as a whole number of the smallest unit: ("12,48", 3) → 12480. Where both
 * marks occur the last is the decimal mark and the other must group by threes. Nothing is ever rounded away.
 */
export function readDecimal(text: string, decimals: number, loneComma: LoneComma): bigint | DecimalFault {
  const trimmed = text.trim();
  const unsigned = trimmed.replace(SIGN, '');
  const compact = SPACED_GROUPS.test(unsigned) ? unsigned.replace(SPACES, '') : unsigned;
  const parts = splitAtMark(compact, loneComma);
  if (parts === undefined) {
    return 'unreadable';
  }
  if (parts.fraction.length > decimals) {
    return 'too-many-decimals';
  }
  const size = BigInt(parts.whole + parts.fraction.padEnd(decimals, '0'));
  return SIGN.test(trimmed) ? -size : size;
}

function splitAtMark(text: string, loneComma: LoneComma): { whole: string; fraction: string } | undefined {
  if (loneComma === 'group' && COMMA_GROUPS.test(text)) {
    return { whole: text.replaceAll(',', ''), fraction: '' };
  }
  const match = PLAIN.exec(text) ?? POINT_LAST.exec(text) ?? COMMA_LAST.exec(text);
  const whole = match?.[1] ?? '';
  const fraction = match?.[2] ?? '';
  return whole + fraction === '' ? undefined : { whole: whole.replace(/[.,]/g, '') || '0', fraction };
}
