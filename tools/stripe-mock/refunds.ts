import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { postEntry } from './balance-transactions';
import { findCharge, type Charge } from './charges';
import { invalidParameter, noSuch, refused } from './errors';
import { newId } from './identifiers';
import { listPage, listParameters } from './lists';
import { amount, mergeMetadata, metadata, readParameters, text, type Metadata } from './parameters';
import { findPaymentIntent } from './payment-intents';
import type { Processor } from './processor';
import { keep, type State } from './state';

/** Money given back of a captured charge, in minor units. */
export interface Refund {
  id: string;
  object: 'refund';
  amount: number;
  balance_transaction: string | null;
  charge: string;
  created: number;
  currency: string;
  destination_details: { card: { type: 'refund' }; type: 'card' };
  metadata: Metadata;
  payment_intent: string;
  reason: 'duplicate' | 'fraudulent' | 'requested_by_customer' | null;
  receipt_number: null;
  source_transfer_reversal: null;
  status: 'succeeded';
  transfer_reversal: null;
}

const createParameters = z.strictObject({
  amount: amount.optional(),
  charge: text.optional(),
  metadata: metadata.optional(),
  payment_intent: text.optional(),
  reason: z.enum(['duplicate', 'fraudulent', 'requested_by_customer']).optional(),
});
const updateParameters = z.strictObject({ metadata: metadata.optional() });
const listRefunds = z.strictObject({ ...listParameters, charge: text.optional(), payment_intent: text.optional() });

function findRefund(state: State, id: string): Refund {
  const refund = state.refunds.get(id);
  if (!refund) throw noSuch('refund', id, 'id', true);
  return refund;
}

function chargeToRefund(state: State, given: z.output<typeof createParameters>): Charge {
  if (given.charge !== undefined) return findCharge(state, given.charge);
  if (given.payment_intent === undefined) {
    throw invalidParameter('One of the following params should be provided: payment_intent or charge.', 'charge');
  }
  const intent = findPaymentIntent(state, given.payment_intent, false);
  if (intent.status !== 'succeeded' || intent.latest_charge === null) {
    throw refused(`This PaymentIntent (${intent.id}) does not have a successful charge to refund.`, {
      code: 'payment_intent_unexpected_state',
      param: 'payment_intent',
      payment_intent: structuredClone(intent),
    });
  }
  return findCharge(state, intent.latest_charge);
}

/** The amount to give back. @throws ApiError when there is nothing left, or less than is asked */
function refundable(charge: Charge, wished: number | undefined): number {
  if (!charge.captured) {
    throw refused(`Charge ${charge.id} has not been captured.`, { code: 'charge_not_refundable', param: 'charge' });
  }
  if (charge.refunded) {
    throw refused(`Charge ${charge.id} has already been refunded.`, { code: 'charge_already_refunded' });
  }
  const left = charge.amount_captured - charge.amount_refunded;
  if (wished !== undefined && wished > left) {
    throw refused(`Refund amount (${wished}) is greater than unrefunded amount on charge (${left})`, {
      code: 'amount_too_large',
      param: 'amount',
    });
  }
  return wished ?? left;
}

function create(processor: Processor, given: z.output<typeof createParameters>): Refund {
  const { state, clock } = processor;
  const charge = chargeToRefund(state, given);
  const returned = refundable(charge, given.amount);
  const refund: Refund = {
    id: newId('re'),
    object: 'refund',
    amount: returned,
    balance_transaction: null,
    charge: charge.id,
    created: clock.seconds(),
    currency: charge.currency,
    destination_details: { card: { type: 'refund' }, type: 'card' },
    metadata: mergeMetadata({}, given.metadata),
    payment_intent: charge.payment_intent,
    reason: given.reason ?? null,
    receipt_number: null,
    source_transfer_reversal: null,
    status: 'succeeded',
    transfer_reversal: null,
  };
  const income = state.balanceTransactions.get(charge.balance_transaction ?? '');
  const entry = postEntry(processor, {
    type: 'refund',
    amount: -returned,
    currency: charge.currency,
    source: refund.id,
    description: charge.description,
    // It leaves the balance together with the money it gives back, never before.
    availableOn: Math.max(clock.seconds(), income?.available_on ?? 0),
  });
  refund.balance_transaction = entry.id;
  charge.amount_refunded += returned;
  charge.refunded = charge.amount_refunded === charge.amount_captured;
  keep(state.refunds, refund);
  processor.emit('refund.created', refund);
  processor.emit('charge.refunded', charge);
  return refund;
}

export function refundRoutes(processor: Processor): ApiRoute[] {
  const { state } = processor;
  return [
    {
      method: 'post',
      path: '/v1/refunds',
      handle: ({ input }) => create(processor, readParameters(createParameters, input)),
    },
    {
      method: 'get',
      path: '/v1/refunds',
      handle: ({ input }) => {
        const query = readParameters(listRefunds, input);
        const found = [...state.refunds.values()].filter(
          (refund) =>
            (query.charge === undefined || refund.charge === query.charge) &&
            (query.payment_intent === undefined || refund.payment_intent === query.payment_intent),
        );
        return listPage(found, query, 'refund', '/v1/refunds');
      },
    },
    {
      method: 'get',
      path: '/v1/refunds/:refund',
      handle: ({ ids: { refund = '' } }) => findRefund(state, refund),
    },
    {
      method: 'post',
      path: '/v1/refunds/:refund',
      handle: ({ ids: { refund: id = '' }, input }) => {
        const refund = findRefund(state, id);
        refund.metadata = mergeMetadata(refund.metadata, readParameters(updateParameters, input).metadata);
        processor.emit('refund.updated', refund);
        return refund;
      },
    },
  ];
}
