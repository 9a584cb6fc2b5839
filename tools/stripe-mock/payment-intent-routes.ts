import * as z from 'zod';
import type { ApiCall, ApiRoute } from './api-route';
import { findCustomer } from './customers';
import { invalidParameter, refused } from './errors';
import { cancelIntent, captureHold, raiseHold } from './holds';
import { newId, randomText } from './identifiers';
import { listPage, listParameters } from './lists';
import {
  amount,
  clearableText,
  currency,
  flag,
  mergeMetadata,
  metadata,
  readParameters,
  shipping,
  text,
} from './parameters';
import { chooseMethod, confirmIntent } from './payment-intent-confirmation';
import { assertOpenFor, findPaymentIntent, type PaymentIntent } from './payment-intents';
import type { Processor } from './processor';
import { keep } from './state';

const describable = {
  description: clearableText.optional(),
  metadata: metadata.optional(),
  receipt_email: clearableText.optional(),
  shipping: shipping.optional(),
  statement_descriptor: clearableText.optional(),
  statement_descriptor_suffix: clearableText.optional(),
};
const chargeable = {
  ...describable,
  customer: text.optional(),
  payment_method: text.optional(),
  payment_method_options: z
    .strictObject({
      card: z
        .strictObject({ request_incremental_authorization: z.enum(['if_available', 'never']).optional() })
        .optional(),
    })
    .optional(),
  payment_method_types: z.array(z.literal('card')).optional(),
  /** The newer name of the same list. */
  allowed_payment_method_types: z.array(z.literal('card')).optional(),
  setup_future_usage: z.enum(['off_session', 'on_session']).optional(),
};
const confirmable = {
  error_on_requires_action: flag.optional(),
  off_session: flag.optional(),
  return_url: z.url({ protocol: /^https?$/ }).optional(),
};
const createParameters = z.strictObject({
  ...chargeable,
  ...confirmable,
  amount,
  automatic_payment_methods: z
    .strictObject({ enabled: flag, allow_redirects: z.enum(['always', 'never']).optional() })
    .optional(),
  capture_method: z.enum(['automatic', 'automatic_async', 'manual']).default('automatic'),
  confirm: flag.optional(),
  confirmation_method: z.enum(['automatic', 'manual']).default('automatic'),
  currency,
});
const updateParameters = z.strictObject({ ...chargeable, amount: amount.optional(), currency: currency.optional() });
const confirmParameters = z.strictObject({
  ...confirmable,
  payment_method: text.optional(),
  receipt_email: clearableText.optional(),
  setup_future_usage: z.enum(['off_session', 'on_session']).optional(),
  shipping: shipping.optional(),
});
const captureParameters = z.strictObject({
  amount_to_capture: amount.optional(),
  final_capture: z.literal('true').optional(),
  metadata: metadata.optional(),
  statement_descriptor: text.optional(),
  statement_descriptor_suffix: text.optional(),
});
const cancelParameters = z.strictObject({
  cancellation_reason: z.enum(['abandoned', 'duplicate', 'fraudulent', 'requested_by_customer']).optional(),
});
const raiseParameters = z.strictObject({
  amount,
  description: text.optional(),
  metadata: metadata.optional(),
  statement_descriptor: text.optional(),
});
const listIntents = z.strictObject({ ...listParameters, customer: text.optional() });

const LEAST_AMOUNT = 30;
const LARGEST_AMOUNT = 99_999_999;

function assertChargeable(minor: number): void {
  if (minor < LEAST_AMOUNT) {
    throw invalidParameter(`Amount must be at least ${LEAST_AMOUNT} minor units`, 'amount', 'amount_too_small');
  }
  if (minor > LARGEST_AMOUNT) {
    throw invalidParameter(`Amount must be no more than ${LARGEST_AMOUNT} minor units`, 'amount', 'amount_too_large');
  }
}

function newIntent(given: z.output<typeof createParameters>, created: number): PaymentIntent {
  const id = newId('pi');
  const automatic = given.automatic_payment_methods;
  return {
    id,
    object: 'payment_intent',
    amount: given.amount,
    amount_capturable: 0,
    amount_details: { tip: {} },
    amount_received: 0,
    application: null,
    application_fee_amount: null,
    automatic_payment_methods: automatic
      ? {
          enabled: automatic.enabled,
          ...(automatic.allow_redirects && { allow_redirects: automatic.allow_redirects }),
        }
      : null,
    canceled_at: null,
    cancellation_reason: null,
    capture_method: given.capture_method,
    client_secret: `${id}_secret_${randomText(25)}`,
    confirmation_method: given.confirmation_method,
    created,
    currency: given.currency,
    customer: null,
    description: null,
    last_payment_error: null,
    latest_charge: null,
    livemode: false,
    metadata: {},
    next_action: null,
    on_behalf_of: null,
    payment_method: null,
    payment_method_options: {},
    payment_method_types: ['card'],
    processing: null,
    receipt_email: null,
    review: null,
    setup_future_usage: null,
    shipping: null,
    statement_descriptor: null,
    statement_descriptor_suffix: null,
    status: 'requires_payment_method',
    transfer_data: null,
    transfer_group: null,
  };
}

