import fc from 'fast-check';
import { checkDigitMod10, gtin14VariableMeasure, isGtin } from './gtin';

const digits = (length: number): fc.Arbitrary<string> =>
  fc.array(fc.integer({ min: 0, max: 9 }), { minLength: length, maxLength: length }).map((each) => each.join(''));

describe('a GTIN', () => {
  it('of a variable measure item is always valid and starts with 9', () => {
    fc.assert(
      fc.property(digits(12), (reference) => {
        const gtin = gtin14VariableMeasure(reference);
        expect(gtin.slice(0, 13)).toBe(`9${reference}`);
        expect(isGtin(gtin)).toBe(true);
      }),
    );
  });

  it('shows any one digit that was misread', () => {
    fc.assert(
      fc.property(digits(12), fc.nat({ max: 13 }), fc.integer({ min: 1, max: 9 }), (reference, place, shift) => {
        const gtin = gtin14VariableMeasure(reference);
        const wrong = (Number(gtin[place]) + shift) % 10;
        expect(isGtin(gtin.slice(0, place) + wrong + gtin.slice(place + 1))).toBe(false);
      }),
    );
  });

  it('has digits only, and 8, 12, 13 or 14 of them', () => {
    for (const text of ['', '0', '1234567890', '629104150021X', ' 6291041500213', '629104150021３']) {
      expect(isGtin(text)).toBe(false);
    }
    expect(() => checkDigitMod10('')).toThrow(RangeError);
    expect(() => checkDigitMod10('12A')).toThrow(RangeError);
    expect(() => gtin14VariableMeasure('95212345432')).toThrow(RangeError);
  });
});
