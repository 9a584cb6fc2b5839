import * as z from 'zod';
import type { ApiCall, ApiRoute } from './api-route';
import { findCustomer } from './customers';
import { newId, randomText } from './identifiers';
import { listPage, listParameters } from './lists';
import { clearableText, flag, mergeMetadata, metadata, readParameters, text } from './parameters';
import { usePaymentMethod } from './payment-methods';
import type { Processor } from './processor';
import { confirmSetup } from './setup-intent-confirmation';
import { assertUnfinished, findSetupIntent, type SetupIntent } from './setup-intents';
import { keep } from './state';

const returnUrl = z.url({ protocol: /^https?$/ }).optional();
const createParameters = z.strictObject({
  automatic_payment_methods: z
    .strictObject({ enabled: flag, allow_redirects: z.enum(['always', 'never']).optional() })
    .optional(),
  confirm: flag.optional(),
  customer: text.optional(),
  description: clearableText.optional(),
  metadata: metadata.optional(),
  payment_method: text.optional(),
  payment_method_types: z.array(z.literal('card')).optional(),
  allowed_payment_method_types: z.array(z.literal('card')).optional(),
  return_url: returnUrl,
  usage: z.enum(['off_session', 'on_session']).default('off_session'),
});
const confirmParameters = z.strictObject({ payment_method: text.optional(), return_url: returnUrl });
const cancelParameters = z.strictObject({
  cancellation_reason: z.enum(['abandoned', 'duplicate', 'requested_by_customer']).optional(),
});
const listSetups = z.strictObject({
  ...listParameters,
  customer: text.optional(),
  payment_method: text.optional(),
});

function create(processor: Processor, call: ApiCall): SetupIntent {
  const given = readParameters(createParameters, call.input);
  const { state, clock } = processor;
  const customer = given.customer === undefined ? null : findCustomer(state, given.customer, 'customer').id;
  const method = given.payment_method === undefined ? null : usePaymentMethod(processor, given.payment_method).id;
  const id = newId('seti');
  const automatic = given.automatic_payment_methods;
  const intent = keep<SetupIntent>(state.setupIntents, {
    id,
    object: 'setup_intent',
    application: null,
    automatic_payment_methods: automatic
      ? {
          enabled: automatic.enabled,
          ...(automatic.allow_redirects && { allow_redirects: automatic.allow_redirects }),
        }
      : null,
    cancellation_reason: null,
    client_secret: `${id}_secret_${randomText(25)}`,
    created: clock.seconds(),
    customer,
    description: given.description ?? null,
    flow_directions: null,
    last_setup_error: null,
    latest_attempt: null,
    livemode: false,
    mandate: null,
    metadata: mergeMetadata({}, given.metadata),
    next_action: null,
    on_behalf_of: null,
    payment_method: method,
    payment_method_options: {},
    payment_method_types: ['card'],
    single_use_mandate: null,
    status: method === null ? 'requires_payment_method' : 'requires_confirmation',
    usage: given.usage,
  });
  if (!given.confirm) return intent;
  return confirmSetup(processor, intent, {
    paymentMethod: undefined,
    returnUrl: given.return_url ?? null,
    baseUrl: call.baseUrl,
  });
}

/** Setup intents over HTTP. */
export function setupIntentRoutes(processor: Processor): ApiRoute[] {
  const { state } = processor;
  return [
    { method: 'post', path: '/v1/setup_intents', handle: (call) => create(processor, call) },
    {
      method: 'get',
      path: '/v1/setup_intents',
      handle: ({ input }) => {
        const query = readParameters(listSetups, input);
        const found = [...state.setupIntents.values()].filter(
          (intent) =>
            (query.customer === undefined || intent.customer === query.customer) &&
            (query.payment_method === undefined || intent.payment_method === query.payment_method),
        );
        return listPage(found, query, 'setup_intent', '/v1/setup_intents');
      },
    },
    {
      method: 'get',
      path: '/v1/setup_intents/:intent',
      handle: ({ ids: { intent = '' } }) => findSetupIntent(state, intent),
    },
    {
      method: 'post',
      path: '/v1/setup_intents/:intent/confirm',
      handle: ({ ids: { intent = '' }, input, baseUrl }) => {
        const found = findSetupIntent(state, intent);
        const given = readParameters(confirmParameters, input);
        return confirmSetup(processor, found, {
          paymentMethod: given.payment_method,
          returnUrl: given.return_url ?? null,
          baseUrl,
        });
      },
    },
    {
      method: 'post',
      path: '/v1/setup_intents/:intent/cancel',
      handle: ({ ids: { intent: id = '' }, input }) => {
        const intent = findSetupIntent(state, id);
        const { cancellation_reason: reason = null } = readParameters(cancelParameters, input);
        assertUnfinished(intent, 'canceled');
        intent.status = 'canceled';
        intent.cancellation_reason = reason;
        intent.next_action = null;
        return intent;
      },
    },
  ];
}
