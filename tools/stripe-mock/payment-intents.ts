import { noSuch, refused, type ErrorDetails } from './errors';
import type { Metadata } from './parameters';
import type { State } from './state';

export type PaymentIntentStatus =
  | 'canceled'
  | 'requires_action'
  | 'requires_capture'
  | 'requires_confirmation'
  | 'requires_payment_method'
  | 'succeeded';

/** The wish to collect an amount, and how far it has come. Amounts in minor units. */
export interface PaymentIntent {
  id: string;
  object: 'payment_intent';
  amount: number;
  amount_capturable: number;
  amount_details: { tip: Record<string, never> };
  amount_received: number;
  application: null;
  application_fee_amount: null;
  automatic_payment_methods: { enabled: boolean; allow_redirects?: 'always' | 'never' } | null;
  canceled_at: number | null;
  cancellation_reason: 'abandoned' | 'automatic' | 'duplicate' | 'fraudulent' | 'requested_by_customer' | null;
  capture_method: 'automatic' | 'automatic_async' | 'manual';
  client_secret: string;
  confirmation_method: 'automatic' | 'manual';
  created: number;
  currency: string;
  customer: string | null;
  description: string | null;
  last_payment_error: (ErrorDetails & { type: 'card_error'; message: string }) | null;
  latest_charge: string | null;
  livemode: false;
  metadata: Metadata;
  next_action: RedirectToBank | null;
  on_behalf_of: null;
  payment_method: string | null;
  payment_method_options: { card?: { request_incremental_authorization?: 'if_available' | 'never' } };
  payment_method_types: string[];
  processing: null;
  receipt_email: string | null;
  review: null;
  setup_future_usage: 'off_session' | 'on_session' | null;
  shipping: object | null;
  statement_descriptor: string | null;
  statement_descriptor_suffix: string | null;
  status: PaymentIntentStatus;
  transfer_data: null;
  transfer_group: null;
}

/** Where the card's holder goes to confirm with the bank, and where she comes back to. */
export interface RedirectToBank {
  type: 'redirect_to_url';
  redirect_to_url: { url: string; return_url: string | null };
}

/** @throws ApiError when there is no intent with this id */
export function findPaymentIntent(state: State, id: string, inPath = true): PaymentIntent {
  const intent = state.paymentIntents.get(id);
  if (!intent) throw noSuch('payment_intent', id, inPath ? 'intent' : 'payment_intent', inPath);
  return intent;
}

/** Which states each act is open in. */
const openStates = {
  confirmed: ['requires_payment_method', 'requires_confirmation', 'requires_action'],
  captured: ['requires_capture'],
  canceled: ['requires_payment_method', 'requires_capture', 'requires_confirmation', 'requires_action'],
  incremented: ['requires_capture'],
} as const satisfies Record<string, readonly PaymentIntentStatus[]>;

/** @throws ApiError payment_intent_unexpected_state when the intent's state does not allow the act */
export function assertOpenFor(intent: PaymentIntent, act: keyof typeof openStates): void {
  const states: readonly PaymentIntentStatus[] = openStates[act];
  if (states.includes(intent.status)) return;
  throw refused(
    `This PaymentIntent could not be ${act} because it has a status of ${intent.status}. ` +
      `Only a PaymentIntent with one of the following statuses may be ${act}: ${states.join(', ')}.`,
    { code: 'payment_intent_unexpected_state', payment_intent: structuredClone(intent) },
  );
}
