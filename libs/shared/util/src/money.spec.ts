import Decimal from 'decimal.js';
import fc from 'fast-check';
import { addMoney, minorUnits, priceForGrams, priceTimes, sumMoney, taxOn } from './money';
import { ppm } from './ppm';
import { grams } from './weight';

const exact = Decimal.clone({ precision: 60, rounding: Decimal.ROUND_HALF_UP });
const weights = fc.integer({ min: -100_000_000, max: 100_000_000 });
const prices = fc.integer({ min: -10_000_000, max: 10_000_000 });

describe('an amount of money', () => {
  it('is a whole number of minor units', () => {
    expect(minorUnits(-1250)).toBe(-1250);
    expect(Object.is(minorUnits(-0), 0)).toBe(true);
    for (const wrong of [0.5, NaN, Infinity, 2 ** 53]) {
      expect(() => minorUnits(wrong)).toThrow(RangeError);
    }
  });

  it('adds up, and never past what a number holds exactly', () => {
    expect(addMoney(minorUnits(1250), minorUnits(-250), minorUnits(1))).toBe(1001);
    expect(sumMoney([])).toBe(0);
    const most = minorUnits(Number.MAX_SAFE_INTEGER);
    expect(sumMoney([most, most, minorUnits(-Number.MAX_SAFE_INTEGER)])).toBe(Number.MAX_SAFE_INTEGER);
    expect(() => addMoney(most, minorUnits(1))).toThrow(RangeError);
  });
});

describe('the price of a line', () => {
  it('by weight rounds a half penny up: 12.480 kg at £14.20 is £177.22, 25 g at £0.20 is 1p', () => {
    expect(priceForGrams(grams(12_480), minorUnits(1420))).toBe(17_722);
    expect(priceForGrams(grams(25), minorUnits(20))).toBe(1);
    expect(priceForGrams(grams(24), minorUnits(20))).toBe(0);
  });

  it('by weight equals decimal arithmetic', () => {
    fc.assert(
      fc.property(weights, prices, (weight, price) => {
        const expected = new exact(weight).times(price).dividedBy(1000).toDecimalPlaces(0).toNumber();
        expect(priceForGrams(grams(weight), minorUnits(price))).toBe(expected === 0 ? 0 : expected);
      }),
    );
  });

  it('of a credit undoes the charge to the penny', () => {
    fc.assert(
      fc.property(weights, prices, (weight, price) => {
        const charge = priceForGrams(grams(weight), minorUnits(price));
        expect(addMoney(charge, priceForGrams(grams(-weight), minorUnits(price)))).toBe(0);
      }),
    );
  });

  it('by piece or case is count times price', () => {
    expect(priceTimes(7, minorUnits(1899))).toBe(13_293);
    expect(priceTimes(0, minorUnits(1899))).toBe(0);
    expect(() => priceTimes(1.5, minorUnits(1899))).toThrow(RangeError);
    expect(() => priceTimes(2, minorUnits(Number.MAX_SAFE_INTEGER))).toThrow(RangeError);
  });
});

describe('tax on a net amount', () => {
  it('rounds a half penny away from zero', () => {
    expect(taxOn(minorUnits(10_000), ppm(200_000))).toBe(2000);
    expect(taxOn(minorUnits(5), ppm(100_000))).toBe(1);
    expect(taxOn(minorUnits(-5), ppm(100_000))).toBe(-1);
    expect(taxOn(minorUnits(17_722), ppm(0))).toBe(0);
  });
});
