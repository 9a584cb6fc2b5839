import type { ReconciliationWire } from '@seamwright/accounts/contracts';

const leg = { oursMinor: 0, theirsMinor: 0, matchedMinor: 0, waitingMinor: 0, exceptions: 0 };
const nothing = { paymentId: null, orderNumber: null, chargeId: null, payoutId: null, bankLineId: null };

/** A week in which the bank booked £42.00 less than was paid out, and one capture was not told of; for specs. */
export const aWeek: ReconciliationWire = {
  from: '2026-11-23',
  until: '2026-11-29',
  currency: 'GBP',
  week: {
    capturedMinor: 1_841_260,
    refundedMinor: 14_210,
    feesMinor: 30_119,
    paidOutMinor: 1_669_317,
    returnedMinor: 0,
    otherMinor: 0,
    bankMinor: 1_665_117,
    openingMinor: 0,
    closingMinor: 127_614,
  },
  clearing: {
    ledgerMinor: 148_854,
    toldMinor: 127_614,
    processorMinor: 127_614,
    readAt: '2026-11-30T09:00:00Z',
  },
  legs: [
    { ...leg, leg: 'charges', oursMinor: 1_862_500, theirsMinor: 1_841_260, matchedMinor: 1_841_260, exceptions: 1 },
    { ...leg, leg: 'fees', oursMinor: 30_119, theirsMinor: 30_119, matchedMinor: 30_119 },
    { ...leg, leg: 'payouts', oursMinor: 1_669_317, theirsMinor: 1_669_317, matchedMinor: 1_669_317 },
    { ...leg, leg: 'bank', oursMinor: 1_669_317, theirsMinor: 1_665_117, matchedMinor: 1_669_317, exceptions: 1 },
  ],
  payouts: [
    {
      id: 'po_1',
      state: 'paid',
      createdOn: '2026-11-26',
      arrivalOn: '2026-11-27',
      amountMinor: 1_669_317,
      charges: 40,
      refunds: 2,
      partsNetMinor: 1_669_317,
      bankLine: {
        id: 'line',
        bookedOn: '2026-11-30',
        amountMinor: 1_665_117,
        text: 'PAYOUT',
        matchedBy: 'reference',
      },
    },
  ],
  exceptions: [
    {
      ...nothing,
      leg: 'charges',
      kind: 'missing-there',
      differenceMinor: -21_240,
      cause: 'not-told-yet',
      act: 'ask-processor',
      paymentId: 'payment',
      orderNumber: 1_032,
    },
    {
      ...nothing,
      leg: 'bank',
      kind: 'amount-differs',
      differenceMinor: -4_200,
      cause: 'bank-booked-differently',
      act: 'look-at-ledger',
      payoutId: 'po_1',
      bankLineId: 'line',
    },
  ],
};
