import { bankStatement } from './bank-statement';
import type { Payout } from './payouts';

const payout = (id: string, day: string, amount: number, status: Payout['status'] = 'paid'): Payout =>
  ({ id, amount, status, arrival_date: Date.parse(`${day}T00:00:00Z`) / 1000 }) as Payout;

describe('the bank statement of the demo', () => {
  const payouts = [
    payout('po_b', '2026-11-14', 161_010),
    payout('po_a', '2026-11-07', 63_453),
    payout('po_c', '2026-11-21', 5, 'in_transit'),
  ];

  it('has a line for each payout that reached the bank, oldest first', () => {
    expect(bankStatement(payouts, { since: 0, shortBy: 0 })).toBe(
      'Date,Description,Reference,Amount\n' +
        '2026-11-07,Card processor payout,po_a,634.53\n' +
        '2026-11-14,Card processor payout,po_b,1610.10\n',
    );
  });

  it('can be short by a planted difference on its newest line', () => {
    expect(bankStatement(payouts, { since: Date.parse('2026-11-10T00:00:00Z') / 1000, shortBy: 4200 })).toBe(
      'Date,Description,Reference,Amount\n2026-11-14,Card processor payout,po_b,1568.10\n',
    );
  });
});
