import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { listPage, listParameters } from './lists';
import { amount, currency, mergeMetadata, metadata, readParameters, text } from './parameters';
import { findPayout, payOutAmount } from './payouts';
import type { Processor } from './processor';

const createParameters = z.strictObject({
  amount,
  currency,
  description: text.optional(),
  metadata: metadata.optional(),
  statement_descriptor: text.optional(),
});
const listPayouts = z.strictObject({
  ...listParameters,
  status: z.enum(['pending', 'in_transit', 'paid', 'failed']).optional(),
});

export function payoutRoutes(processor: Processor): ApiRoute[] {
  const { state } = processor;
  return [
    {
      method: 'post',
      path: '/v1/payouts',
      handle: ({ input }) => {
        const given = readParameters(createParameters, input);
        return payOutAmount(processor, {
          amount: given.amount,
          currency: given.currency,
          description: given.description ?? 'Payout',
          metadata: mergeMetadata({}, given.metadata),
          statementDescriptor: given.statement_descriptor ?? null,
        });
      },
    },
    {
      method: 'get',
      path: '/v1/payouts',
      handle: ({ input }) => {
        const query = readParameters(listPayouts, input);
        const found = [...state.payouts.values()].filter(
          (payout) => query.status === undefined || payout.status === query.status,
        );
        return listPage(found, query, 'payout', '/v1/payouts');
      },
    },
    {
      method: 'get',
      path: '/v1/payouts/:payout',
      handle: ({ ids: { payout = '' } }) => findPayout(state, payout),
    },
  ];
}
