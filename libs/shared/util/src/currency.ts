import { ok, refuse, type Result } from './result';

/** Digits after the point by currency. Source: ISO 4217, as carried by a public currency table of June 2024. */
const MINOR_DIGITS = {
  GBP: 2,
  EUR: 2,
  USD: 2,
  CHF: 2,
  SEK: 2,
  NOK: 2,
  DKK: 2,
  PLN: 2,
  CZK: 2,
  HUF: 2,
  AUD: 2,
  NZD: 2,
  CAD: 2,
  JPY: 0,
  KRW: 0,
  ISK: 0,
  KWD: 3,
  BHD: 3,
  TND: 3,
  JOD: 3,
  OMR: 3,
  CLF: 4,
  UYW: 4,
} as const;

/** ISO 4217 code of a currency that the house knows. */
export type CurrencyCode = keyof typeof MINOR_DIGITS;

export const currencyCodes = Object.keys(MINOR_DIGITS) as readonly CurrencyCode[];

/** Reads a currency code, capitals only. Refuses with `currency-unknown`. */
export function currencyCode(text: string): Result<CurrencyCode> {
  return isCurrencyCode(text) ? ok(text) : refuse('currency-unknown', { currency: text });
}

function isCurrencyCode(text: string): text is CurrencyCode {
  return Object.hasOwn(MINOR_DIGITS, text);
}

/** How many digits of the currency stand after the point: GBP 2, JPY 0, KWD 3. */
export function minorDigits(currency: CurrencyCode): number {
  return MINOR_DIGITS[currency];
}
