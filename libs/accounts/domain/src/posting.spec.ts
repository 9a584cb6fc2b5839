import fc from 'fast-check';
import {
  balances,
  postAdjustment,
  postCapture,
  postFee,
  postInvoice,
  postPayout,
  postPayoutFailed,
  postPayoutReceived,
  postRefund,
  type JournalEntry,
} from './posting';

const currency = 'GBP';
const owner = { customerId: 'c', invoiceId: 'i' };
const amount = fc.integer({ min: 1, max: 10_000_000 });
const signed = fc.integer({ min: -10_000_000, max: 10_000_000 });

const entries: readonly [string, fc.Arbitrary<JournalEntry>][] = [
  [
    'invoice',
    fc.tuple(amount, amount).map(([netMinor, taxMinor]) => postInvoice({ ...owner, netMinor, taxMinor, currency })),
  ],
  ['capture', amount.map((amountMinor) => postCapture({ ...owner, chargeId: 'ch', amountMinor, currency }))],
  ['refund', amount.map((amountMinor) => postRefund({ ...owner, refundId: 're', amountMinor, currency }))],
  ['fee', signed.map((feeMinor) => postFee({ transactionId: 't', feeMinor, currency }))],
  ['adjustment', signed.map((amountMinor) => postAdjustment({ transactionId: 't', amountMinor, currency }))],
  ['payout', amount.map((amountMinor) => postPayout({ payoutId: 'po', amountMinor, currency }))],
  ['payout that failed', amount.map((amountMinor) => postPayoutFailed({ payoutId: 'po', amountMinor, currency }))],
  [
    'payout received',
    fc
      .tuple(amount, amount)
      .map(([amountMinor, bookedMinor]) =>
        postPayoutReceived({ payoutId: 'po', amountMinor, bookedMinor, bankLineId: 'b', currency }),
      ),
  ],
];

it.each(entries)('an entry for a %s balances, each line on one side', (_name, entry) => {
  fc.assert(
    fc.property(entry, ({ lines }) => {
      expect(balances(lines)).toBe(true);
      for (const { debitMinor, creditMinor } of lines) expect(debitMinor > 0 !== creditMinor > 0).toBe(true);
    }),
  );
});

it('posts an invoice without tax on two accounts', () => {
  const { lines } = postInvoice({ ...owner, netMinor: 7370, taxMinor: 0, currency });
  expect(lines).toMatchObject([
    { account: 'receivables', debitMinor: 7370, customerId: 'c', invoiceId: 'i' },
    { account: 'sales', creditMinor: 7370, customerId: null },
  ]);
});

it('keeps what the bank booked short apart', () => {
  const received = { payoutId: 'po', amountMinor: 1000, bookedMinor: 958, bankLineId: 'b', currency };
  expect(postPayoutReceived(received).lines).toMatchObject([
    { account: 'bank', debitMinor: 958 },
    { account: 'cash-in-transit', creditMinor: 1000 },
    { account: 'bank-differences', debitMinor: 42 },
  ]);
});
