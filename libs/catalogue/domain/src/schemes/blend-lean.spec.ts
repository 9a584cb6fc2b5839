import { fraction } from '@seamwright/shared/util';
import { blendLean, leanWithin } from './blend-lean';

const trim = (weight: number, visualLean: number, tolerance = 0) => ({ weight, visualLean, tolerance });

describe('the visual lean of a blend', () => {
  it('is weighted by grams, exactly', () => {
    expect(blendLean([trim(2, 90), trim(1, 50)]).stated).toEqual(fraction(230n, 3n));
  });

  it('reaches as far as the tolerances of its trims, and never past 0 and 100', () => {
    const { least, most } = blendLean([trim(1, 98, 4), trim(1, 2, 4)]);
    expect([least, most]).toEqual([fraction(94n, 2n), fraction(106n, 2n)]);
  });

  it('is within a band always, as stated only, or not', () => {
    const band = { leastLean: 84, mostLean: 86 };
    expect(leanWithin(band, blendLean([trim(3, 90, 1), trim(1, 70, 1)]))).toBe('always');
    expect(leanWithin(band, blendLean([trim(3, 90, 2), trim(1, 70, 2)]))).toBe('as-stated');
    expect(leanWithin(band, blendLean([trim(1, 90), trim(1, 70)]))).toBe('no');
  });
});
