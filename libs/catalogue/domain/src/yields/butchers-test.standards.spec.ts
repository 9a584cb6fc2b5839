// Published butcher's tests, worked out again to the last digit. Weights are pounds as exact fractions (ounces over 16),
// money is the source's own unit, never named there. Where a source prints a slip, the wrong figure is told.
import { addFractions, fraction, multiplyFractions, roundFraction, type Fraction } from '@seamwright/shared/util';
import { cutCost } from './butchers-test';

const lb = (pounds: number, ounces = 0): Fraction => fraction(BigInt(pounds * 16 + ounces), 16n);
/** A decimal in hundredths: 3.19 → 319. */
const at = (hundredths: number): Fraction => fraction(BigInt(hundredths), 100n);
const part = (weight: Fraction, hundredths = 0) => ({ weight, value: at(hundredths) });
/** As printed with so many decimals, rounded half up. */
function printed(value: Fraction, decimals: number): string {
  const digits = String(roundFraction({ n: value.n * 10n ** BigInt(decimals), d: value.d }, 'half-up')).padStart(
    decimals + 1,
    '0',
  );
  return `${digits.slice(0, -decimals)}.${digits.slice(-decimals)}`;
}
const percent = (value: Fraction, decimals = 3): string => printed(multiplyFractions(value, fraction(100n)), decimals);
const sum = (...weights: Fraction[]): Fraction => weights.reduce(addFractions);

describe('rib of beef: Principles of Food, Beverage and Labor Cost Controls, chapter 6, figures 6.3 and 6.4', () => {
  const parts = [part(lb(6, 8)), part(lb(4, 4), 32), part(lb(3, 4), 149), part(lb(2, 8), 159), part(lb(0, 4))];
  const rib = cutCost({ weight: lb(38, 12), price: at(319), parts });

  it('has weights that add to what was bought, and a cost printed as 123.61', () => {
    expect(sum(...parts.map(({ weight }) => weight), lb(22))).toEqual(lb(38, 12));
    expect(rib.usableWeight).toEqual(lb(22));
    expect([printed(rib.cost, 4), printed(rib.cost, 2)]).toEqual(['123.6125', '123.61']);
  });

  it('credits 10.1775 and leaves 5.15614 a pound, factor 1.61634, yield 56.774 %', () => {
    expect([printed(rib.credit, 4), printed(rib.netCost, 3)]).toEqual(['10.1775', '113.435']);
    expect([printed(rib.usableCost, 5), printed(rib.factor, 5), percent(rib.yield)]).toEqual([
      '5.15614',
      '1.61634',
      '56.774',
    ]);
    expect(printed(multiplyFractions(rib.usableCost, lb(0, 10)), 5)).toBe('3.22259');
  });

  it('is printed as 112.78 on another sheet, which is what fat at 0.10 a pound makes of it, not a slip of method', () => {
    const [fat, ...others] = parts;
    expect(fat?.weight).toEqual(lb(6, 8));
    const credited = cutCost({ weight: lb(38, 12), price: at(319), parts: [part(lb(6, 8), 10), ...others] });
    expect(printed(credited.netCost, 3)).toBe('112.785');
  });
});

describe('ten legs of veal: the same textbook family, restaurant exercise', () => {
  const parts = [part(lb(41, 8), 10), part(lb(56, 8), 38), part(lb(19, 12), 149), part(lb(47, 4), 189), part(lb(2, 8))];
  const legs = cutCost({ weight: lb(247, 8), price: at(329), parts });

  it('leaves 80 lb of 247.5, yield 32.323 %, credit 144.35', () => {
    expect([legs.usableWeight, percent(legs.yield), printed(legs.credit, 2)]).toEqual([lb(80), '32.323', '144.35']);
  });

  it('was bought for 814.28, which is 814.275 rounded', () => {
    expect([printed(legs.cost, 3), printed(legs.cost, 2)]).toEqual(['814.275', '814.28']);
  });

  it('costs 8.374125 a pound of the rounded cost, factor 2.54533', () => {
    const rounded = fraction(66993n, 100n * 80n);
    expect([printed(rounded, 6), printed(fraction(66993n * 100n, 8000n * 329n), 5)]).toEqual(['8.374125', '2.54533']);
  });
});

