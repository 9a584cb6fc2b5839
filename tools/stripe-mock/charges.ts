import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { midnightAfter, postEntry } from './balance-transactions';
import { SECONDS_PER_DAY } from './clock';
import { noSuch } from './errors';
import { feeFor } from './fees';
import { newId } from './identifiers';
import { listPage, listParameters } from './lists';
import { readParameters, text, type Metadata } from './parameters';
import type { PaymentIntent } from './payment-intents';
import { cardOf, type BillingDetails, type PaymentMethod } from './payment-methods';
import type { Processor } from './processor';
import { keep, type State } from './state';
import type { Decline } from './test-cards';

/** One attempt to take money from a card: refused, held, or captured. Amounts in minor units. */
export interface Charge {
  id: string;
  object: 'charge';
  /** What was held (or asked for). */
  amount: number;
  amount_captured: number;
  /** What was given back after capture; the part of a hold that was let go is not in it. */
  amount_refunded: number;
  application: null;
  application_fee: null;
  application_fee_amount: null;
  balance_transaction: string | null;
  billing_details: BillingDetails;
  calculated_statement_descriptor: string | null;
  captured: boolean;
  created: number;
  currency: string;
  customer: string | null;
  description: string | null;
  disputed: false;
  failure_balance_transaction: null;
  failure_code: string | null;
  failure_message: string | null;
  fraud_details: Record<string, never>;
  livemode: false;
  metadata: Metadata;
  on_behalf_of: null;
  outcome: {
    network_status: 'approved_by_network' | 'declined_by_network';
    reason: string | null;
    risk_level: 'normal';
    seller_message: string;
    type: 'authorized' | 'issuer_declined';
  };
  paid: boolean;
  payment_intent: string;
  payment_method: string;
  payment_method_details: { card: CardDetails; type: 'card' };
  receipt_email: string | null;
  receipt_number: null;
  receipt_url: null;
  refunded: boolean;
  review: null;
  shipping: object | null;
  source_transfer: null;
  statement_descriptor: string | null;
  statement_descriptor_suffix: string | null;
  status: 'succeeded' | 'failed';
  transfer_data: null;
  transfer_group: null;
}

/** The card as it was used. `amount_authorized`, `capture_before` and `incremental_authorization` are newer fields. */
export interface CardDetails {
  amount_authorized: number | null;
  brand: string;
  capture_before?: number;
  checks: PaymentMethod['card']['checks'];
  country: string;
  exp_month: number;
  exp_year: number;
  fingerprint: string;
  funding: string;
  incremental_authorization: { status: 'available' | 'unavailable' };
  installments: null;
  last4: string;
  mandate: null;
  network: string;
  three_d_secure: null;
  wallet: null;
}

/** Days after which a hold on a card ends by itself. */
export const HOLD_DAYS = 7;

/** When a hold made now ends, in Unix seconds. */
function captureBefore(now: number): number {
  return now + HOLD_DAYS * SECONDS_PER_DAY;
}

/** Records an attempt on a card for an intent: a hold, or a refusal when `decline` is given. */
export function recordCharge(
  processor: Processor,
  intent: PaymentIntent,
  method: PaymentMethod,
  decline?: Decline,
): Charge {
  const created = processor.clock.seconds();
  const { brand, checks, country, exp_month, exp_year, fingerprint, funding, last4 } = method.card;
  const raisable = intent.payment_method_options.card?.request_incremental_authorization === 'if_available';
  const held = !decline && intent.capture_method === 'manual';
  const charge: Charge = {
    id: newId('ch'),
    object: 'charge',
    amount: intent.amount,
    amount_captured: 0,
    amount_refunded: 0,
    application: null,
    application_fee: null,
    application_fee_amount: null,
    balance_transaction: null,
    billing_details: structuredClone(method.billing_details),
    calculated_statement_descriptor: intent.statement_descriptor,
    captured: false,
    created,
    currency: intent.currency,
    customer: intent.customer,
    description: intent.description,
    disputed: false,
    failure_balance_transaction: null,
    failure_code: decline?.code ?? null,
    failure_message: decline?.message ?? null,
    fraud_details: {},
    livemode: false,
    metadata: { ...intent.metadata },
    on_behalf_of: null,
    outcome: decline
      ? {
          network_status: 'declined_by_network',
          reason: decline.decline_code,
          risk_level: 'normal',
          seller_message: 'The bank did not accept the charge.',
          type: 'issuer_declined',
        }
      : {
          network_status: 'approved_by_network',
          reason: null,
          risk_level: 'normal',
          seller_message: 'Payment complete.',
          type: 'authorized',
        },
    paid: !decline,
    payment_intent: intent.id,
    payment_method: method.id,
    payment_method_details: {
      card: {
        amount_authorized: decline ? null : intent.amount,
        brand,
        ...(held && { capture_before: captureBefore(created) }),
        checks,
        country,
        exp_month,
        exp_year,
        fingerprint,
        funding,
        incremental_authorization: {
          status: held && raisable && cardOf(method).raisable ? 'available' : 'unavailable',
        },
        installments: null,
        last4,
        mandate: null,
        network: brand,
        three_d_secure: null,
        wallet: null,
      },
      type: 'card',
    },
    receipt_email: intent.receipt_email,
    receipt_number: null,
    receipt_url: null,
    refunded: false,
    review: null,
    shipping: intent.shipping,
    source_transfer: null,
    statement_descriptor: intent.statement_descriptor,
    statement_descriptor_suffix: intent.statement_descriptor_suffix,
    status: decline ? 'failed' : 'succeeded',
    transfer_data: null,
    transfer_group: null,
  };
  return keep(processor.state.charges, charge);
}

/** Takes `amount` of a hold for good: the money, less the fee, enters the balance; the rest of the hold is let go. */
export function captureCharge(processor: Processor, charge: Charge, amount: number): void {
  const { clock, fees, state, timing } = processor;
  const method = state.paymentMethods.get(charge.payment_method);
  const atOnce = method !== undefined && cardOf(method).bypassesPending === true;
  const entry = postEntry(processor, {
    type: 'charge',
    amount,
    currency: charge.currency,
    source: charge.id,
    description: charge.description,
    availableOn: atOnce ? clock.seconds() : midnightAfter(clock.seconds(), timing.availableAfterDays),
    fee: feeFor(amount, fees),
  });
  charge.captured = true;
  charge.amount_captured = amount;
  charge.balance_transaction = entry.id;
}

/** @throws ApiError when there is no charge with this id */
export function findCharge(state: State, id: string, inPath = false): Charge {
  const charge = state.charges.get(id);
  if (!charge) throw noSuch('charge', id, 'charge', inPath);
  return charge;
}

const listCharges = z.strictObject({
  ...listParameters,
  customer: text.optional(),
  payment_intent: text.optional(),
});

export function chargeRoutes({ state }: Processor): ApiRoute[] {
  return [
    {
      method: 'get',
      path: '/v1/charges',
      handle: ({ input }) => {
        const query = readParameters(listCharges, input);
        const found = [...state.charges.values()].filter(
          (charge) =>
            (query.customer === undefined || charge.customer === query.customer) &&
            (query.payment_intent === undefined || charge.payment_intent === query.payment_intent),
        );
        return listPage(found, query, 'charge', '/v1/charges');
      },
    },
    {
      method: 'get',
      path: '/v1/charges/:charge',
      handle: ({ ids: { charge = '' } }) => findCharge(state, charge, true),
    },
  ];
}
