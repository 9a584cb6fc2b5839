import { checkBreaks } from './quantity-breaks';

describe('quantity breaks', () => {
  it('must rise, and the one that does not is pointed at', () => {
    const from = (fromQuantity: number) => ({ fromQuantity, priceMinor: 900 });
    expect(checkBreaks([from(5), from(10)]).ok).toBe(true);
    expect(checkBreaks([from(5), from(10), from(10)])).toMatchObject({
      refusal: { code: 'price-breaks-not-rising', pointer: '/breaks/2/fromQuantity' },
    });
  });
});
