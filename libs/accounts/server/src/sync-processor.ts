import {
  postAdjustment,
  postFee,
  postPayout,
  postPayoutFailed,
  postRefund,
  transactionKind,
  type JournalEntry,
  type Payment,
  type ProcessorTransaction,
} from '@seamwright/accounts/domain';
import { inTransaction, system, type JobContext } from '@seamwright/shared/server';
import { invoiceIdOfOrder } from './invoices.repository';
import { post } from './journal.repository';
import { matchBank } from './match-bank';
import type { AccountsParts } from './parts';
import { paymentsOfCharges } from './payments.repository';
import {
  keepBalances,
  keepPayouts,
  keepTransactions,
  newestTold,
  openPayouts,
  payoutsWithoutParts,
} from './processor-money.repository';
import { ProcessorRefused } from './processor';
import { postTaken } from './store-answer';

type Parts = Pick<AccountsParts, 'processor' | 'timeZone'>;

const HOUR_MS = 3_600_000;
const CHUNK = 200;

/**
 * Walks what the processor has of our money since the newest that we know of (an hour overlaps, since it may show
 * movements late), keeps it, and posts each fact once: fees, refunds, payouts. Then learns the parts of each payout,
 * matches payouts with the bank, and reads the balance. A repeat changes nothing.
 */
export async function syncProcessor(
  context: JobContext,
  parts: Parts,
): Promise<{ transactions: number; payouts: number }> {
  const { processor } = parts;
  const known = await inTransaction(context.database, system('job'), async (tx) => ({
    newest: await newestTold(tx),
    open: await openPayouts(tx),
  }));
  const since = (at: Date | null): Date => new Date(Math.max(0, (at?.getTime() ?? 0) - HOUR_MS));
  const recent = await processor.payouts(since(known.newest.payout));
  const named = new Set(recent.map(({ id }) => id));
  const older = await Promise.all(known.open.filter(({ id }) => !named.has(id)).map(({ id }) => processor.payout(id)));
  const payouts = await inTransaction(context.database, system('job'), (tx) => keepPayouts(tx, [...older, ...recent]));

  const told = await processor.transactions({ since: since(known.newest.transaction) });
  let transactions = 0;
  for (let at = 0; at < told.length; at += CHUNK)
    transactions += await keepAndPost(context, parts, told.slice(at, at + CHUNK));

  await learnParts(context, parts);
  const balances = await processor.balance();
  const now = await context.clock.now();
  await inTransaction(context.database, system('job'), async (tx) => {
    await matchBank(tx, { now, timeZone: parts.timeZone });
    await keepBalances(tx, now, balances);
  });
  return { transactions, payouts };
}

/** Oldest first and chunk by chunk, so that a crash leaves no gap before what is known. */
async function keepAndPost(
  context: JobContext,
  { timeZone }: Parts,
  transactions: readonly ProcessorTransaction[],
): Promise<number> {
  const now = await context.clock.now();
  return inTransaction(context.database, system('job'), async (tx) => {
    const count = await keepTransactions(tx, transactions);
    const payments = await paymentsOfCharges(
      tx,
      transactions.flatMap(({ chargeId }) => (chargeId ? [chargeId] : [])),
    );
    const by = { now, timeZone };
    for (const payment of payments.values()) if (payment.state === 'captured') await postTaken(tx, by, payment);
    const invoices = new Map<string, string | null>();
    for (const { orderId } of payments.values()) invoices.set(orderId, await invoiceIdOfOrder(tx, orderId));
    const entries = transactions.flatMap((each) => {
      const payment = payments.get(each.chargeId ?? '');
      return entriesFor(each, payment, payment ? (invoices.get(payment.orderId) ?? null) : null);
    });
    await post(tx, by, entries);
    return count;
  });
}

type Entry = JournalEntry & { readonly text: string };

/** The entries for one transaction. What was taken from a card is posted with the answer to its capture. */
function entriesFor(each: ProcessorTransaction, payment: Payment | undefined, invoiceId: string | null): Entry[] {
  const { id: transactionId, currency, amountMinor, feeMinor, sourceId } = each;
  const fee = { ...postFee({ transactionId, feeMinor, currency }), text: `Fee for ${sourceId ?? transactionId}` };
  const unexplained = {
    ...postAdjustment({ transactionId, amountMinor, currency }),
    text: `${each.type} ${sourceId ?? transactionId}`,
  };
  const payout = { payoutId: sourceId ?? transactionId, currency };
  switch (transactionKind(each.type)) {
    case 'captured':
      return payment ? [fee] : [unexplained, fee];
    case 'refunded': {
      if (!payment) return [unexplained, fee];
      const refundId = sourceId ?? transactionId;
      const back = { customerId: payment.customerId, invoiceId, refundId, amountMinor: 0 - amountMinor, currency };
      return [{ ...postRefund(back), text: `Given back to a card, ${refundId}` }, fee];
    }
    case 'paid-out':
      return [{ ...postPayout({ ...payout, amountMinor: 0 - amountMinor }), text: `Payout ${payout.payoutId}` }, fee];
    case 'payout-returned':
      return [{ ...postPayoutFailed({ ...payout, amountMinor }), text: `Payout ${payout.payoutId} came back` }, fee];
    case 'fee':
      return [{ ...postFee({ transactionId, feeMinor: feeMinor - amountMinor, currency }), text: each.type }];
    case 'other':
      return [unexplained, fee];
  }
}

/** Asks for the parts of payouts that don't add up yet. A payout that was made by hand has none. */
async function learnParts(context: JobContext, { processor }: Parts): Promise<void> {
  const wanting = await inTransaction(context.database, system('job'), payoutsWithoutParts);
  for (const payoutId of wanting) {
    const parts = await processor.transactions({ payoutId }).catch((error: unknown) => {
      if (error instanceof ProcessorRefused) return [];
      throw error;
    });
    // The payout's own entry is told among its parts by some versions of the API; it is not one of them.
    const own = parts.filter(({ type }) => transactionKind(type) !== 'paid-out');
    await inTransaction(context.database, system('job'), (tx) => keepTransactions(tx, own));
  }
}
