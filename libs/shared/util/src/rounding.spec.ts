import fc from 'fast-check';
import { divideDown, divideHalfUp, divideRounded, divideUp, toSafeNumber } from './rounding';

const whole = fc.bigInt({ min: -(10n ** 20n), max: 10n ** 20n });
const notZero = whole.filter((value) => value !== 0n);
const size = (value: bigint): bigint => (value < 0n ? -value : value);

describe('rounding a quotient', () => {
  it('takes a half away from zero', () => {
    expect(divideHalfUp(1n, 2n)).toBe(1n);
    expect(divideHalfUp(-1n, 2n)).toBe(-1n);
    expect(divideHalfUp(1n, -2n)).toBe(-1n);
    expect(divideHalfUp(-1n, -2n)).toBe(1n);
    expect(divideHalfUp(-49n, 100n)).toBe(0n);
  });

  it('goes up to plus infinity and down to minus infinity', () => {
    expect([7n, -7n, 6n, -6n].map((n) => divideUp(n, 2n))).toEqual([4n, -3n, 3n, -3n]);
    expect([7n, -7n, 6n, -6n].map((n) => divideDown(n, 2n))).toEqual([3n, -4n, 3n, -3n]);
    expect(divideUp(7n, -2n)).toBe(-3n);
    expect(divideDown(7n, -2n)).toBe(-4n);
  });

  it('is symmetric when rounding half up', () => {
    fc.assert(fc.property(whole, notZero, (n, d) => divideHalfUp(-n, d) === -divideHalfUp(n, d)));
  });

  it('stays within half a unit of the exact quotient', () => {
    fc.assert(fc.property(whole, notZero, (n, d) => 2n * size(divideHalfUp(n, d) * d - n) <= size(d)));
  });

  it('brackets the exact quotient by up and down, which meet only where it is whole', () => {
    fc.assert(
      fc.property(whole, notZero, (n, d) => {
        const [low, high] = [divideRounded(n, d, 'down'), divideRounded(n, d, 'up')];
        expect(high - low).toBe(n % d === 0n ? 0n : 1n);
        expect([low, high]).toContain(divideRounded(n, d, 'half-up'));
        const [scaled, sign] = [n * (d < 0n ? -1n : 1n), size(d)];
        expect(low * sign <= scaled && scaled <= high * sign).toBe(true);
      }),
    );
  });

  it.each([divideHalfUp, divideUp, divideDown])('refuses to divide by zero (%p)', (divide) => {
    expect(() => divide(1n, 0n)).toThrow(RangeError);
  });
});

describe('a whole number as a number', () => {
  it('keeps the largest exact one and throws past it', () => {
    expect(toSafeNumber(9007199254740991n)).toBe(9007199254740991);
    expect(toSafeNumber(-9007199254740991n)).toBe(-9007199254740991);
    expect(() => toSafeNumber(9007199254740992n)).toThrow(RangeError);
    expect(() => toSafeNumber(-9007199254740992n)).toThrow(RangeError);
  });
});
