import express, { Router, type ErrorRequestHandler } from 'express';
import * as z from 'zod';
import { balanceOf } from './balance';
import { ApiError } from './errors';
import { finishAuthentication } from './payment-intent-confirmation';
import { findPaymentIntent } from './payment-intents';
import { arrive, fail, findPayout } from './payouts';
import { finishSetupAuthentication } from './setup-intent-confirmation';
import { findSetupIntent } from './setup-intents';
import { loopbackOnly } from '../stand-in/loopback';
import { toRecord } from './state';
import type { StripeMock } from './stripe-mock';
import { genericDecline } from './test-cards';

const times = z.int().min(1).max(1000).default(1);
const filter = {
  times,
  method: z.enum(['GET', 'POST', 'DELETE']).optional(),
  pathIncludes: z.string().min(1).optional(),
};
const slowly = z.strictObject({ ...filter, milliseconds: z.int().min(1).max(600_000) });
const loss = z.strictObject({ ...filter, how: z.enum(['error', 'disconnect']).default('error') });
const refusal = z.strictObject({
  ...filter,
  status: z.union([z.literal(429), z.literal(500), z.literal(503)]).default(500),
});
const decline = z.strictObject({
  times,
  code: z.string().min(1).default(genericDecline.code),
  declineCode: z.string().min(1).default(genericDecline.decline_code),
  message: z.string().min(1).default(genericDecline.message),
});
const advance = z.union([
  z.strictObject({ seconds: z.int().min(0) }),
  z.strictObject({ to: z.iso.datetime({ offset: true }) }),
]);
const reset = z.strictObject({ at: z.iso.datetime({ offset: true }).optional() });
const payOut = z.strictObject({ includePending: z.boolean().default(false) });
const authentication = z.strictObject({ outcome: z.enum(['confirmed', 'refused']) });

/** Seconds from now until the wished time. @throws ApiError when it has passed */
function secondsUntil(mock: StripeMock, to: string): number {
  const seconds = Math.ceil((Date.parse(to) - mock.now().getTime()) / 1000);
  if (seconds < 0) throw new ApiError(400, 'invalid_request_error', 'The clock does not go back.');
  return seconds;
}

/** Plays the bank's answer; a refusal is an outcome here, not an error. */
export function authenticate(mock: StripeMock, intentId: string, confirmed: boolean): object {
  const isSetup = intentId.startsWith('seti_');
  const intent = isSetup ? findSetupIntent(mock.state, intentId) : findPaymentIntent(mock.state, intentId);
  if (intent.status !== 'requires_action') {
    throw new ApiError(409, 'invalid_request_error', `${intentId} does not wait for confirmation by the bank.`);
  }
  try {
    if (intent.object === 'setup_intent') finishSetupAuthentication(mock.processor, intent, confirmed);
    else finishAuthentication(mock.processor, intent, confirmed);
  } catch (error) {
    if (!(error instanceof ApiError) || error.type !== 'card_error') throw error;
  }
  mock.changed();
  return intent;
}

const asErrorAnswer: ErrorRequestHandler = (error: unknown, _request, response, next) => {
  if (error instanceof ApiError) response.status(error.status).json(error.body());
  else if (error instanceof z.ZodError) response.status(400).json({ error: { message: z.prettifyError(error) } });
  else next(error);
};

/** The levers of the stand-in, JSON in and out, for this machine only. */
export function controlRouter(mock: StripeMock): Router {
  const { faults, state } = mock.processor;
  const router = Router();
  router.use(loopbackOnly(), express.json({ limit: '100kb' }));
  // Handlers get an object even when nothing was sent.
  router.use((request, _response, next) => {
    const body: unknown = request.body;
    request.body = body ?? {};
    next();
  });

  router.get('/state', (_request, response) => {
    response.json({ now: mock.now().toISOString(), balance: balanceOf(state), ...toRecord(state) });
  });
  router.get('/deliveries', (_request, response) => {
    response.json({ deliveries: [...state.deliveries.values()].reverse() });
  });
  router.post('/deliveries/:id/repeat', (request, response) => {
    const delivery = mock.webhooks.repeat(request.params.id);
    mock.changed();
    response.json(delivery);
  });
  router.post('/flush-webhooks', async (_request, response) => {
    await mock.flushWebhooks();
    const waiting = [...state.deliveries.values()].filter(({ status }) => status === 'pending');
    response.json({ waiting: waiting.length });
  });
  router.post('/advance-clock', (request, response) => {
    const wish = advance.parse(request.body);
    mock.advanceClock('seconds' in wish ? wish.seconds : secondsUntil(mock, wish.to));
    response.json({ now: mock.now().toISOString() });
  });
  router.post('/pay-out', (request, response) => {
    response.json({ payouts: mock.payOut(payOut.parse(request.body)) });
  });
  router.post('/payouts/:id/arrive', (request, response) => {
    const payout = arrive(mock.processor, findPayout(state, request.params.id));
    mock.changed();
    response.json(payout);
  });
  router.post('/payouts/:id/fail', (request, response) => {
    const payout = fail(mock.processor, findPayout(state, request.params.id));
    mock.changed();
    response.json(payout);
  });
  router.post('/intents/:id/authenticate', (request, response) => {
    response.json(authenticate(mock, request.params.id, authentication.parse(request.body).outcome === 'confirmed'));
  });
  router.post('/answer-slowly', (request, response) => {
    faults.answerSlowly(slowly.parse(request.body));
    response.json({ arranged: true });
  });
  router.post('/lose-answer', (request, response) => {
    faults.loseAnswer(loss.parse(request.body));
    response.json({ arranged: true });
  });
  router.post('/refuse-call', (request, response) => {
    faults.refuseCall(refusal.parse(request.body));
    response.json({ arranged: true });
  });
  router.post('/decline-next', (request, response) => {
    const { times: count, declineCode, ...rest } = decline.parse(request.body);
    faults.declineNext({ times: count, decline: { ...rest, decline_code: declineCode } });
    response.json({ arranged: true });
  });
  router.post('/reset', (request, response) => {
    const { at } = reset.parse(request.body);
    mock.reset(at === undefined ? undefined : new Date(at));
    response.json({ now: mock.now().toISOString() });
  });
  router.use(asErrorAnswer);
  return router;
}
