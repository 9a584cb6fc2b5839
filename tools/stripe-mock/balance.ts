import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { readParameters } from './parameters';
import type { Processor } from './processor';
import type { State } from './state';

/** Money of one currency, in minor units. */
export interface Funds {
  amount: number;
  currency: string;
  source_types: { card: number };
}

/** What is held for the account: available to pay out, and still on its way in. */
export interface Balance {
  object: 'balance';
  available: Funds[];
  livemode: false;
  pending: Funds[];
}

/** The account's own currency, shown with nothing in it before the first charge. */
const HOME_CURRENCY = 'gbp';

/** The balance is nothing but the sum of its entries. */
export function balanceOf(state: State): Balance {
  const entries = [...state.balanceTransactions.values()];
  const currencies = [...new Set(entries.map((entry) => entry.currency))].sort();
  const sum = (status: 'available' | 'pending') =>
    (currencies.length ? currencies : [HOME_CURRENCY]).map((currency) => {
      const amount = entries
        .filter((entry) => entry.status === status && entry.currency === currency)
        .reduce((total, entry) => total + entry.net, 0);
      return { amount, currency, source_types: { card: amount } };
    });
  return { object: 'balance', available: sum('available'), livemode: false, pending: sum('pending') };
}

export function balanceRoutes({ state }: Processor): ApiRoute[] {
  return [
    {
      method: 'get',
      path: '/v1/balance',
      handle: ({ input }) => {
        readParameters(z.strictObject({}), input);
        return balanceOf(state);
      },
    },
  ];
}
