import fc from 'fast-check';
import { cardFee } from './card-fee';

// Source: published examples of "percentage + fixed" card tariffs, 2.9 % + 0.30, as quoted on public tariff pages.
const PUBLISHED = { ratePpm: 29_000, fixedMinor: 30 };

describe('published fee sums', () => {
  it.each([
    ['100.00 costs 3.20', 100_00, 320],
    ['1,000.00 costs 29.30', 1_000_00, 2930],
    ['the grossed-up 103.30 costs 3.30, so that 100.00 is left', 103_30, 330],
    ['103.20 would fall short: its fee is 3.29', 103_20, 329],
  ])('%s', (_what, amountMinor, feeMinor) => {
    expect(cardFee(amountMinor, PUBLISHED)).toBe(feeMinor);
  });

  it('leaves a grossed-up target within one minor unit', () => {
    // charge = (target + fixed) / (1 − share), half up: the same published pages.
    fc.assert(
      fc.property(fc.integer({ min: 100, max: 1_000_000 }), (target) => {
        const left = 1_000_000n - BigInt(PUBLISHED.ratePpm);
        const charge = Number((2n * BigInt(target + PUBLISHED.fixedMinor) * 1_000_000n + left) / (2n * left));
        expect(Math.abs(charge - cardFee(charge, PUBLISHED) - target)).toBeLessThanOrEqual(1);
      }),
    );
  });
});
