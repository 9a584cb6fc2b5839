import { grams, minorUnits, ppm, unwrap } from '@seamwright/shared/util';
import { plateCost, portionToBuy, type Plate } from './plate-cost';

// The books below reckon in pounds and dollars. A weight of 1000 "grams" stands for one pound here and an amount is
// counted in units of 10⁻⁵ dollar, so that all printed digits can be compared.
const DOLLAR = 100_000;

const plate = (stated: Partial<Plate>): Plate => ({
  portionGrams: grams(0),
  priceMinorPerKg: minorUnits(0),
  cookingLossPpm: ppm(0),
  wastePpm: ppm(0),
  foodCostPpm: ppm(1_000_000),
  ...stated,
});

describe('plate cost by published cooking tests', () => {
  // Principles of Food, Beverage and Labor Cost Controls, chapter 6, rib of beef: inputs as printed, answers worked out
  // from them. Oven-ready 22 lb cost 113.435, so 5.15614 a pound; cooked 20 lb 4 oz, bones and trim 1 lb 4 oz.
  const rib = plate({
    portionGrams: grams(625), // 10 oz
    priceMinorPerKg: minorUnits(515_614),
    cookingLossPpm: ppm(79_545), // 1.75 / 22
    wastePpm: ppm(61_728), // 1.25 / 20.25
  });

  it('rib of beef: a raw portion of 10 oz costs 3.2226', () => {
    expect(unwrap(plateCost(rib)).portionMinor).toBe(322_259);
  });

  it('rib of beef: a salable pound costs 5.9703, 19 lb of 22 are served', () => {
    const { servedMinorPerKg, servedGrams } = unwrap(plateCost({ ...rib, portionGrams: grams(22_000) }));
    expect(Math.round(servedMinorPerKg / 10)).toBe(59_703);
    expect(servedGrams).toBe(19_000);
  });

  it('rib of beef: a cooked portion of 10 oz costs 3.7314', () => {
    // The portion bought for it, in hundredths of a thousandth of a pound so that rounding up doesn't show.
    const bought = unwrap(portionToBuy(grams(62_500_000), rib));
    const { portionMinor } = unwrap(plateCost({ ...rib, portionGrams: bought }));
    expect(Math.round(portionMinor / 1_000_000)).toBe(37_314);
  });

  it('roast leg of lamb: 48 portions of 4 oz at a yield of 0.425 need 28.235 lb', () => {
    // Same textbook, exercise 5: 12 lb / 0.425.
    expect(unwrap(portionToBuy(grams(12_000), { cookingLossPpm: ppm(575_000), wastePpm: ppm(0) }))).toBe(28_236);
    expect(unwrap(portionToBuy(grams(12_000_000), { cookingLossPpm: ppm(575_000), wastePpm: ppm(0) }))).toBe(
      28_235_295,
    );
  });

  it('forequarter of beef: a true cost of 7.07 sells at 23.18 for a food cost of 30.5 %', () => {
    // Hospitality course sheet HRM 1016, printed 7.07 / 0.305 = 23.18.
    const { menuMinor } = unwrap(
      plateCost(plate({ portionGrams: grams(1000), priceMinorPerKg: minorUnits(707), foodCostPpm: ppm(305_000) })),
    );
    expect(menuMinor).toBe(2318);
  });

  it('loin of lamb: 5 oz at 11.1333 a pound cost 3.48 on the card, 3.479 exactly', () => {
    // Filled-in card, exercise 6.3 of the same textbook: 66.80 for 6 lb usable.
    const { portionMinor } = unwrap(
      plateCost(plate({ portionGrams: grams(3125), priceMinorPerKg: minorUnits(Math.round((66.8 / 6) * DOLLAR)) })),
    );
    // 3125 stands for ten portions of 5 oz.
    expect(Math.round(portionMinor / 1000)).toBe(3479);
  });
});

describe('plate cost', () => {
  it('refuses what leaves nothing on the plate or no share for the meat', () => {
    const steak = plate({ portionGrams: grams(280), priceMinorPerKg: minorUnits(2840) });
    expect(plateCost({ ...steak, wastePpm: ppm(1_000_000) })).toMatchObject({
      refusal: { code: 'plate-nothing-left', pointer: '/wastePpm' },
    });
    expect(portionToBuy(grams(200), { cookingLossPpm: ppm(1_000_000), wastePpm: ppm(0) })).toMatchObject({ ok: false });
    expect(plateCost({ ...steak, foodCostPpm: ppm(0) })).toMatchObject({
      refusal: { code: 'plate-food-cost', pointer: '/foodCostPpm' },
    });
  });

  it('is in whole pence and grams, half up', () => {
    const cost = unwrap(
      plateCost({
        portionGrams: grams(280),
        priceMinorPerKg: minorUnits(2840),
        cookingLossPpm: ppm(250_000),
        wastePpm: ppm(20_000),
        foodCostPpm: ppm(300_000),
      }),
    );
    // 280 g × £28.40 = £7.952; 280 × 0.75 × 0.98 = 205.8 g; 2840 / 0.735 = 3863.9; 7.952 / 0.3 = 26.507. Worked by hand.
    expect(cost).toEqual({ portionMinor: 795, servedGrams: 206, servedMinorPerKg: 3864, menuMinor: 2651 });
  });
});
