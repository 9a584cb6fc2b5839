import { currencyCode, currencyCodes, minorDigits } from './currency';

describe('a currency code', () => {
  it('is accepted when the house knows it', () => {
    expect(currencyCodes.map((code) => currencyCode(code).ok)).not.toContain(false);
    expect(currencyCode('GBP')).toEqual({ ok: true, value: 'GBP' });
  });

  it.each(['gbp', 'XXX', '', 'toString'])('is refused otherwise (%p)', (text) => {
    expect(currencyCode(text)).toEqual({
      ok: false,
      refusal: { code: 'currency-unknown', params: { currency: text } },
    });
  });

  it('tells how many digits stand after the point', () => {
    expect(minorDigits('GBP')).toBe(2);
  });
});
