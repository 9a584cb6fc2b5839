import type { PlantDate } from '@seamwright/shared/util';
import { aWeek } from './a-week';
import { exceptionRows } from './exception-rows';

describe('what is not explained, in words', () => {
  const rows = exceptionRows(aWeek.exceptions, aWeek.payouts, '2026-12-01' as PlantDate, 'en-GB');

  it('names the thing a person knows it by', () => {
    expect(rows.map(({ what }) => what)).toEqual([
      'Card payment of order 1032',
      'Payout of Thu 26 Nov, bank line of Mon 30 Nov',
    ]);
  });

  it('counts days from when a payout was due, and does not make up others', () => {
    expect(rows.map(({ days }) => days)).toEqual([null, 4]);
  });

  it('names what it has where the order or payout is not known', () => {
    const [charge, bank] = aWeek.exceptions;
    if (!charge || !bank) throw new Error('the week has two');
    const strange = exceptionRows(
      [
        { ...charge, orderNumber: null, chargeId: 'ch_9' },
        { ...bank, payoutId: null },
        { ...bank, payoutId: 'po_9' },
      ],
      [],
      '2026-12-01' as PlantDate,
      'en-GB',
    );
    expect(strange.map(({ what }) => what)).toEqual(['Charge ch_9', 'A bank line that names a payout', 'Payout po_9']);
  });
});
