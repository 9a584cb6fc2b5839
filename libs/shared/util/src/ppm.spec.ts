import fc from 'fast-check';
import { formatPercent, multiplyPpm, ppm } from './ppm';

describe('a rate over 1,000,000', () => {
  it('is whole', () => {
    expect(ppm(605_000)).toBe(605_000);
    expect(() => ppm(0.605)).toThrow(RangeError);
  });

  it('multiplies with the rounding that is asked for', () => {
    expect(multiplyPpm(1001, ppm(605_000), 'half-up')).toBe(606);
    expect(multiplyPpm(1001, ppm(605_000), 'down')).toBe(605);
    expect(multiplyPpm(1001, ppm(605_000), 'up')).toBe(606);
    expect(multiplyPpm(1, ppm(500_000), 'half-up')).toBe(1);
    expect(() => multiplyPpm(Number.MAX_SAFE_INTEGER, ppm(1_000_001), 'down')).toThrow(RangeError);
  });

  it('leaves a number alone at 100 %', () => {
    fc.assert(
      fc.property(fc.maxSafeInteger(), fc.constantFrom('up', 'down', 'half-up'), (value, rounding) => {
        expect(multiplyPpm(value, ppm(1_000_000), rounding)).toBe(value);
      }),
    );
  });

  it('is written in per cent, with the digits it has or those asked for', () => {
    expect(formatPercent(ppm(605_000))).toBe('60.5\u00a0%');
    expect(formatPercent(ppm(1_000_000))).toBe('100\u00a0%');
    expect(formatPercent(ppm(1))).toBe('0.0001\u00a0%');
    expect(formatPercent(ppm(-12_345))).toBe('-1.2345\u00a0%');
    expect(formatPercent(ppm(605_000), 'en-GB', 2)).toBe('60.50\u00a0%');
    expect(formatPercent(ppm(605_500), 'en-GB', 1)).toBe('60.6\u00a0%');
    expect(formatPercent(ppm(605_000), 'de-DE')).toBe('60,5\u00a0%');
  });
});
