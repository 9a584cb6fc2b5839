import { attachMethod, findPaymentMethod, usePaymentMethod, type PaymentMethod } from './payment-methods';
import { captureCharge, recordCharge } from './charges';
import { decide, type Presence } from './card-decision';
import { findCustomer } from './customers';
import { cardError, refused } from './errors';
import { assertOpenFor, type PaymentIntent } from './payment-intents';
import type { Processor } from './processor';
import type { Decline } from './test-cards';

/** How an intent is confirmed. */
export interface Confirmation {
  paymentMethod?: string | undefined;
  offSession: boolean;
  errorOnRequiresAction: boolean;
  returnUrl: string | null;
  baseUrl: string;
}

/** Puts a card on an intent. @throws ApiError when it belongs to another customer */
export function chooseMethod(processor: Processor, intent: PaymentIntent, id: string): void {
  const method = usePaymentMethod(processor, id);
  if (method.customer !== null && method.customer !== intent.customer) {
    throw refused('The provided PaymentMethod belongs to another customer than this PaymentIntent.', {
      param: 'payment_method',
    });
  }
  intent.payment_method = method.id;
}

/**
 * Asks the bank for the money of an intent: held, taken, to be confirmed by the holder, or refused.
 * @throws ApiError 402 with the intent when the card is refused
 */
export function confirmIntent(processor: Processor, intent: PaymentIntent, confirmation: Confirmation): PaymentIntent {
  assertOpenFor(intent, 'confirmed');
  if (confirmation.paymentMethod !== undefined) chooseMethod(processor, intent, confirmation.paymentMethod);
  if (intent.payment_method === null) {
    throw refused(
      "You cannot confirm this PaymentIntent because it's missing a payment method. " +
        'Update the PaymentIntent with a payment method and then confirm it again.',
      { code: 'payment_intent_unexpected_state', payment_intent: structuredClone(intent) },
    );
  }
  const canAsk = !confirmation.offSession && !confirmation.errorOnRequiresAction;
  return askBank(processor, intent, { authenticated: false, canAsk }, confirmation);
}

/**
 * Goes on with an intent after the holder confirmed with the bank, or did not.
 * @throws ApiError 402 when the card is then refused
 */
export function finishAuthentication(processor: Processor, intent: PaymentIntent, confirmed: boolean): PaymentIntent {
  intent.next_action = null;
  if (confirmed) return askBank(processor, intent, { authenticated: true, canAsk: true });
  return refuse(processor, intent, methodOf(processor, intent), {
    code: 'payment_intent_authentication_failure',
    decline_code: 'authentication_not_completed',
    message: 'The provided PaymentMethod has failed authentication.',
  });
}

function methodOf(processor: Processor, intent: PaymentIntent): PaymentMethod {
  return findPaymentMethod(processor.state, intent.payment_method ?? '', 'payment_method');
}

function askBank(
  processor: Processor,
  intent: PaymentIntent,
  presence: Presence,
  confirmation?: Confirmation,
): PaymentIntent {
  const method = methodOf(processor, intent);
  const decision = decide(processor, method, presence);
  if (decision.kind === 'declined') return refuse(processor, intent, method, decision.decline);
  if (decision.kind === 'authenticate') {
    intent.status = 'requires_action';
    intent.next_action = {
      type: 'redirect_to_url',
      redirect_to_url: {
        url: `${confirmation?.baseUrl ?? ''}/authenticate/${intent.id}?client_secret=${intent.client_secret}`,
        return_url: confirmation?.returnUrl ?? null,
      },
    };
    processor.emit('payment_intent.requires_action', intent);
    return intent;
  }
  return accept(processor, intent, method);
}

function accept(processor: Processor, intent: PaymentIntent, method: PaymentMethod): PaymentIntent {
  const charge = recordCharge(processor, intent, method);
  intent.latest_charge = charge.id;
  intent.last_payment_error = null;
  intent.next_action = null;
  if (intent.setup_future_usage !== null && intent.customer !== null) {
    attachMethod(processor, method, findCustomer(processor.state, intent.customer, 'customer'));
  }
  if (intent.capture_method === 'manual') {
    intent.status = 'requires_capture';
    intent.amount_capturable = intent.amount;
    processor.emit('charge.succeeded', charge);
    processor.emit('payment_intent.amount_capturable_updated', intent);
    return intent;
  }
  captureCharge(processor, charge, intent.amount);
  intent.status = 'succeeded';
  intent.amount_received = intent.amount;
  processor.emit('charge.succeeded', charge);
  processor.emit('payment_intent.succeeded', intent);
  return intent;
}

function refuse(processor: Processor, intent: PaymentIntent, method: PaymentMethod, decline: Decline): never {
  const charge = recordCharge(processor, intent, method, decline);
  const { message, ...codes } = decline;
  const details = { ...codes, charge: charge.id, payment_method: structuredClone(method) };
  intent.latest_charge = charge.id;
  intent.last_payment_error = { type: 'card_error', message, ...details };
  intent.next_action = null;
  intent.payment_method = null;
  intent.status = 'requires_payment_method';
  processor.emit('charge.failed', charge);
  processor.emit('payment_intent.payment_failed', intent);
  throw cardError(message, { ...details, payment_intent: structuredClone(intent) });
}
