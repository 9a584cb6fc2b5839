import { Decimal } from 'decimal.js';
import fc from 'fast-check';
import { lineAmounts, type PricedWeights } from './line-amounts';
import { PRICE_BASES } from './price-candidate';

const weights = (of: Partial<PricedWeights> = {}): PricedWeights => ({
  pieces: 16,
  cases: 2,
  minGrams: 7_600,
  estimateGrams: 8_000,
  maxGrams: 8_400,
  ...of,
});

describe('line amounts', () => {
  it('are weights × price per kg, at least, most likely and at most', () => {
    expect(lineAmounts('kg', 1_250, weights())).toEqual({
      ok: true,
      value: { minMinor: 9_500, estimateMinor: 10_000, maxMinor: 10_500 },
    });
  });

  it('are the same at any weight by piece and by case', () => {
    const fixed = (amount: number) => ({ minMinor: amount, estimateMinor: amount, maxMinor: amount });
    expect(lineAmounts('piece', 650, weights())).toEqual({ ok: true, value: fixed(10_400) });
    expect(lineAmounts('case', 5_000, weights())).toEqual({ ok: true, value: fixed(10_000) });
  });

  it('refuse part of a case under a case price', () => {
    expect(lineAmounts('case', 5_000, weights({ pieces: 17, cases: null }))).toMatchObject({
      ok: false,
      refusal: { code: 'price-case-only' },
    });
  });

  const price = fc.integer({ min: 1, max: 10_000_000 });
  const gram = fc.integer({ min: 1, max: 100_000_000 });

  it('agree with an independent decimal library', () => {
    fc.assert(
      fc.property(price, gram, (priceMinor, estimateGrams) => {
        const answer = lineAmounts('kg', priceMinor, weights({ estimateGrams }));
        const oracle = new Decimal(estimateGrams).times(priceMinor).dividedBy(1000);
        expect(answer).toMatchObject({
          value: { estimateMinor: oracle.toDecimalPlaces(0, Decimal.ROUND_HALF_UP).toNumber() },
        });
      }),
    );
  });

  it('never fall when the weight or the price rises', () => {
    fc.assert(
      fc.property(fc.constantFrom(...PRICE_BASES), price, gram, gram, (basis, priceMinor, one, other) => {
        const [minGrams, maxGrams] = [Math.min(one, other), Math.max(one, other)];
        const range = weights({ minGrams, estimateGrams: minGrams, maxGrams });
        const answer = lineAmounts(basis, priceMinor, range);
        const dearer = lineAmounts(basis, priceMinor + 1, range);
        if (!answer.ok || !dearer.ok) throw new Error('whole cases are always priced');
        expect(answer.value.minMinor).toBeLessThanOrEqual(answer.value.maxMinor);
        expect(answer.value.maxMinor).toBeLessThanOrEqual(dearer.value.maxMinor);
      }),
    );
  });
});
