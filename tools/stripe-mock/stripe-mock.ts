import express, { type Express } from 'express';
import { apiRouter } from './api-router';
import type { ApiRoute } from './api-route';
import { authenticationRouter } from './authentication-page';
import { balanceRoutes } from './balance';
import { balanceTransactionRoutes, releasePending, settleEntries } from './balance-transactions';
import { chargeRoutes } from './charges';
import { Clock } from './clock';
import { controlRouter } from './control';
import { customerRoutes } from './customers';
import { eventRoutes, recordEvent, type EventRequest } from './events';
import { Faults } from './faults';
import { defaultFees, type FeeSchedule } from './fees';
import { expireHolds } from './holds';
import { Idempotency } from './idempotency';
import { pageRouter } from './page';
import { paymentIntentRoutes } from './payment-intent-routes';
import { paymentMethodRoutes } from './payment-method-routes';
import { payoutRoutes } from './payout-routes';
import { settlePayouts, sweep, type Payout } from './payouts';
import { defaultTiming, type Processor, type Timing } from './processor';
import { refundRoutes } from './refunds';
import { setupIntentRoutes } from './setup-intent-routes';
import { Snapshot } from './snapshot';
import { emptyState, refill, toRecord, type State } from './state';
import { configureEndpoint, webhookEndpointRoutes } from './webhook-endpoints';
import { WebhookSender } from './webhooks';

/** How a stand-in is made; everything has a default. */
export interface StripeMockOptions {
  /** The secret key callers must show. */
  key?: string | undefined;
  /** An endpoint that is there from the start and hears everything. */
  webhook?: { url: string; secret: string } | undefined;
  /** `automatic` sends soon after the event; `on-flush` only when told to. */
  webhookDelivery?: 'automatic' | 'on-flush' | undefined;
  fees?: FeeSchedule | undefined;
  timing?: Timing | undefined;
  /** A file that keeps the state over a restart. */
  snapshotFile?: string | undefined;
  /** The clock to go by. */
  now?: (() => Date) | undefined;
  /** The clock that dates webhook signatures; receivers compare it with theirs. */
  wallClock?: (() => Date) | undefined;
}

/** A running stand-in. */
export interface StripeMock {
  app: Express;
  processor: Processor;
  state: State;
  webhooks: WebhookSender;
  /** The stand-in's time. */
  now(): Date;
  /** Lets time take effect: holds end, money becomes available, payouts arrive. */
  settle(): void;
  /** Moves the clock on and lets time take effect. `seconds` ≥ 0 */
  advanceClock(seconds: number): void;
  /** Pays out what is available; with `includePending` also what would be so only later. */
  payOut(wish?: { includePending?: boolean }): Payout[];
  /** Delivers all webhooks that are due; resolves when that is done. */
  flushWebhooks(): Promise<void>;
  /** Notes that something changed outside a call of the API. */
  changed(): void;
  /** Forgets everything but how it was set up. The clock stands at its own time again, or at `at`, past or future. */
  reset(at?: Date): void;
  /** Stops sending and writes the snapshot. */
  stop(): Promise<void>;
}

const DEFAULT_KEY = 'sk_test_seamwright';
const LOOK_AT_CLOCK_EVERY_MS = 1000;
const noRequest: EventRequest = { id: null, idempotency_key: null };

function apiRoutes(processor: Processor): ApiRoute[] {
  return [
    ...paymentIntentRoutes(processor),
    ...paymentMethodRoutes(processor),
    ...setupIntentRoutes(processor),
    ...customerRoutes(processor),
    ...chargeRoutes(processor),
    ...refundRoutes(processor),
    ...balanceRoutes(processor),
    ...balanceTransactionRoutes(processor),
    ...payoutRoutes(processor),
    ...eventRoutes(processor.state),
    ...webhookEndpointRoutes(processor),
  ];
}

/** A stateful stand-in for the card processor, reached by the official SDK through its host and port settings. */
export function createStripeMock(options: StripeMockOptions = {}): StripeMock {
  const state = emptyState();
  const clock = new Clock(options.now ?? (() => new Date()));
  const faults = new Faults();
  const idempotency = new Idempotency(state, clock);
  const snapshot = options.snapshotFile === undefined ? null : new Snapshot(options.snapshotFile, state, clock);
  const automatic = options.webhookDelivery !== 'on-flush';
  let causedBy = noRequest;

  const webhooks = new WebhookSender({
    state,
    clock,
    wallClock: options.wallClock ?? (() => new Date()),
    changed: () => snapshot?.changed(),
  });
  const processor: Processor = {
    state,
    clock,
    faults,
    fees: options.fees ?? defaultFees,
    timing: options.timing ?? defaultTiming,
    emit: (type, object) =>
      webhooks.queue(recordEvent(state, { type, object, created: clock.seconds(), request: causedBy })),
  };
  const settle = () => {
    expireHolds(processor);
    settleEntries(processor);
    settlePayouts(processor);
    idempotency.forgetOld();
  };
  const changed = () => {
    snapshot?.changed();
    if (automatic) setImmediate(() => void webhooks.flush());
  };
  const configure = () => configureEndpoint(state, options.webhook, clock.seconds());

  snapshot?.load();
  configure();
  const ticking = automatic
    ? setInterval(() => {
        settle();
        void webhooks.flush();
      }, LOOK_AT_CLOCK_EVERY_MS).unref()
    : undefined;

  const mock: StripeMock = {
    app: express(),
    processor,
    state,
    webhooks,
    now: () => clock.now(),
    settle,
    advanceClock: (seconds) => {
      clock.advance(seconds);
      settle();
      changed();
    },
    payOut: ({ includePending = false } = {}) => {
      settle();
      if (includePending) releasePending(processor);
      const made = sweep(processor);
      changed();
      return made;
    },
    flushWebhooks: async () => {
      settle();
      await webhooks.flush();
    },
    changed,
    reset: (at) => {
      refill(state, toRecord(emptyState()));
      faults.clear();
      clock.offsetMs = 0;
      if (at) clock.offsetMs = at.getTime() - clock.now().getTime();
      configure();
      changed();
    },
    stop: async () => {
      clearInterval(ticking);
      await webhooks.stop();
      snapshot?.write();
    },
  };
  const house = {
    key: options.key ?? DEFAULT_KEY,
    state,
    faults,
    idempotency,
    settle,
    changed,
    during: <Result>(request: EventRequest, work: () => Result): Result => {
      causedBy = request;
      try {
        return work();
      } finally {
        causedBy = noRequest;
      }
    },
  };
  mock.app.disable('x-powered-by');
  mock.app.use(apiRouter(house, apiRoutes(processor)));
  mock.app.use('/control', controlRouter(mock));
  mock.app.use(authenticationRouter(mock));
  mock.app.use(pageRouter(mock));
  return mock;
}
