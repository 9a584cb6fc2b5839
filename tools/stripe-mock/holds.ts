import { captureCharge, findCharge, HOLD_DAYS, type Charge } from './charges';
import { SECONDS_PER_DAY } from './clock';
import { decide } from './card-decision';
import { cardError, refused } from './errors';
import type { Metadata } from './parameters';
import { findPaymentMethod } from './payment-methods';
import { assertOpenFor, type PaymentIntent } from './payment-intents';
import type { Processor } from './processor';

function heldCharge(processor: Processor, intent: PaymentIntent): Charge {
  return findCharge(processor.state, intent.latest_charge ?? '');
}

/**
 * Takes all or part of a hold, once; what is not taken is let go.
 * @throws ApiError when nothing is held or more is asked than is held
 */
export function captureHold(
  processor: Processor,
  intent: PaymentIntent,
  wish: { amount: number | undefined; metadata: Metadata },
): PaymentIntent {
  assertOpenFor(intent, 'captured');
  const taken = wish.amount ?? intent.amount_capturable;
  if (taken > intent.amount_capturable) {
    throw refused(
      `The amount to capture (${taken}) is greater than the remaining amount you can capture on this ` +
        `PaymentIntent (${intent.amount_capturable}).`,
      { code: 'amount_too_large', param: 'amount_to_capture' },
    );
  }
  const charge = heldCharge(processor, intent);
  captureCharge(processor, charge, taken);
  intent.amount_capturable = 0;
  intent.amount_received = taken;
  intent.metadata = wish.metadata;
  intent.status = 'succeeded';
  processor.emit('charge.captured', charge);
  processor.emit('payment_intent.succeeded', intent);
  return intent;
}

/**
 * Raises a hold to a higher amount, where the card allows it.
 * @throws ApiError when it can't be raised; 402 when the bank refuses, and then the earlier hold stays as it was
 */
export function raiseHold(
  processor: Processor,
  intent: PaymentIntent,
  wish: { amount: number; description: string | null; metadata: Metadata },
): PaymentIntent {
  assertOpenFor(intent, 'incremented');
  const charge = heldCharge(processor, intent);
  const card = charge.payment_method_details.card;
  if (card.incremental_authorization.status !== 'available') {
    throw refused('This PaymentIntent is not eligible for incremental authorization.', {
      code: 'payment_intent_unexpected_state',
      payment_intent: structuredClone(intent),
    });
  }
  if (wish.amount <= intent.amount) {
    throw refused(`The amount must be greater than the amount currently authorized (${intent.amount}).`, {
      code: 'amount_too_small',
      param: 'amount',
    });
  }
  const method = findPaymentMethod(processor.state, charge.payment_method, 'payment_method');
  const decision = decide(processor, method, { authenticated: true, canAsk: false });
  if (decision.kind === 'declined') {
    const { message, ...codes } = decision.decline;
    throw cardError(message, { ...codes, charge: charge.id, payment_intent: structuredClone(intent) });
  }
  Object.assign(intent, wish, { amount_capturable: wish.amount });
  charge.amount = wish.amount;
  card.amount_authorized = wish.amount;
  processor.emit('payment_intent.amount_capturable_updated', intent);
  return intent;
}

/** Ends an intent that has not been captured, and lets go what it holds. @throws ApiError when it is too late */
export function cancelIntent(
  processor: Processor,
  intent: PaymentIntent,
  reason: PaymentIntent['cancellation_reason'],
): PaymentIntent {
  assertOpenFor(intent, 'canceled');
  intent.status = 'canceled';
  intent.canceled_at = processor.clock.seconds();
  intent.cancellation_reason = reason;
  intent.amount_capturable = 0;
  intent.next_action = null;
  processor.emit('payment_intent.canceled', intent);
  return intent;
}

/** Ends the holds that were not captured within their days. */
export function expireHolds(processor: Processor): void {
  const oldestLiving = processor.clock.seconds() - HOLD_DAYS * SECONDS_PER_DAY;
  for (const intent of processor.state.paymentIntents.values()) {
    if (intent.status !== 'requires_capture') continue;
    const charge = heldCharge(processor, intent);
    if (charge.created > oldestLiving) continue;
    processor.emit('charge.expired', charge);
    cancelIntent(processor, intent, 'automatic');
  }
}
