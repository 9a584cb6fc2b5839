import { resolveOffer } from '@seamwright/catalogue/domain';
import { aContent } from '@seamwright/catalogue/domain/testing';
import { unwrap } from '@seamwright/shared/util';
import { amountIn, quantityOf, weightsOf } from './order-quantity';

// A 280 g steak, twelve a case.
const steak = unwrap(resolveOffer(aContent(), {}));

describe('how much is ordered', () => {
  it('reads tenths of a kilogram as grams', () => {
    expect(quantityOf('kg', 125)).toEqual({ unit: 'kg', grams: 12_500, notLess: false });
    expect(quantityOf('case', 2)).toEqual({ unit: 'case', count: 2 });
  });

  it('is no quantity while nothing sensible is typed', () => {
    expect([quantityOf('piece', null), quantityOf('piece', 0)]).toEqual([null, null]);
    expect(weightsOf(steak, null)).toBeNull();
  });

  it('keeps about what was meant when the unit changes', () => {
    const weights = weightsOf(steak, quantityOf('piece', 24));
    expect([amountIn('kg', steak, weights), amountIn('case', steak, weights)]).toEqual([67, 2]);
    expect(amountIn('case', steak, weightsOf(steak, quantityOf('piece', 1)))).toBe(1);
    expect(amountIn('piece', steak, null)).toBe(1);
  });
});
