import fc from 'fast-check';
import type { PlantDate } from '@seamwright/shared/util';
import { cardFee } from './card-fee';
import { clearingBalance, clearingParts, type Payout, type ProcessorTransaction } from './processor-money';
import { reconcile, type Leg, type ReconciliationInput } from './reconcile';

const AT = new Date('2026-12-02T12:00:00Z');
const TARIFF = { ratePpm: 15_000, fixedMinor: 20 };

const aMove = (of: Partial<ProcessorTransaction>): ProcessorTransaction => {
  const amountMinor = of.amountMinor ?? 7370;
  const feeMinor = of.feeMinor ?? (of.type === undefined ? cardFee(amountMinor, TARIFF) : 0);
  return {
    id: 'txn',
    type: 'charge',
    sourceId: of.chargeId ?? 'ch_1',
    chargeId: 'ch_1',
    currency: 'GBP',
    createdAt: AT,
    availableAt: AT,
    payoutId: 'po_alpha00001',
    ...of,
    amountMinor,
    feeMinor,
    netMinor: amountMinor - feeMinor,
  };
};
const aPayout = (of: Partial<Payout> = {}): Payout => ({
  id: 'po_alpha00001',
  amountMinor: 7239,
  currency: 'GBP',
  state: 'paid',
  createdAt: AT,
  arrivalOn: '2026-12-03',
  ...of,
});
const aLine = (of = {}) => ({
  id: 'line',
  bookedOn: '2026-12-03',
  amountMinor: 7239,
  currency: 'GBP',
  text: 'CARD PAYOUT',
  reference: 'po_alpha00001' as string | null,
  ...of,
});
const aMatch = { payoutId: 'po_alpha00001', bankLineId: 'line', matchedBy: 'reference', differenceMinor: 0 } as const;

const inBalance = (): ReconciliationInput => ({
  payments: [{ id: 'p1', chargeId: 'ch_1', capturedMinor: 7370 }],
  charges: [aMove({})],
  payouts: [aPayout()],
  parts: [aMove({})],
  bankLines: [aLine()],
  matches: [aMatch],
  tariff: TARIFF,
  today: '2026-12-04' as PlantDate,
});
const found = (of: Partial<ReconciliationInput>) =>
  reconcile({ ...inBalance(), ...of }).flatMap(({ exceptions }) => exceptions);

