import fc from 'fast-check';
import { grams, quantity, unwrap, type QuantityInput } from '@seamwright/shared/util';
import { aVersion } from '@seamwright/catalogue/domain/testing';
import { lineWeights } from './line-weights';
import { resolveChoices } from './resolve-choices';

// A 280 g steak, 266 to 294 g, two a pack, six packs a case.
const steak = unwrap(resolveChoices(aVersion(), {}));
const weights = (input: QuantityInput) => lineWeights(steak, unwrap(quantity(input)));

describe('what a line will weigh', () => {
  it('counts pieces as ordered', () => {
    // 24 × 266 = 6,384; 24 × 280 = 6,720; 24 × 294 = 7,056.
    expect(weights({ unit: 'piece', count: 24 })).toEqual({
      pieces: 24,
      cases: 2,
      minGrams: 6384,
      estimateGrams: 6720,
      maxGrams: 7056,
    });
  });

  it('counts a case as the pieces in it', () => {
    expect(weights({ unit: 'case', count: 3 })).toMatchObject({ pieces: 36, cases: 3, estimateGrams: 10_080 });
  });

  it('has no cases when pieces do not fill them', () => {
    expect(weights({ unit: 'piece', count: 25 }).cases).toBeNull();
  });

  it('takes the number of pieces nearest to a weight, and never less when asked', () => {
    expect(weights({ unit: 'kg', grams: 12_000 })).toMatchObject({ pieces: 43, estimateGrams: 12_040 });
    expect(weights({ unit: 'kg', grams: 11_900 })).toMatchObject({ pieces: 43 });
    expect(weights({ unit: 'kg', grams: 11_800 })).toMatchObject({ pieces: 42 });
    expect(weights({ unit: 'kg', grams: 11_800, notLess: true })).toMatchObject({ pieces: 43 });
  });

  it('keeps least, likely and most in order, in proportion to the pieces', () => {
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 100_000 }), (count) => {
        const { minGrams, estimateGrams, maxGrams } = weights({ unit: 'piece', count });
        expect([minGrams, estimateGrams, maxGrams]).toEqual([count * 266, count * 280, count * 294]);
      }),
    );
  });

  it('is off a target weight by half a piece at most', () => {
    fc.assert(
      fc.property(fc.integer({ min: 280, max: 10_000_000 }), (target) => {
        const { estimateGrams } = weights({ unit: 'kg', grams: grams(target) });
        expect(Math.abs(estimateGrams - target)).toBeLessThanOrEqual(140);
      }),
    );
  });
});
