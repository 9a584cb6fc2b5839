import type { Payout } from './payouts';

const MINOR_PER_MAJOR = 100;

interface StatementWish {
  /** Unix seconds: payouts that reached the bank from then on. */
  readonly since: number;
  /** What the newest line is short by, in minor units, so that somebody has a difference to find. */
  readonly shortBy: number;
}

/** 1234 → "12.34"; the stand-in's currencies have two decimals. */
function amountText(minor: number): string {
  const sign = minor < 0 ? '-' : '';
  const whole = Math.abs(minor);
  return `${sign}${Math.floor(whole / MINOR_PER_MAJOR)}.${String(whole % MINOR_PER_MAJOR).padStart(2, '0')}`;
}

/** The statement that the demo's bank would show of the payouts that reached it, oldest first, as separated values. */
export function bankStatement(payouts: Iterable<Payout>, { since, shortBy }: StatementWish): string {
  const arrived = [...payouts]
    .filter(({ status, arrival_date }) => status === 'paid' && arrival_date >= since)
    .sort((a, b) => a.arrival_date - b.arrival_date);
  const lines = arrived.map(({ id, amount, arrival_date }, at) => {
    const day = new Date(arrival_date * 1000).toISOString().slice(0, 10);
    return `${day},Card processor payout,${id},${amountText(amount - (at === arrived.length - 1 ? shortBy : 0))}`;
  });
  return ['Date,Description,Reference,Amount', ...lines, ''].join('\n');
}