describe('reconciliation', () => {
  it('finds nothing where everything agrees', () => {
    expect(found({})).toEqual([]);
    expect(reconcile(inBalance()).map(({ leg, matchedMinor }) => [leg, matchedMinor])).toEqual([
      ['charges', 7370],
      ['fees', 131],
      ['payouts', 7239],
      ['bank', 7239],
    ]);
  });

  it.each<[string, Partial<ReconciliationInput>, Leg, object]>([
    [
      'a charge that we do not know',
      { payments: [] },
      'charges',
      { kind: 'missing-here', differenceMinor: 7370, cause: 'taken-outside-the-desk' },
    ],
    [
      'a payment that the processor told nothing of',
      { charges: [] },
      'charges',
      { kind: 'missing-there', differenceMinor: -7370, act: 'ask-processor' },
    ],
    [
      'another amount taken',
      { payments: [{ id: 'p1', chargeId: 'ch_1', capturedMinor: 7300 }] },
      'charges',
      { kind: 'amount-differs', differenceMinor: 70, paymentId: 'p1' },
    ],
    ['a payment charged twice', { charges: [aMove({}), aMove({ id: 't2' })] }, 'charges', { kind: 'duplicate' }],
    [
      'a fee off the tariff',
      { charges: [aMove({ feeMinor: 134 })] },
      'fees',
      { kind: 'fee-differs', differenceMinor: 3, cause: 'tariff-changed' },
    ],
    ['a payout whose parts are missing', { parts: [] }, 'payouts', { kind: 'amount-differs', differenceMinor: 7239 }],
    [
      'less at the bank',
      { bankLines: [aLine({ amountMinor: 7197 })] },
      'bank',
      { kind: 'amount-differs', differenceMinor: -42, cause: 'bank-booked-differently' },
    ],
    [
      'a payout that is not at the bank in time',
      { matches: [], bankLines: [], today: '2026-12-09' as PlantDate },
      'bank',
      { kind: 'late', differenceMinor: -7239, act: 'import-statement' },
    ],
    [
      'a payout booked twice',
      { bankLines: [aLine(), aLine({ id: 'again' })] },
      'bank',
      { kind: 'duplicate', differenceMinor: 7239, bankLineId: 'again' },
    ],
    [
      'a booking of an unknown payout',
      { bankLines: [aLine(), aLine({ id: 'x', reference: 'po_unknown001' })] },
      'bank',
      { kind: 'missing-here', cause: 'payout-unknown' },
    ],
  ])('shows %s', (_what, of, leg, expected) => {
    expect(found(of)).toMatchObject([{ leg, ...expected }]);
  });

  it('waits for a payout that is not due yet, which is no exception', () => {
    const legs = reconcile({ ...inBalance(), matches: [], bankLines: [] });
    expect(legs[3]).toMatchObject({ waitingMinor: 7239, theirsMinor: 0, exceptions: [] });
  });

  it('explains every penny: ours, the exceptions and what is waited for come to theirs', () => {
    const minor = fc.integer({ min: 1, max: 100_000 });
    const some = fc.array(fc.tuple(fc.constantFrom('a', 'b', 'c', 'd'), minor, minor), { maxLength: 8 });
    fc.assert(
      fc.property(some, some, some, fc.constantFrom('2026-12-04', '2026-12-20'), (ours, theirs, booked, today) => {
        const payouts = [...new Map(theirs.map(([key, amount]) => [key, amount]))].map(([key, amountMinor]) =>
          aPayout({ id: `po_${key}00000001`, amountMinor }),
        );
        const bankLines = booked.map(([key, amountMinor], at) =>
          aLine({ id: `line${at}`, amountMinor, reference: `po_${key}00000001` }),
        );
        const matches = payouts.flatMap(({ id, amountMinor }) => {
          const line = bankLines.find(({ reference }) => reference === id);
          return line
            ? [{ ...aMatch, payoutId: id, bankLineId: line.id, differenceMinor: line.amountMinor - amountMinor }]
            : [];
        });
        const charges = theirs.map(([key, amountMinor, feeMinor], at) =>
          aMove({ id: `t${at}`, chargeId: `ch_${key}`, amountMinor, feeMinor, payoutId: `po_${key}00000001` }),
        );
        const payments = [...new Map(ours.map(([key, amount]) => [key, amount]))].map(([key, capturedMinor]) => ({
          id: `p${key}`,
          chargeId: `ch_${key}`,
          capturedMinor,
        }));
        const input = { payments, charges, payouts, parts: charges, bankLines, matches, tariff: TARIFF };
        for (const leg of reconcile({ ...input, today: today as PlantDate })) {
          const explained = leg.exceptions.reduce((sum, { differenceMinor }) => sum + differenceMinor, 0);
          expect(leg.oursMinor + explained - leg.waitingMinor).toBe(leg.theirsMinor);
        }
      }),
    );
  });
});

describe('card clearing', () => {
  it('is captured less refunds, fees and payouts, which is the sum of all nets', () => {
    const type = fc.constantFrom('charge', 'refund', 'payout', 'payout_failure', 'stripe_fee', 'adjustment');
    const move = fc.tuple(type, fc.integer({ min: -100_000, max: 100_000 }), fc.integer({ min: 0, max: 500 }));
    fc.assert(
      fc.property(fc.array(move), (moves) => {
        const all = moves.map(([of, amountMinor, feeMinor]) => aMove({ type: of, amountMinor, feeMinor }));
        expect(clearingBalance(clearingParts(all))).toBe(all.reduce((sum, { netMinor }) => sum + netMinor, 0));
      }),
    );
  });
});
