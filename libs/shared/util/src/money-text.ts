import { minorDigits, type CurrencyCode } from './currency';
import { readDecimal, toDecimalText } from './decimal-text';
import { minorUnits, type MinorUnits } from './money';
import { numberFormat } from './number-format';
import { ok, refuse, type Result } from './result';

/** The amount with its currency's sign and all its digits: (123450, 'GBP') → "£1,234.50". Exact at any size. */
export function formatMoney(minor: MinorUnits, currency: CurrencyCode, locale = 'en-GB'): string {
  const digits = minorDigits(currency);
  return numberFormat(locale, {
    style: 'currency',
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(toDecimalText(BigInt(minor), digits));
}

/**
 * Reads a typed amount: "1,234.50", "1234,5", "£12", "12.00 GBP", "-5". A comma before exactly three digits groups
 * thousands ("1,234"); in a currency of three or four decimals that would be a guess and is refused.
 * Refuses with `money-unreadable`, `money-too-many-decimals` (digits), `money-ambiguous` or `money-too-large`.
 */
export function parseMoney(text: string, currency: CurrencyCode): Result<MinorUnits> {
  const digits = minorDigits(currency);
  const bare = withoutCurrency(text, currency);
  if (digits >= 3 && /^[-\u2212]?[1-9]\d{0,2},\d{3}$/.test(bare)) {
    return refuse('money-ambiguous', { text });
  }
  const amount = readDecimal(bare, digits, 'group');
  if (amount === 'unreadable') {
    return refuse('money-unreadable', { text });
  }
  if (amount === 'too-many-decimals') {
    return refuse('money-too-many-decimals', { text, digits });
  }
  const size = Number(amount);
  return Number.isSafeInteger(size) ? ok(minorUnits(size)) : refuse('money-too-large', { text });
}

/** Takes the currency's own code or sign off either end, behind a minus; any other currency's stays and is refused. */
function withoutCurrency(text: string, currency: CurrencyCode): string {
  const [, sign = '', rest = ''] = /^([-\u2212]?)\s*(.*)$/s.exec(text.trim()) ?? [];
  for (const mark of [currency, signOf(currency, 'symbol'), signOf(currency, 'narrowSymbol')]) {
    if (rest.startsWith(mark)) {
      return sign + rest.slice(mark.length).trimStart();
    }
    if (rest.endsWith(mark)) {
      return sign + rest.slice(0, -mark.length).trimEnd();
    }
  }
  return sign + rest;
}

/** "US$" as it is shown among other currencies, or "$" as it is typed. */
function signOf(currency: CurrencyCode, currencyDisplay: 'symbol' | 'narrowSymbol'): string {
  const parts = numberFormat('en-GB', { style: 'currency', currency, currencyDisplay }).formatToParts(0);
  return parts.find((part) => part.type === 'currency')?.value ?? currency;
}
