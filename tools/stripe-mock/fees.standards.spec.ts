import fc from 'fast-check';
import { defaultFees, feeFor } from './fees';
import { hold, startMock } from './testing/running-mock';

/**
 * Source: card processors' published price pages, "percentage + fixed" (2.9 % + 0.30). The sums on 100.00, 1,000.00,
 * 103.30 and 103.20 are worked examples of public fee calculators; the others follow from the same formula.
 */
const published = { ratePpm: 29_000, fixedMinor: 30 };

describe('the published fee formula', () => {
  it.each([
    [100_00, 3_20, 96_80],
    [1000_00, 29_30, 970_70],
    // Gross-up of 100.00: (100.00 + 0.30) / (1 − 2.9 %) = 103.30, whose fee 3.2957 is 3.30.
    [103_30, 3_30, 100_00],
    // Adding the fee of 100.00 is not enough: 3.2928 is 3.29.
    [103_20, 3_29, 99_91],
  ])('on %i takes %i and leaves %i', (amount, fee, net) => {
    expect(feeFor(amount, published)).toBe(fee);
    expect(amount - feeFor(amount, published)).toBe(net);
  });

  it('rounds half a minor unit up', () => {
    // 1.5 % of 1.00 is 1.5 pence, of 0.99 it is 1.485 pence.
    expect(feeFor(100, defaultFees)).toBe(22);
    expect(feeFor(99, defaultFees)).toBe(21);
  });

  it('is never more than half a minor unit away from the exact sum', () => {
    const anyFees = fc.record({ ratePpm: fc.nat(1_000_000), fixedMinor: fc.nat(1000) });
    fc.assert(
      fc.property(fc.integer({ min: 1, max: 99_999_999 }), anyFees, (amount, fees) => {
        const exactMillionths = BigInt(amount) * BigInt(fees.ratePpm) + BigInt(fees.fixedMinor) * 1_000_000n;
        const difference = BigInt(feeFor(amount, fees)) * 1_000_000n - exactMillionths;
        return difference > -500_000n && difference <= 500_000n;
      }),
    );
  });

  it('is what a captured charge costs when so configured', async () => {
    const running = await startMock({ fees: published });
    const held = await hold(running.stripe, 103_30);
    await running.stripe.paymentIntents.capture(held.id);
    const [entry] = (await running.stripe.balanceTransactions.list({ source: String(held.latest_charge) })).data;
    await running.close();
    expect(entry).toMatchObject({ amount: 103_30, fee: 3_30, net: 100_00 });
    expect(entry?.fee_details).toMatchObject([{ amount: 3_30, type: 'stripe_fee', currency: 'gbp' }]);
  });
});
