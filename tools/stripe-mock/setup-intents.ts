import { noSuch, refused, type ErrorDetails } from './errors';
import type { Metadata } from './parameters';
import type { RedirectToBank } from './payment-intents';
import type { State } from './state';

/** The wish to keep a card for later, and how far it has come. */
export interface SetupIntent {
  id: string;
  object: 'setup_intent';
  application: null;
  automatic_payment_methods: { enabled: boolean; allow_redirects?: 'always' | 'never' } | null;
  cancellation_reason: 'abandoned' | 'duplicate' | 'requested_by_customer' | null;
  client_secret: string;
  created: number;
  customer: string | null;
  description: string | null;
  flow_directions: null;
  last_setup_error: (ErrorDetails & { type: 'card_error'; message: string }) | null;
  latest_attempt: null;
  livemode: false;
  mandate: null;
  metadata: Metadata;
  next_action: RedirectToBank | null;
  on_behalf_of: null;
  payment_method: string | null;
  payment_method_options: Record<string, never>;
  payment_method_types: string[];
  single_use_mandate: null;
  status: 'canceled' | 'requires_action' | 'requires_confirmation' | 'requires_payment_method' | 'succeeded';
  usage: 'off_session' | 'on_session';
}

/** @throws ApiError 404 when there is no setup intent with this id */
export function findSetupIntent(state: State, id: string): SetupIntent {
  const intent = state.setupIntents.get(id);
  if (!intent) throw noSuch('setupintent', id, 'intent', true);
  return intent;
}

/** @throws ApiError setup_intent_unexpected_state once it succeeded or was canceled */
export function assertUnfinished(intent: SetupIntent, act: 'confirmed' | 'canceled'): void {
  if (intent.status !== 'succeeded' && intent.status !== 'canceled') return;
  throw refused(`This SetupIntent could not be ${act} because it has a status of ${intent.status}.`, {
    code: 'setup_intent_unexpected_state',
    setup_intent: structuredClone(intent),
  });
}
