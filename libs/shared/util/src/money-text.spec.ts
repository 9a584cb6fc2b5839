import fc from 'fast-check';
import { currencyCodes, type CurrencyCode } from './currency';
import { minorUnits } from './money';
import { formatMoney, parseMoney } from './money-text';

const amounts = fc.maxSafeInteger().map(minorUnits);

function refusalOf(text: string, currency: CurrencyCode): string | undefined {
  const result = parseMoney(text, currency);
  return result.ok ? undefined : result.refusal.code;
}

describe('writing an amount', () => {
  it('shows all the digits of the currency', () => {
    expect(formatMoney(minorUnits(123_450), 'GBP')).toBe('£1,234.50');
    expect(formatMoney(minorUnits(-5), 'GBP')).toBe('-£0.05');
    expect(formatMoney(minorUnits(1234), 'JPY')).toBe('JP¥1,234');
    expect(formatMoney(minorUnits(1234), 'KWD')).toBe('KWD\u00a01.234');
    expect(formatMoney(minorUnits(123_450), 'EUR', 'de-DE')).toBe('1.234,50\u00a0€');
  });

  it('stays exact where a float would not', () => {
    expect(formatMoney(minorUnits(9007199254740991), 'GBP')).toBe('£90,071,992,547,409.91');
  });
});

describe('reading an amount', () => {
  it.each<[string, CurrencyCode, number]>([
    ['1,234.50', 'GBP', 123_450],
    ['1.234,50', 'EUR', 123_450],
    ['1 234,50', 'EUR', 123_450],
    ['1,234', 'GBP', 123_400],
    ['1,234,567', 'GBP', 123_456_700],
    ['12,5', 'GBP', 1250],
    ['.5', 'GBP', 50],
    ['£12', 'GBP', 1200],
    ['-£12.01', 'GBP', -1201],
    ['£-12.01', 'GBP', -1201],
    ['\u221212.01', 'GBP', -1201],
    ['GBP 12.00', 'GBP', 1200],
    ['$3.10', 'USD', 310],
    ['  7 ', 'GBP', 700],
    ['1,234', 'JPY', 1234],
    ['1.234', 'KWD', 1234],
    ['0,234', 'KWD', 234],
  ])('takes %p in %s as %d', (text, currency, expected) => {
    expect(parseMoney(text, currency)).toEqual({ ok: true, value: expected });
  });

  it.each<[string, CurrencyCode, string]>([
    ['', 'GBP', 'money-unreadable'],
    ['£', 'GBP', 'money-unreadable'],
    ['twelve', 'GBP', 'money-unreadable'],
    ['$12', 'GBP', 'money-unreadable'],
    ['1e3', 'GBP', 'money-unreadable'],
    ['0x10', 'GBP', 'money-unreadable'],
    ['12.', 'GBP', 'money-unreadable'],
    ['--5', 'GBP', 'money-unreadable'],
    ['1,23,456.00', 'GBP', 'money-unreadable'],
    ['1 23', 'GBP', 'money-unreadable'],
    ['1.234', 'GBP', 'money-too-many-decimals'],
    ['0,123', 'GBP', 'money-too-many-decimals'],
    ['1.5', 'JPY', 'money-too-many-decimals'],
    ['1,234', 'KWD', 'money-ambiguous'],
    ['-1,234', 'CLF', 'money-ambiguous'],
    ['90071992547409.92', 'GBP', 'money-too-large'],
  ])('refuses %p in %s: %s', (text, currency, code) => {
    expect(refusalOf(text, currency)).toBe(code);
  });

  it('gives back every amount that was written, in every currency', () => {
    fc.assert(
      fc.property(amounts, fc.constantFrom(...currencyCodes), (amount, currency) => {
        expect(parseMoney(formatMoney(amount, currency), currency)).toEqual({ ok: true, value: amount });
      }),
    );
  });

  it('gives back what was written the continental way', () => {
    fc.assert(
      fc.property(amounts, fc.constantFrom('de-DE', 'fr-FR', 'sv-SE'), (amount, locale) => {
        expect(parseMoney(formatMoney(amount, 'EUR', locale), 'EUR')).toEqual({ ok: true, value: amount });
      }),
    );
  });
});
