import * as z from 'zod';
import type { Clock } from './clock';
import { noSuch } from './errors';
import { names, type Event } from './events';
import { newId } from './identifiers';
import { keep, type State } from './state';
import type { WebhookEndpoint } from './webhook-endpoints';
import { signatureHeader } from './webhook-signature';

/** One try to hand an event over: the answer's status, or why there was none. */
export interface Attempt {
  at: number;
  status: number | null;
  error: string | null;
}

/** An event on its way to an endpoint. Times in Unix seconds of the stand-in's clock. */
export interface Delivery {
  id: string;
  event: string;
  type: Event['type'];
  endpoint: string;
  url: string;
  created: number;
  status: 'pending' | 'delivered' | 'given_up';
  attempts: Attempt[];
  nextAttemptAt: number | null;
}

const MINUTE = 60;
const HOUR = 3600;
/** Waits after the first, second … failed attempt; the last one repeats until three days have passed. */
const waits = [10, MINUTE, 5 * MINUTE, 30 * MINUTE, 2 * HOUR, 6 * HOUR, 12 * HOUR];
const GIVE_UP_AFTER = 72 * HOUR;
const ANSWER_WITHIN_MS = 10_000;

function waitAfter(failures: number): number {
  return waits[Math.min(failures, waits.length) - 1] ?? 0;
}

const failure = z.object({
  name: z.string(),
  message: z.string(),
  cause: z.object({ code: z.string() }).optional().catch(undefined),
});

/** Why a request got no answer, in one word where there is one. */
function reason(error: unknown): string {
  const { name, message, cause } = failure.parse(error);
  return name === 'TimeoutError' ? 'timeout' : (cause?.code ?? message);
}

/**
 * Hands events to endpoints: signed, at least once, until an answer is 2xx or three days have passed. Deliveries to one
 * endpoint go one after the other; an integration must not rely on it.
 */
export class WebhookSender {
  readonly #state: State;
  readonly #clock: Clock;
  readonly #wallClock: () => Date;
  readonly #changed: () => void;
  readonly #stopping = new AbortController();
  #running: Promise<void> | null = null;

  /** `wallClock` dates the signatures: receivers compare them with real time, however far the clock was advanced. */
  constructor(made: { state: State; clock: Clock; wallClock: () => Date; changed: () => void }) {
    this.#state = made.state;
    this.#clock = made.clock;
    this.#wallClock = made.wallClock;
    this.#changed = made.changed;
  }

  /** Queues an event for every enabled endpoint that asked for its kind. */
  queue(event: Event): void {
    for (const endpoint of this.#state.webhookEndpoints.values()) {
      if (endpoint.status !== 'enabled' || !names(endpoint.enabled_events, event.type)) continue;
      event.pending_webhooks += 1;
      this.#add(event, endpoint.id, endpoint.url);
    }
  }

  /** Sends what was sent before once more. @throws ApiError 404 when there is no such delivery */
  repeat(deliveryId: string): Delivery {
    const earlier = this.#state.deliveries.get(deliveryId);
    const event = earlier && this.#state.events.get(earlier.event);
    if (!event) throw noSuch('delivery', deliveryId, 'delivery', true);
    return this.#add(event, earlier.endpoint, earlier.url);
  }

  #add(event: Event, endpoint: string, url: string): Delivery {
    const now = this.#clock.seconds();
    return keep<Delivery>(this.#state.deliveries, {
      id: newId('whd'),
      event: event.id,
      type: event.type,
      endpoint,
      url,
      created: now,
      status: 'pending',
      attempts: [],
      nextAttemptAt: now,
    });
  }

  /** Sends all that is due, and what becomes due meanwhile; resolves when nothing due is left. */
  async flush(): Promise<void> {
    while (!this.#stopping.signal.aborted && (this.#running !== null || this.#due().length > 0)) {
      await (this.#running ?? this.#start());
    }
  }

  /** Lets the request under way go; what it carried stays due. */
  async stop(): Promise<void> {
    this.#stopping.abort();
    await this.#running;
  }

  #due(): Delivery[] {
    const now = this.#clock.seconds();
    return [...this.#state.deliveries.values()].filter(
      (delivery) => delivery.nextAttemptAt !== null && delivery.nextAttemptAt <= now,
    );
  }

  #start(): Promise<void> {
    const byEndpoint = new Map<string, Delivery[]>();
    for (const delivery of this.#due()) {
      byEndpoint.set(delivery.endpoint, [...(byEndpoint.get(delivery.endpoint) ?? []), delivery]);
    }
    const rounds = [...byEndpoint].map(([endpoint, due]) => this.#sendInTurn(endpoint, due));
    this.#running = Promise.all(rounds).then(() => {
      this.#running = null;
    });
    return this.#running;
  }

  async #sendInTurn(endpointId: string, due: Delivery[]): Promise<void> {
    for (const delivery of due) {
      const endpoint = this.#state.webhookEndpoints.get(endpointId);
      const event = this.#state.events.get(delivery.event);
      if (endpoint?.status !== 'enabled' || !event) {
        delivery.status = 'given_up';
        delivery.nextAttemptAt = null;
        continue;
      }
      const attempt = await this.#send(endpoint, event);
      if (this.#stopping.signal.aborted) return;
      this.#note(delivery, event, attempt);
      this.#changed();
    }
  }

  async #send(endpoint: WebhookEndpoint, event: Event): Promise<Attempt> {
    const at = this.#clock.seconds();
    // Indented, as the processor sends it: a receiver that signs its own re-serialisation finds out here.
    const payload = JSON.stringify(event, null, 2);
    const unixSeconds = Math.floor(this.#wallClock().getTime() / 1000);
    try {
      const response = await fetch(endpoint.url, {
        method: 'POST',
        body: payload,
        headers: {
          'Content-Type': 'application/json; charset=utf-8',
          'Stripe-Signature': signatureHeader(payload, endpoint.secret, unixSeconds),
          'User-Agent': 'Seamwright stand-in webhooks/1.0',
        },
        redirect: 'manual',
        signal: AbortSignal.any([this.#stopping.signal, AbortSignal.timeout(ANSWER_WITHIN_MS)]),
      });
      await response.body?.cancel();
      return { at, status: response.status, error: null };
    } catch (error) {
      return { at, status: null, error: reason(error) };
    }
  }

  #note(delivery: Delivery, event: Event, attempt: Attempt): void {
    delivery.attempts.push(attempt);
    if (attempt.status !== null && attempt.status >= 200 && attempt.status < 300) {
      delivery.status = 'delivered';
      delivery.nextAttemptAt = null;
      event.pending_webhooks = Math.max(0, event.pending_webhooks - 1);
      return;
    }
    const next = this.#clock.seconds() + waitAfter(delivery.attempts.length);
    const late = next > delivery.created + GIVE_UP_AFTER;
    delivery.status = late ? 'given_up' : 'pending';
    delivery.nextAttemptAt = late ? null : next;
  }
}
