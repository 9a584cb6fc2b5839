import { currencyCodes, minorDigits } from './currency';

// Source: ISO 4217 minor units, as carried by a public currency table dated 25 June 2024.
const PUBLISHED = {
  0: ['JPY', 'KRW', 'ISK'],
  2: ['GBP', 'EUR', 'USD', 'CHF', 'SEK', 'NOK', 'DKK', 'PLN', 'CZK', 'HUF', 'AUD', 'NZD', 'CAD'],
  3: ['KWD', 'BHD', 'TND', 'JOD', 'OMR'],
  4: ['CLF', 'UYW'],
};

describe('ISO 4217 minor units', () => {
  it.each(Object.entries(PUBLISHED))('%s digits', (digits, codes) => {
    expect(currencyCodes.filter((code) => minorDigits(code) === Number(digits)).toSorted()).toEqual(codes.toSorted());
  });
});