/** Sets what is described and chosen; choosing a card moves an unconfirmed intent on to its confirmation. */
function edit(processor: Processor, intent: PaymentIntent, given: z.output<typeof updateParameters>): PaymentIntent {
  if (given.customer !== undefined) findCustomer(processor.state, given.customer, 'customer');
  const { metadata: givenMetadata, payment_method: method, payment_method_options: options, ...plain } = given;
  Object.assign(intent, plain);
  intent.metadata = mergeMetadata(intent.metadata, givenMetadata);
  if (options?.card) {
    const wish = options.card.request_incremental_authorization;
    intent.payment_method_options.card = wish ? { request_incremental_authorization: wish } : {};
  }
  if (method !== undefined) {
    chooseMethod(processor, intent, method);
    intent.status = 'requires_confirmation';
  }
  return intent;
}

/** After confirmation only the description may change; before it, also amount, card and customer. */
function update(processor: Processor, intent: PaymentIntent, call: ApiCall): PaymentIntent {
  const given = readParameters(updateParameters, call.input);
  if (given.amount !== undefined) assertChargeable(given.amount);
  const unconfirmed = ['requires_payment_method', 'requires_confirmation', 'requires_action'].includes(intent.status);
  const fixed = Object.keys(given).find((field) => !(field in describable));
  if (!unconfirmed && fixed !== undefined) {
    throw refused(
      `This PaymentIntent's ${fixed} could not be updated because it has a status of ${intent.status}. ` +
        'You may only update it before the PaymentIntent is confirmed.',
      { code: 'payment_intent_unexpected_state', param: fixed, payment_intent: structuredClone(intent) },
    );
  }
  if (intent.status === 'requires_action' && fixed !== undefined) {
    intent.status = 'requires_confirmation';
    intent.next_action = null;
  }
  return edit(processor, intent, given);
}

function create(processor: Processor, call: ApiCall): PaymentIntent {
  const given = readParameters(createParameters, call.input);
  assertChargeable(given.amount);
  const described = readParameters(z.object(chargeable), call.input);
  const { confirm = false, off_session: offSession = false, return_url: returnUrl = null } = given;
  const { error_on_requires_action: errorOnRequiresAction = false } = given;
  if (!confirm) {
    const needsConfirm = ['off_session', 'return_url', 'error_on_requires_action'].find((name) => name in call.input);
    if (needsConfirm) {
      throw invalidParameter(`${needsConfirm} can only be passed when confirm is true.`, needsConfirm);
    }
  }
  const { state, clock } = processor;
  const intent = edit(processor, newIntent(given, clock.seconds()), described);
  keep(state.paymentIntents, intent);
  processor.emit('payment_intent.created', intent);
  if (!confirm) return intent;
  return confirmIntent(processor, intent, { offSession, errorOnRequiresAction, returnUrl, baseUrl: call.baseUrl });
}

function confirm(processor: Processor, intent: PaymentIntent, call: ApiCall): PaymentIntent {
  const given = readParameters(confirmParameters, call.input);
  assertOpenFor(intent, 'confirmed');
  if (given.receipt_email !== undefined) intent.receipt_email = given.receipt_email;
  if (given.setup_future_usage !== undefined) intent.setup_future_usage = given.setup_future_usage;
  if (given.shipping !== undefined) intent.shipping = given.shipping;
  return confirmIntent(processor, intent, {
    paymentMethod: given.payment_method,
    offSession: given.off_session ?? false,
    errorOnRequiresAction: given.error_on_requires_action ?? false,
    returnUrl: given.return_url ?? null,
    baseUrl: call.baseUrl,
  });
}

function capture(processor: Processor, intent: PaymentIntent, call: ApiCall): PaymentIntent {
  const given = readParameters(captureParameters, call.input);
  return captureHold(processor, intent, {
    amount: given.amount_to_capture,
    metadata: mergeMetadata(intent.metadata, given.metadata),
  });
}

function raise(processor: Processor, intent: PaymentIntent, call: ApiCall): PaymentIntent {
  const given = readParameters(raiseParameters, call.input);
  assertChargeable(given.amount);
  return raiseHold(processor, intent, {
    amount: given.amount,
    description: given.description ?? intent.description,
    metadata: mergeMetadata(intent.metadata, given.metadata),
  });
}

/** Payment intents over HTTP. */
export function paymentIntentRoutes(processor: Processor): ApiRoute[] {
  const { state } = processor;
  const onIntent = (
    path: string,
    act: (processor: Processor, intent: PaymentIntent, call: ApiCall) => PaymentIntent,
  ): ApiRoute => ({
    method: 'post',
    path: `/v1/payment_intents/:intent${path}`,
    handle: (call) => act(processor, findPaymentIntent(state, call.ids['intent'] ?? ''), call),
  });
  return [
    { method: 'post', path: '/v1/payment_intents', handle: (call) => create(processor, call) },
    {
      method: 'get',
      path: '/v1/payment_intents',
      handle: ({ input }) => {
        const query = readParameters(listIntents, input);
        const found = [...state.paymentIntents.values()].filter(
          (intent) => query.customer === undefined || intent.customer === query.customer,
        );
        return listPage(found, query, 'payment_intent', '/v1/payment_intents');
      },
    },
    {
      method: 'get',
      path: '/v1/payment_intents/:intent',
      handle: ({ ids: { intent = '' } }) => findPaymentIntent(state, intent),
    },
    onIntent('', update),
    onIntent('/confirm', confirm),
    onIntent('/capture', capture),
    onIntent('/cancel', (_, intent, call) =>
      cancelIntent(processor, intent, readParameters(cancelParameters, call.input).cancellation_reason ?? null),
    ),
    onIntent('/increment_authorization', raise),
  ];
}