describe('leg of veal to scaloppine: Professional Cooking, raw yield test, table 5.6', () => {
  const parts = [
    part(lb(2, 8), 12),
    part(lb(3, 5), 38),
    part(lb(2, 2), 489),
    part(lb(3), 529),
    part(lb(0, 14)),
    part(lb(0, 3)),
  ];
  const leg = cutCost({ weight: lb(30), price: at(500), parts });

  it('takes off 12 lb whose lines are printed as 0.30, 1.26, 10.39 and 15.87', () => {
    expect(sum(...parts.map(({ weight }) => weight))).toEqual(lb(12));
    const lines = parts.slice(0, 4).map(({ weight, value }) => printed(multiplyFractions(weight, value), 2));
    expect(lines).toEqual(['0.30', '1.26', '10.39', '15.87']);
  });

  it('nets 122.18 over 18 lb: 6.78778 a pound, factor 1.35756, yield 60 %', () => {
    expect([printed(leg.credit, 2), printed(leg.netCost, 2), percent(leg.yield)]).toEqual([
      '27.82',
      '122.18',
      '60.000',
    ]);
    // The source goes on from the net cost as rounded to 122.18.
    expect([printed(fraction(12218n, 1800n), 5), printed(fraction(12218n, 9000n), 5)]).toEqual(['6.78778', '1.35756']);
  });

  it('costs 8.33 a pound when nothing is credited', () => {
    const plain = cutCost({ weight: lb(30), price: at(500), parts: [part(lb(12))] });
    expect(printed(plain.usableCost, 2)).toBe('8.33');
  });
});

describe('forequarter of beef: hospitality course sheet HRM 1016', () => {
  const weights = { ground: 18, stew: 13, fat: 10, brisket: 12, scrap: 4, rib: 24 };
  const parts = [part(lb(18), 189), part(lb(13), 225), part(lb(10), 20), part(lb(12), 195), part(lb(4))];
  const quarter = cutCost({ weight: lb(81), price: at(450), parts });

  it('leaves 275.83 for 24 lb of rib, as printed', () => {
    expect(printed(quarter.cost, 2)).toBe('364.50');
    expect(printed(quarter.credit, 2)).toBe('88.67');
    expect([printed(quarter.netCost, 2), quarter.usableWeight]).toEqual(['275.83', lb(24)]);
  });

  it('is 11.49292 a pound: the printed 11.19, and 6.29 in its table, are both wrong', () => {
    expect(printed(quarter.usableCost, 5)).toBe('11.49292');
  });

  it('is 5.02815 for 7 oz: the printed 5.03 is right, the printed 4.8 is wrong', () => {
    expect(printed(multiplyFractions(quarter.usableCost, lb(0, 7)), 5)).toBe('5.02815');
  });

  it('yields 29.63 % of rib: the printed 29.66 is wrong, and the others are cut instead of rounded', () => {
    const yields = Object.values(weights).map((weight) => percent(fraction(BigInt(weight), 81n), 2));
    // Printed: 22.22, 16.04, 12.34, 14.81, 4.93, 29.66.
    expect(yields).toEqual(['22.22', '16.05', '12.35', '14.81', '4.94', '29.63']);
  });
});

describe('beef rib 103 to 109: the teaching page "The butcher\'s yield test"', () => {
  const rib = cutCost({ weight: lb(28), price: at(130), parts: [part(lb(3), 10), part(lb(4), 30), part(lb(5), 130)] });

  it('nets 28.40: the printed 36.40 − 8.00 = 22.40 is wrong', () => {
    expect([printed(rib.cost, 2), printed(rib.credit, 2), printed(rib.netCost, 2)]).toEqual(['36.40', '8.00', '28.40']);
  });

  it('is 1.775 a pound, factor 1.36538, yield 57.143 %', () => {
    expect([printed(rib.usableCost, 3), printed(rib.factor, 5), percent(rib.yield)]).toEqual([
      '1.775',
      '1.36538',
      '57.143',
    ]);
  });
});

describe('loin of lamb: filled-in card, exercise 6.3 of Principles of Food, Beverage and Labor Cost Controls', () => {
  // Kidneys of 1 lb are worth 6.10 in all.
  const parts = [part(lb(3)), part(lb(1), 610), part(lb(1, 8), 460), part(lb(0, 8))];
  const loin = cutCost({ weight: lb(12), price: at(665), parts });

  it('is 66.80 for 6 lb: 11.1333 a pound, factor 1.67, 0.70 an ounce, 3.48 for 5 oz, as on the card', () => {
    expect([printed(loin.netCost, 2), loin.usableWeight, percent(loin.yield)]).toEqual(['66.80', lb(6), '50.000']);
    expect([printed(loin.usableCost, 4), printed(loin.factor, 2)]).toEqual(['11.1333', '1.67']);
    expect(printed(multiplyFractions(loin.usableCost, lb(0, 1)), 2)).toBe('0.70');
    expect(printed(multiplyFractions(loin.usableCost, lb(0, 5)), 2)).toBe('3.48');
  });

  it('has a portion factor of 0.52, as on the card', () => {
    const portion = multiplyFractions(loin.usableCost, lb(0, 5));
    expect(printed(multiplyFractions(portion, fraction(100n, 665n)), 2)).toBe('0.52');
  });
});
