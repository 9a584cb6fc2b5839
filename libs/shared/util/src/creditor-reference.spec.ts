import fc from 'fast-check';
import { creditorReference, formatCreditorReference, isCreditorReference } from './creditor-reference';

const SIGNS = '0123456789ABCDEFGHIJKLMNOPQRSTUVWXYZ';
const references = fc.array(fc.constantFrom(...SIGNS), { minLength: 1, maxLength: 21 }).map((signs) => signs.join(''));

/** The rule done the long way: the whole number by big integers. */
function remainder(reference: string): bigint {
  const moved = reference.slice(4) + reference.slice(0, 4);
  return BigInt([...moved].map((sign) => SIGNS.indexOf(sign)).join('')) % 97n;
}

describe('a creditor reference', () => {
  it('that was made is valid, as it stands and as it is printed', () => {
    fc.assert(
      fc.property(references, (own) => {
        const reference = creditorReference(own);
        expect(reference.slice(4)).toBe(own);
        expect(remainder(reference)).toBe(1n);
        expect(isCreditorReference(reference)).toBe(true);
        expect(isCreditorReference(formatCreditorReference(reference).toLowerCase())).toBe(true);
      }),
    );
  });

  it('is printed in blocks of four', () => {
    expect(formatCreditorReference('RF18539007547034')).toBe('RF18 5390 0754 7034');
    expect(formatCreditorReference('RF18 5390 0754 7034')).toBe('RF18 5390 0754 7034');
  });

  it('cannot be made of nothing, of marks, or of more than 21 signs', () => {
    for (const own of ['', 'INV-1', 'A B', 'É1', '1'.repeat(22)]) {
      expect(() => creditorReference(own)).toThrow(RangeError);
    }
    for (const text of ['', 'RF18', 'GB18539007547034', 'RFAA539007547034', `RF18${'0'.repeat(10)}539007547034`]) {
      expect(isCreditorReference(text)).toBe(false);
    }
  });
});
