import { decide, type Presence } from './card-decision';
import { findCustomer } from './customers';
import { cardError, refused } from './errors';
import { attachMethod, findPaymentMethod, usePaymentMethod } from './payment-methods';
import type { Processor } from './processor';
import { assertUnfinished, type SetupIntent } from './setup-intents';
import type { Decline } from './test-cards';

/**
 * Asks the bank whether a card may be kept, and keeps it.
 * @throws ApiError 402 with the setup intent when the card is refused
 */
export function confirmSetup(
  processor: Processor,
  intent: SetupIntent,
  wish: { paymentMethod: string | undefined; returnUrl: string | null; baseUrl: string },
): SetupIntent {
  assertUnfinished(intent, 'confirmed');
  if (wish.paymentMethod !== undefined) {
    intent.payment_method = usePaymentMethod(processor, wish.paymentMethod).id;
  }
  if (intent.payment_method === null) {
    throw refused("You cannot confirm this SetupIntent because it's missing a payment method.", {
      code: 'setup_intent_unexpected_state',
      setup_intent: structuredClone(intent),
    });
  }
  return askBank(processor, intent, { authenticated: false, canAsk: true }, wish);
}

/** Goes on after the holder confirmed with the bank, or did not. @throws ApiError 402 when the card is then refused */
export function finishSetupAuthentication(processor: Processor, intent: SetupIntent, confirmed: boolean): SetupIntent {
  intent.next_action = null;
  if (confirmed) return askBank(processor, intent, { authenticated: true, canAsk: true });
  return refuse(intent, {
    code: 'setup_intent_authentication_failure',
    decline_code: 'authentication_not_completed',
    message: 'The provided PaymentMethod has failed authentication.',
  });
}

function askBank(
  processor: Processor,
  intent: SetupIntent,
  presence: Presence,
  wish?: { returnUrl: string | null; baseUrl: string },
): SetupIntent {
  const method = findPaymentMethod(processor.state, intent.payment_method ?? '', 'payment_method');
  const decision = decide(processor, method, presence);
  if (decision.kind === 'declined') return refuse(intent, decision.decline);
  if (decision.kind === 'authenticate') {
    intent.status = 'requires_action';
    intent.next_action = {
      type: 'redirect_to_url',
      redirect_to_url: {
        url: `${wish?.baseUrl ?? ''}/authenticate/${intent.id}?client_secret=${intent.client_secret}`,
        return_url: wish?.returnUrl ?? null,
      },
    };
    return intent;
  }
  if (intent.customer !== null) {
    attachMethod(processor, method, findCustomer(processor.state, intent.customer, 'customer'));
  }
  intent.status = 'succeeded';
  intent.last_setup_error = null;
  intent.next_action = null;
  processor.emit('setup_intent.succeeded', intent);
  return intent;
}

function refuse(intent: SetupIntent, { message, ...codes }: Decline): never {
  intent.status = 'requires_payment_method';
  intent.payment_method = null;
  intent.next_action = null;
  intent.last_setup_error = { type: 'card_error', message, ...codes };
  throw cardError(message, { ...codes, setup_intent: structuredClone(intent) });
}
