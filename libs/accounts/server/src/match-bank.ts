import { matchPayouts, postPayoutReceived } from '@seamwright/accounts/domain';
import type { Tx } from '@seamwright/shared/server';
import { addDays, plantToday } from '@seamwright/shared/util';
import { insertMatches, matchOneAtATime, unmatchedLines, unmatchedPayouts } from './bank.repository';
import { post, type Posting } from './journal.repository';

/** How far back payouts and bookings are looked at. */
const DAYS_BACK = 120;

/** Pairs payouts with bank lines that are not matched yet, and posts what arrived. Gives how many were paired. */
export async function matchBank(tx: Tx, by: Posting): Promise<number> {
  await matchOneAtATime(tx);
  const since = addDays(plantToday(by.now, by.timeZone), -DAYS_BACK);
  const payouts = new Map((await unmatchedPayouts(tx, since)).map((payout) => [payout.id, payout]));
  if (payouts.size === 0) return 0;
  const lines = new Map((await unmatchedLines(tx, since)).map((line) => [line.id, line]));
  const matches = matchPayouts([...payouts.values()], [...lines.values()]);
  await insertMatches(tx, by.now, matches);
  const entries = matches.flatMap(({ payoutId, bankLineId }) => {
    const [payout, line] = [payouts.get(payoutId), lines.get(bankLineId)];
    if (!payout || !line) return [];
    const { amountMinor, currency } = payout;
    const received = { payoutId, bankLineId, amountMinor, currency, bookedMinor: line.amountMinor };
    return [{ ...postPayoutReceived(received), text: `Payout ${payoutId} at the bank` }];
  });
  await post(tx, by, entries);
  return matches.length;
}
