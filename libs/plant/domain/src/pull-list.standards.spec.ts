import { divideHalfUp, grams, ppm, toSafeNumber, type PlantDate } from '@seamwright/shared/util';
import { gramsIn } from '@seamwright/stock/domain';
import { aLine } from './a-cutting-line';
import { cuttingList, pullList } from './index';

// Weights are exact by the international yard and pound agreement of 1959: 1 lb = 453.59237 g, so 1 oz = 28.349523125 g.
// Written as whole numbers of 10⁻⁹ g, so that the conversion is exact and is rounded to grams once.
const OUNCE = 28_349_523_125n;
const POUND = 453_592_370_000n;
const NANO = 1_000_000_000n;
const halfUp = (nano: bigint) => toSafeNumber((nano + NANO / 2n) / NANO);
/** What is bought is rounded up: a gram less would not do. */
const up = (nano: bigint) => toSafeNumber((nano + NANO - 1n) / NANO);

const day = { cuttingDay: '2026-12-03' as PlantDate, deliveryDay: '2026-12-04' as PlantDate };

/**
 * "Quantity to buy = portions × portion size / yield": cutting (butcher's yield) tests as taught in the textbook
 * Principles of Food, Beverage and Labor Cost Controls, chapter 6. Weights there are in pounds and ounces.
 */
describe('quantity to buy by simple yield', () => {
  it('ten legs of veal: 235 portions of 5 oz', () => {
    // Inputs from the book's restaurant exercise: 247 lb 8 oz bought, 80.0 lb usable, a yield of 32.323 %.
    // Answers worked out from them: 73.4375 lb usable, 227.197 lb to buy.
    const yieldPpm = toSafeNumber((80_000n * 1_000_000n + 123_750n) / 247_500n);
    expect(yieldPpm).toBe(323_232);
    const usable = halfUp(235n * 5n * OUNCE);
    expect(usable).toBe(halfUp((734_375n * POUND) / 10_000n));
    expect(usable).toBe(33_311);
    // To compare all published digits, the same sum in milligrams, read in thousandths of a pound; then in whole grams, where each step is rounded once.
    const milligrams = gramsIn(halfUp(235n * 5n * OUNCE * 1_000n), yieldPpm);
    expect(divideHalfUp(BigInt(milligrams) * 100_000n, 45_359_237n)).toBe(227_197n);
    expect(gramsIn(usable, yieldPpm)).toBe(103_057);
  });

  it('ten legs of veal: whole legs of 24.75 lb', () => {
    // 9.18 legs, so 10 legs are to be pulled.
    const leg = halfUp((2_475n * POUND) / 100n);
    const rows = cuttingList([
      aLine({
        pieces: 235,
        cut: {
          pieceNominalGrams: grams(halfUp(5n * OUNCE)),
          yieldPpm: ppm(323_232),
          primal: { id: 'n-leg', name: 'Leg' },
        },
      }),
    ]);
    const lot = {
      id: 'l',
      rowVersion: 1,
      code: 'V-1',
      nodeId: 'n-leg',
      nodeName: 'Leg',
      supplier: '',
      killDate: '2026-11-20' as PlantDate,
      receivedOn: '2026-11-27' as PlantDate,
      useBy: null,
      receivedGrams: grams(leg * 10),
      receivedPieces: 10,
      remainingGrams: grams(leg * 10),
      state: 'released' as const,
      holdReason: null,
      origin: { bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse: 'x' },
    };
    expect(pullList(rows, [lot], day)[0]).toMatchObject({ pieces: 10, shortGrams: 0 });
  });

  it('roast leg of lamb: 48 portions of 4 oz at a yield factor of 0.425', () => {
    // Exercise 5 of the same chapter: 12 lb / 0.425 = 28.235 lb to buy.
    const usable = halfUp(48n * 4n * OUNCE);
    expect(usable).toBe(halfUp(12n * POUND));
    expect(usable).toBe(5_443);
    expect(gramsIn(usable, 425_000)).toBe(up((28_235n * POUND) / 1_000n));
    expect(gramsIn(usable, 425_000)).toBe(12_808);
  });
});
