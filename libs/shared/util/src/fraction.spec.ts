import fc from 'fast-check';
import {
  addFractions,
  compareFractions,
  divideFractions,
  fraction,
  fractionOfPpm,
  multiplyFractions,
  roundFraction,
  subtractFractions,
  type Fraction,
} from './fraction';
import { ppm } from './ppm';

const whole = fc.bigInt({ min: -(10n ** 12n), max: 10n ** 12n });
const fractions = fc
  .tuple(
    whole,
    whole.filter((d) => d !== 0n),
  )
  .map(([n, d]) => fraction(n, d));

describe('an exact fraction', () => {
  it('is kept in lowest terms, its sign above', () => {
    expect(fraction(6n, -4n)).toEqual({ n: -3n, d: 2n });
    expect(fraction(0n, -7n)).toEqual({ n: 0n, d: 1n });
    expect(fraction(5n)).toEqual({ n: 5n, d: 1n });
    expect(fractionOfPpm(ppm(600_000))).toEqual({ n: 3n, d: 5n });
    expect(() => fraction(1n, 0n)).toThrow(RangeError);
  });

  it('adds, subtracts, multiplies and divides', () => {
    const [half, third] = [fraction(1n, 2n), fraction(1n, 3n)];
    expect(addFractions(half, third)).toEqual(fraction(5n, 6n));
    expect(subtractFractions(half, third)).toEqual(fraction(1n, 6n));
    expect(multiplyFractions(half, third)).toEqual(fraction(1n, 6n));
    expect(divideFractions(half, third)).toEqual(fraction(3n, 2n));
    expect(() => divideFractions(half, fraction(0n))).toThrow(RangeError);
  });

  it('undoes what it did', () => {
    fc.assert(
      fc.property(fractions, fractions, (a, b) => {
        expect(subtractFractions(addFractions(a, b), b)).toEqual(a);
        fc.pre(b.n !== 0n);
        expect(multiplyFractions(divideFractions(a, b), b)).toEqual(a);
      }),
    );
  });

  it('distributes exactly', () => {
    fc.assert(
      fc.property(fractions, fractions, fractions, (a, b, c) => {
        const left = multiplyFractions(a, addFractions(b, c));
        expect(left).toEqual(addFractions(multiplyFractions(a, b), multiplyFractions(a, c)));
      }),
    );
  });

  it('compares by value', () => {
    const compare = (a: Fraction, b: Fraction): bigint => subtractFractions(a, b).n;
    expect(compareFractions(fraction(1n, 3n), fraction(2n, 6n))).toBe(0);
    fc.assert(
      fc.property(fractions, fractions, (a, b) => {
        const difference = compare(a, b);
        expect(compareFractions(a, b)).toBe(difference === 0n ? 0 : difference < 0n ? -1 : 1);
      }),
    );
  });

  it('is rounded once, at the end', () => {
    expect(roundFraction(fraction(-1n, 2n), 'half-up')).toBe(-1n);
    expect(roundFraction(fraction(-1n, 2n), 'up')).toBe(0n);
    expect(roundFraction(fraction(7n, 3n), 'down')).toBe(2n);
  });
});
