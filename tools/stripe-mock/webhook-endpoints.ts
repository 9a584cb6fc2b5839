import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { noSuch } from './errors';
import { API_VERSION } from './events';
import { newId, randomText } from './identifiers';
import { listPage, listParameters } from './lists';
import { clearableText, flag, mergeMetadata, metadata, readParameters, text, type Metadata } from './parameters';
import type { Processor } from './processor';
import { keep, type State } from './state';

/** An address that wants to be told. `secret` is shown to the integrator only once, when it is made. */
export interface WebhookEndpoint {
  id: string;
  object: 'webhook_endpoint';
  api_version: string | null;
  application: null;
  created: number;
  description: string | null;
  enabled_events: string[];
  livemode: false;
  metadata: Metadata;
  secret: string;
  status: 'enabled' | 'disabled';
  url: string;
}

const url = z.url({ protocol: /^https?$/ });
/** Any event's name: an integration may ask for more kinds than the stand-in tells about. */
const enabledEvents = z.array(z.string().regex(/^(\*|[a-z_]+(\.[a-z_]+)+)$/)).min(1);
const createParameters = z.strictObject({
  api_version: text.optional(),
  description: clearableText.optional(),
  enabled_events: enabledEvents,
  metadata: metadata.optional(),
  url,
});
const updateParameters = z.strictObject({
  description: clearableText.optional(),
  disabled: flag.optional(),
  enabled_events: enabledEvents.optional(),
  metadata: metadata.optional(),
  url: url.optional(),
});
const listEndpoints = z.strictObject(listParameters);

/** What an endpoint is made from. */
export interface NewEndpoint {
  id?: string;
  url: string;
  secret: string;
  enabledEvents: string[];
  created: number;
}

/** Keeps a new endpoint. */
function addEndpoint(state: State, made: NewEndpoint): WebhookEndpoint {
  return keep<WebhookEndpoint>(state.webhookEndpoints, {
    id: made.id ?? newId('we'),
    object: 'webhook_endpoint',
    api_version: API_VERSION,
    application: null,
    created: made.created,
    description: null,
    enabled_events: made.enabledEvents,
    livemode: false,
    metadata: {},
    secret: made.secret,
    status: 'enabled',
    url: made.url,
  });
}

const CONFIGURED = 'we_configuredatstart';

/**
 * The endpoint given at start is always the same one: over a restart it may move to another port or get another secret,
 * and what still waits for it follows. Without one, an earlier one goes.
 */
export function configureEndpoint(state: State, wish: { url: string; secret: string } | undefined, now: number): void {
  const known = state.webhookEndpoints.get(CONFIGURED);
  if (!wish) state.webhookEndpoints.delete(CONFIGURED);
  else if (known) Object.assign(known, wish);
  else addEndpoint(state, { ...wish, id: CONFIGURED, enabledEvents: ['*'], created: now });
}

function withoutSecret(endpoint: WebhookEndpoint): Omit<WebhookEndpoint, 'secret'> {
  const shown: Omit<WebhookEndpoint, 'secret'> & { secret?: string } = { ...endpoint };
  delete shown.secret;
  return shown;
}

function find(state: State, id: string): WebhookEndpoint {
  const endpoint = state.webhookEndpoints.get(id);
  if (!endpoint) throw noSuch('webhook endpoint', id, 'webhook_endpoint', true);
  return endpoint;
}

export function webhookEndpointRoutes({ state, clock }: Processor): ApiRoute[] {
  const path = '/v1/webhook_endpoints/:endpoint';
  return [
    {
      method: 'post',
      path: '/v1/webhook_endpoints',
      handle: ({ input }) => {
        const given = readParameters(createParameters, input);
        const endpoint = addEndpoint(state, {
          url: given.url,
          secret: `whsec_${randomText(32)}`,
          enabledEvents: given.enabled_events,
          created: clock.seconds(),
        });
        endpoint.description = given.description ?? null;
        endpoint.metadata = mergeMetadata({}, given.metadata);
        return endpoint;
      },
    },
    {
      method: 'get',
      path: '/v1/webhook_endpoints',
      handle: ({ input }) => {
        const query = readParameters(listEndpoints, input);
        const shown = [...state.webhookEndpoints.values()].map(withoutSecret);
        return listPage(shown, query, 'webhook endpoint', '/v1/webhook_endpoints');
      },
    },
    { method: 'get', path, handle: ({ ids: { endpoint = '' } }) => withoutSecret(find(state, endpoint)) },
    {
      method: 'post',
      path,
      handle: ({ ids: { endpoint: id = '' }, input }) => {
        const endpoint = find(state, id);
        const { disabled, metadata: givenMetadata, ...plain } = readParameters(updateParameters, input);
        Object.assign(endpoint, plain);
        if (disabled !== undefined) endpoint.status = disabled ? 'disabled' : 'enabled';
        endpoint.metadata = mergeMetadata(endpoint.metadata, givenMetadata);
        return withoutSecret(endpoint);
      },
    },
    {
      method: 'delete',
      path,
      handle: ({ ids: { endpoint = '' } }) => {
        const { id } = find(state, endpoint);
        state.webhookEndpoints.delete(id);
        return { id, object: 'webhook_endpoint', deleted: true };
      },
    },
  ];
}
