import type { PlantDate } from '@seamwright/shared/util';
import { matchPayouts, type BankLineToMatch, type PayoutToMatch } from './match-payouts';
import { workingDaysBetween } from './working-days';

const aPayout = (of: Partial<PayoutToMatch> = {}): PayoutToMatch => ({
  id: 'po_alpha00001',
  amountMinor: 1000,
  currency: 'GBP',
  arrivalOn: '2026-12-04',
  ...of,
});
const aLine = (of: Partial<BankLineToMatch> = {}): BankLineToMatch => ({
  id: 'line',
  bookedOn: '2026-12-04',
  amountMinor: 1000,
  currency: 'GBP',
  text: 'CARD PAYOUT',
  reference: null,
  ...of,
});

describe('payouts and bank lines', () => {
  it('go together by reference, whatever the amount and however it is written', () => {
    const line = aLine({ amountMinor: 958, reference: 'PO ALPHA 00001', bookedOn: '2026-12-24' });
    expect(matchPayouts([aPayout()], [line])).toEqual([
      { payoutId: 'po_alpha00001', bankLineId: 'line', matchedBy: 'reference', differenceMinor: -42 },
    ]);
  });

  it('go together by amount within three working days, the weekend not counted', () => {
    // Friday the 4th to Wednesday the 9th are three working days; to Thursday the 10th are four.
    expect(matchPayouts([aPayout()], [aLine({ bookedOn: '2026-12-09' })])).toHaveLength(1);
    expect(matchPayouts([aPayout()], [aLine({ bookedOn: '2026-12-10' })])).toEqual([]);
    expect(matchPayouts([aPayout()], [aLine({ amountMinor: 999 })])).toEqual([]);
    expect(matchPayouts([aPayout()], [aLine({ currency: 'EUR' })])).toEqual([]);
  });

  it('takes the nearer day among equals, and each line once', () => {
    const payouts = [aPayout({ id: 'po_first0001', arrivalOn: '2026-12-03' }), aPayout({ id: 'po_second001' })];
    const lines = [aLine({ id: 'friday' }), aLine({ id: 'thursday', bookedOn: '2026-12-03' })];
    const pairs = matchPayouts(payouts, lines).map(({ payoutId, bankLineId }) => [payoutId, bankLineId]);
    expect(Object.fromEntries(pairs)).toEqual({ po_first0001: 'thursday', po_second001: 'friday' });
  });

  it('leaves a line alone that names another payout, and money that left', () => {
    expect(matchPayouts([aPayout()], [aLine({ reference: 'po_another01' })])).toEqual([]);
    expect(matchPayouts([aPayout({ amountMinor: -1000 })], [aLine({ amountMinor: -1000 })])).toEqual([]);
  });

  it('counts working days over a weekend, either way', () => {
    expect(workingDaysBetween('2026-12-04' as PlantDate, '2026-12-07' as PlantDate)).toBe(1);
    expect(workingDaysBetween('2026-12-07' as PlantDate, '2026-12-04' as PlantDate)).toBe(1);
    expect(workingDaysBetween('2026-12-05' as PlantDate, '2026-12-06' as PlantDate)).toBe(0);
  });
});
