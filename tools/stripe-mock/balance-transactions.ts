import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { SECONDS_PER_DAY } from './clock';
import { noSuch, refused } from './errors';
import { newId } from './identifiers';
import { listPage, listParameters } from './lists';
import { currency, readParameters, text } from './parameters';
import type { Processor } from './processor';
import { keep } from './state';

/** One entry of the balance: `net = amount − fee`, in minor units. */
export interface BalanceTransaction {
  id: string;
  object: 'balance_transaction';
  amount: number;
  available_on: number;
  created: number;
  currency: string;
  description: string | null;
  exchange_rate: null;
  fee: number;
  fee_details: { amount: number; application: null; currency: string; description: string; type: 'stripe_fee' }[];
  net: number;
  reporting_category: 'charge' | 'refund' | 'payout' | 'payout_reversal';
  source: string;
  status: 'pending' | 'available';
  type: 'charge' | 'refund' | 'payout' | 'payout_failure';
}

/** What an entry is made of; it has no fee unless told. */
export interface Entry {
  type: BalanceTransaction['type'];
  amount: number;
  currency: string;
  source: string;
  description: string | null;
  availableOn: number;
  fee?: number;
}

const reportingCategories = {
  charge: 'charge',
  refund: 'refund',
  payout: 'payout',
  payout_failure: 'payout_reversal',
} as const;

/** Writes an entry into the balance. */
export function postEntry(processor: Processor, entry: Entry): BalanceTransaction {
  const { fee = 0 } = entry;
  const created = processor.clock.seconds();
  return keep(processor.state.balanceTransactions, {
    id: newId('txn'),
    object: 'balance_transaction',
    amount: entry.amount,
    available_on: entry.availableOn,
    created,
    currency: entry.currency,
    description: entry.description,
    exchange_rate: null,
    fee,
    fee_details:
      fee === 0
        ? []
        : [
            {
              amount: fee,
              application: null,
              currency: entry.currency,
              description: 'Card processing fees',
              type: 'stripe_fee',
            },
          ],
    net: entry.amount - fee,
    reporting_category: reportingCategories[entry.type],
    source: entry.source,
    status: entry.availableOn <= created ? 'available' : 'pending',
    type: entry.type,
  });
}

/** The midnight (UTC) that begins the day `days` after an instant. */
export function midnightAfter(seconds: number, days: number): number {
  return (Math.floor(seconds / SECONDS_PER_DAY) + days) * SECONDS_PER_DAY;
}

/** Turns entries whose day has come from pending to available. */
export function settleEntries(processor: Processor): void {
  const now = processor.clock.seconds();
  for (const entry of processor.state.balanceTransactions.values()) {
    if (entry.status === 'pending' && entry.available_on <= now) entry.status = 'available';
  }
}

/** Makes all pending money available now, ahead of its day. */
export function releasePending(processor: Processor): void {
  for (const entry of processor.state.balanceTransactions.values()) {
    if (entry.status === 'available') continue;
    entry.available_on = processor.clock.seconds();
    entry.status = 'available';
  }
}

const listEntries = z.strictObject({
  ...listParameters,
  currency: currency.optional(),
  payout: text.optional(),
  source: text.optional(),
  type: text.optional(),
});

export function balanceTransactionRoutes({ state }: Processor): ApiRoute[] {
  const partsOf = (payoutId: string) => {
    const payout = state.payouts.get(payoutId);
    if (!payout) throw noSuch('payout', payoutId, 'payout');
    if (!payout.automatic) {
      throw refused('Balance transaction history can only be filtered on automatic payouts, not manual.', {
        param: 'payout',
      });
    }
    return (entry: BalanceTransaction) => state.payoutParts.get(entry.id)?.payout === payoutId;
  };
  return [
    {
      method: 'get',
      path: '/v1/balance_transactions',
      handle: ({ input }) => {
        const query = readParameters(listEntries, input);
        const isPart = query.payout === undefined ? () => true : partsOf(query.payout);
        const found = [...state.balanceTransactions.values()].filter(
          (entry) =>
            isPart(entry) &&
            (query.currency === undefined || entry.currency === query.currency) &&
            (query.source === undefined || entry.source === query.source) &&
            (query.type === undefined || entry.type === query.type),
        );
        return listPage(found, query, 'balance_transaction', '/v1/balance_transactions');
      },
    },
    {
      method: 'get',
      path: '/v1/balance_transactions/:entry',
      handle: ({ ids: { entry = '' } }) => {
        const found = state.balanceTransactions.get(entry);
        if (!found) throw noSuch('balance transaction', entry, 'id', true);
        return found;
      },
    },
  ];
}
