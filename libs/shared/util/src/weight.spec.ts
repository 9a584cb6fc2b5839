import { ppm } from './ppm';
import { applyPpm, grams, sumGrams } from './weight';

describe('a weight in grams', () => {
  it('is whole', () => {
    expect(grams(12_480)).toBe(12_480);
    expect(() => grams(12.48)).toThrow(RangeError);
  });

  it('adds up', () => {
    expect(sumGrams([grams(12_480), grams(20), grams(-500)])).toBe(12_000);
    expect(() => sumGrams([grams(Number.MAX_SAFE_INTEGER), grams(1)])).toThrow(RangeError);
  });

  it('is cut down by a yield with the rounding asked for', () => {
    expect(applyPpm(grams(18_333), ppm(605_000), 'half-up')).toBe(11_091);
    expect(applyPpm(grams(18_333), ppm(605_000), 'up')).toBe(11_092);
    expect(applyPpm(grams(18_333), ppm(605_000), 'down')).toBe(11_091);
  });
});
