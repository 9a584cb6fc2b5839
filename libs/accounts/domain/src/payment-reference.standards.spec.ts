import { creditorReference, formatCreditorReference, isCreditorReference } from '@seamwright/shared/util';

describe('payment reference of an invoice', () => {
  it('is the worked example for the reference 2348231', () => {
    // Source: ISO 11649, Annex B, as quoted on a public encyclopaedia page.
    expect(creditorReference('2348231')).toBe('RF712348231');
  });

  it('is valid for every invoice number, and printed in fours', () => {
    for (const number of [2001, 2002, 99_999, 1_000_000]) {
      const reference = creditorReference(String(number));
      expect(isCreditorReference(reference)).toBe(true);
      expect(isCreditorReference(formatCreditorReference(reference))).toBe(true);
    }
  });
});
