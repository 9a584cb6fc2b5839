import { checkDigitMod10, gtin14VariableMeasure, isGtin } from './gtin';

describe('GS1 check digits', () => {
  it.each([
    ['6291041500213', 'gs1.org and GS1 Hong Kong, worked table (sum 57)'],
    ['7300011000017', 'GS1 Sweden, worked example (sum 23)'],
    ['5012345678900', 'GS1 UK leaflet, number 501234567890; its check digit computed'],
    ['1234567890128', 'GS1 Barcode Syntax Dictionary, linter test'],
    ['416000336108', 'GS1 Barcode Syntax Dictionary, linter test'],
    ['02345673', 'GS1 Barcode Syntax Dictionary, linter test'],
    ['12345678901231', 'GS1 Barcode Syntax Dictionary, linter test'],
    ['09521234543213', "GS1 Digital Link example on a barcode project's wiki"],
  ])('%s is a GTIN (%s)', (gtin) => {
    expect(isGtin(gtin)).toBe(true);
    expect(checkDigitMod10(gtin.slice(0, -1))).toBe(Number(gtin.slice(-1)));
  });

  it.each([
    ['123456789012345675', 'GS1 Barcode Syntax Dictionary, linter test'],
    ['106141411234567897', "a barcode project's wiki, accepted by the GS1 Barcode Syntax Engine"],
  ])('the SSCC %s follows the same rule but is no GTIN (%s)', (sscc) => {
    expect(checkDigitMod10(sscc.slice(0, -1))).toBe(Number(sscc.slice(-1)));
    expect(isGtin(sscc)).toBe(false);
  });

  // Source: GS1 Barcode Syntax Dictionary, linter tests.
  it.each(['12345673', '416000336109', '1234567890129', '12345678901232'])('%s is refused', (text) => {
    expect(isGtin(text)).toBe(false);
  });

  // Source: GS1 Barcode Syntax Dictionary, linter test.
  it('the SSCC 123456789012345670 has a wrong check digit', () => {
    expect(checkDigitMod10('12345678901234567')).not.toBe(0);
  });
});

describe('GTIN-14 of a variable measure trade item', () => {
  // Source: made-up number on the GS1 example prefix 952, accepted by the GS1 Barcode Syntax Engine; …215 is rejected.
  it('is indicator 9, item reference and check digit', () => {
    expect(gtin14VariableMeasure('952123454321')).toBe('99521234543216');
    expect(isGtin('99521234543216')).toBe(true);
    expect(isGtin('99521234543215')).toBe(false);
  });
});
