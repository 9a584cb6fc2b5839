import * as z from 'zod';
import type { ApiRoute } from './api-route';
import { noSuch } from './errors';
import { newId } from './identifiers';
import { listPage, listParameters } from './lists';
import { readParameters, text } from './parameters';
import { keep, type State } from './state';

/** Everything the stand-in tells about. */
export const eventTypes = [
  'charge.captured',
  'charge.expired',
  'charge.failed',
  'charge.refunded',
  'charge.succeeded',
  'payment_intent.amount_capturable_updated',
  'payment_intent.canceled',
  'payment_intent.created',
  'payment_intent.payment_failed',
  'payment_intent.requires_action',
  'payment_intent.succeeded',
  'payment_method.attached',
  'payout.created',
  'payout.failed',
  'payout.paid',
  'refund.created',
  'refund.updated',
  'setup_intent.succeeded',
] as const;
export type EventType = (typeof eventTypes)[number];

/** The call that made something happen. */
export interface EventRequest {
  id: string | null;
  idempotency_key: string | null;
}

/** Something that happened, with the object as it was then. */
export interface Event {
  id: string;
  object: 'event';
  api_version: string;
  created: number;
  data: { object: object };
  livemode: false;
  /** How many endpoints have not taken it yet. */
  pending_webhooks: number;
  request: EventRequest;
  type: EventType;
}

/** The version of the published description that the objects follow. */
export const API_VERSION = '2023-08-16';

/** Keeps an event about an object as it is now. */
export function recordEvent(
  state: State,
  happened: { type: EventType; object: object; created: number; request: EventRequest },
): Event {
  return keep(state.events, {
    id: newId('evt'),
    object: 'event',
    api_version: API_VERSION,
    created: happened.created,
    data: { object: structuredClone(happened.object) },
    livemode: false,
    pending_webhooks: 0,
    request: { ...happened.request },
    type: happened.type,
  });
}

/** Whether a list of event types, in which `*` and `charge.*` are patterns, names this one. */
export function names(patterns: string[], type: EventType): boolean {
  return patterns.some(
    (pattern) =>
      pattern === '*' || pattern === type || (pattern.endsWith('.*') && type.startsWith(pattern.slice(0, -1))),
  );
}

const listEvents = z.strictObject({
  ...listParameters,
  type: text.optional(),
  types: z.array(text).max(20).optional(),
});

export function eventRoutes(state: State): ApiRoute[] {
  return [
    {
      method: 'get',
      path: '/v1/events',
      handle: ({ input }) => {
        const query = readParameters(listEvents, input);
        const wanted = query.type === undefined ? query.types : [query.type];
        const found = [...state.events.values()].filter((event) => wanted === undefined || names(wanted, event.type));
        return listPage(found, query, 'event', '/v1/events');
      },
    },
    {
      method: 'get',
      path: '/v1/events/:event',
      handle: ({ ids: { event = '' } }) => {
        const found = state.events.get(event);
        if (!found) throw noSuch('event', event, 'id', true);
        return found;
      },
    },
  ];
}
