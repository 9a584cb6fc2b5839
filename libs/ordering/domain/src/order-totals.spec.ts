import Decimal from 'decimal.js';
import fc from 'fast-check';
import { orderTotals, totalOf } from './order-totals';

const amounts = fc.array(
  fc.record({ minor: fc.integer({ min: 0, max: 5_000_000 }), taxPpm: fc.constantFrom(0, 50_000, 200_000) }),
  { maxLength: 20 },
);

describe('a total', () => {
  it('takes tax per rate on the sum of its lines, half up, not line by line', () => {
    // Three lines of 12p at 20 %: 7.2p on the sum is 7p; line by line it would be three times 2p.
    const lines = [12, 12, 12].map((minor) => ({ minor, taxPpm: 200_000 }));
    expect(totalOf(lines)).toMatchObject({ netMinor: 36, taxMinor: 7, totalMinor: 43 });
    expect(totalOf([{ minor: 25, taxPpm: 20_000 }]).taxMinor).toBe(1);
  });

  it('agrees with decimal arithmetic for any lines', () => {
    fc.assert(
      fc.property(amounts, (lines) => {
        const rates = [...new Set(lines.map(({ taxPpm }) => taxPpm))];
        const net = lines.reduce((sum, { minor }) => sum.plus(minor), new Decimal(0));
        const tax = rates.reduce((sum, rate) => {
          const base = lines
            .filter(({ taxPpm }) => taxPpm === rate)
            .reduce((all, { minor }) => all.plus(minor), new Decimal(0));
          return sum.plus(base.times(rate).div(1_000_000).toDecimalPlaces(0, Decimal.ROUND_HALF_UP));
        }, new Decimal(0));
        expect(totalOf(lines)).toMatchObject({
          netMinor: net.toNumber(),
          taxMinor: tax.toNumber(),
          totalMinor: net.plus(tax).toNumber(),
        });
      }),
    );
  });
});

describe('the totals of an order', () => {
  it('range from its lines at their least to at their greatest weight, with delivery and tax', () => {
    const line = { taxPpm: 200_000, minMinor: 900, estimateMinor: 1000, maxMinor: 1105 };
    const { min, estimate, max } = orderTotals([line, line], 650, 200_000);
    // (9.00 + 9.00 + 6.50) × 1.2 = 29.40; (10 + 10 + 6.50) × 1.2 = 31.80; (11.05 + 11.05 + 6.50) × 1.2 = 34.32.
    expect([min.totalMinor, estimate.totalMinor, max.totalMinor]).toEqual([2940, 3180, 3432]);
  });

  it('are never over the upper bound for any weight within the range', () => {
    const lines = fc.array(
      fc.tuple(fc.nat(100_000), fc.nat(100_000), fc.nat(100_000)).map((three) => {
        const [minMinor = 0, estimateMinor = 0, maxMinor = 0] = [...three].sort((a, b) => a - b);
        return { taxPpm: 0, minMinor, estimateMinor, maxMinor };
      }),
    );
    fc.assert(
      fc.property(lines, fc.nat(10_000), fc.constantFrom(0, 200_000), (given, charge, rate) => {
        const totals = orderTotals(given, charge, rate);
        expect(totals.min.totalMinor).toBeLessThanOrEqual(totals.estimate.totalMinor);
        expect(totals.estimate.totalMinor).toBeLessThanOrEqual(totals.max.totalMinor);
      }),
    );
  });
});
