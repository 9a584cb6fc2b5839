import express from 'express';
import Stripe from 'stripe';
import { createStripeMock, type StripeMock, type StripeMockOptions } from '../index';
import { listenOnLoopback } from '../../stand-in/loopback-server';
import { describes, problemsOfAnswer } from './published-description';

/** Addresses the stand-in answers though the published subset leaves them out. */
const outsideSubset = new Set(['GET /v1/balance']);

/** A stand-in that listens, the official SDK pointed at it, and what its answers did wrong. */
export interface RunningMock {
  mock: StripeMock;
  stripe: Stripe;
  url: string;
  /** Differences from the published description, of every answer so far; complete once closed. */
  violations: string[];
  /** Pulls a lever under `/control`. */
  control(path: string, body?: object): Promise<unknown>;
  close(): Promise<void>;
}

export const KEY = 'sk_test_seamwright';
/** Monday, 2 March 2026, nine in the morning. */
export const MONDAY = new Date('2026-03-02T09:00:00Z');

export function stripeClient(url: string, key = KEY): Stripe {
  const { hostname, port } = new URL(url);
  return new Stripe(key, {
    host: hostname,
    port: Number(port),
    protocol: 'http',
    maxNetworkRetries: 0,
    telemetry: false,
  });
}

/** Starts a stand-in on a free port, its clock standing at {@link MONDAY} and webhooks sent only on flush. */
export async function startMock(options: StripeMockOptions = {}): Promise<RunningMock> {
  const mock = createStripeMock({ now: () => MONDAY, webhookDelivery: 'on-flush', ...options });
  const violations: string[] = [];
  let compared = 0;
  const watched = express();
  watched.use('/v1', (request, response, next) => {
    const send = response.send.bind(response);
    response.send = (body: unknown) => {
      const path = request.originalUrl.split('?')[0] ?? '';
      const known = describes(request.method, path);
      if (typeof body === 'string' && known) {
        compared += 1;
        const found = problemsOfAnswer(request.method, path, response.statusCode, JSON.parse(body));
        violations.push(...found.map((problem) => `${request.method} ${path} ${response.statusCode}: ${problem}`));
      } else if (response.statusCode === 200 && !outsideSubset.has(`${request.method} ${path}`)) {
        violations.push(`${request.method} ${path} is not published`);
      }
      return send(body);
    };
    next();
  });
  watched.use(mock.app);
  const server = await listenOnLoopback(watched, 0);
  return {
    mock,
    stripe: stripeClient(server.url),
    url: server.url,
    violations,
    control: async (path, body) => {
      const response = await fetch(`${server.url}/control${path}`, {
        method: body ? 'POST' : 'GET',
        ...(body && { headers: { 'Content-Type': 'application/json' }, body: JSON.stringify(body) }),
      });
      return response.json();
    },
    close: async () => {
      if (compared === 0) violations.push('no answer was compared');
      await server.close();
      await mock.stop();
    },
  };
}

/** The error a call ends with. */
export async function errorOf(call: Promise<unknown>): Promise<Stripe.errors.StripeError> {
  try {
    await call;
  } catch (error) {
    if (error instanceof Stripe.errors.StripeError) return error;
    throw error;
  }
  throw new Error('The call was expected to be refused.');
}

/** An intent that holds an amount on a test card. */
export function hold(stripe: Stripe, amount: number, card = 'pm_card_visa'): Promise<Stripe.PaymentIntent> {
  return stripe.paymentIntents.create({
    amount,
    currency: 'gbp',
    capture_method: 'manual',
    payment_method: card,
    automatic_payment_methods: { enabled: true, allow_redirects: 'never' },
    confirm: true,
    metadata: { order: 'SW-1001' },
  });
}
