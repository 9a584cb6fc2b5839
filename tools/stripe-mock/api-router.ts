import express, { Router, type ErrorRequestHandler, type Request, type Response } from 'express';
import { setTimeout as wait } from 'node:timers/promises';
import { assertKey } from './api-key';
import type { ApiRoute } from './api-route';
import { ApiError } from './errors';
import type { EventRequest } from './events';
import { expanded, readExpand } from './expand';
import type { Faults } from './faults';
import { parseForm } from './form-body';
import { fingerprintOfRequest, type Idempotency } from './idempotency';
import { newId } from './identifiers';
import type { State } from './state';

/** What the API needs of the stand-in around it. */
export interface ApiHouse {
  key: string;
  state: State;
  faults: Faults;
  idempotency: Idempotency;
  /** Lets time take effect before a call is answered. */
  settle(): void;
  /** Does the work of a call, so that events know which call caused them. */
  during<Result>(request: EventRequest, work: () => Result): Result;
  /** Something may have changed. */
  changed(): void;
}

interface Answer {
  status: number;
  body: string;
  /** Whether the work had begun, so that the answer belongs to the idempotency key. */
  executed: boolean;
}

const text = (body: object) => JSON.stringify(body, null, 2);

function formText(request: Request): string {
  const body: unknown = request.body;
  if (typeof body !== 'string' || body === '') return '';
  if (!request.is('application/x-www-form-urlencoded')) {
    throw new ApiError(400, 'invalid_request_error', 'Send parameters as application/x-www-form-urlencoded.');
  }
  return body;
}

function pathIds(request: Request): Record<string, string> {
  return Object.fromEntries(
    Object.entries(request.params).flatMap(([name, value]) => (typeof value === 'string' ? [[name, value]] : [])),
  );
}

/** Runs a handler; a refusal is an answer too. */
function execute(house: ApiHouse, route: ApiRoute, request: Request, body: string, cause: EventRequest): Answer {
  try {
    const query = request.originalUrl.split('?')[1] ?? '';
    const { expand, ...input } = { ...parseForm(query), ...parseForm(body) };
    const paths = readExpand(expand);
    const baseUrl = `http://${request.headers.host ?? ''}`;
    const object = house.during(cause, () => route.handle({ ids: pathIds(request), input, baseUrl }));
    return { status: 200, body: text(expanded(house.state, object, paths)), executed: true };
  } catch (error) {
    if (!(error instanceof ApiError)) throw error;
    return { status: error.status, body: text(error.body()), executed: error.executed };
  }
}

/** The answer as the caller gets it, after the faults that were arranged for it. */
async function send(house: ApiHouse, request: Request, response: Response, answer: Answer): Promise<void> {
  const slow = house.faults.takeSlow(request.method, request.path);
  if (slow) await wait(slow.milliseconds);
  const lost = house.faults.takeLost(request.method, request.path);
  if (lost?.how === 'disconnect') {
    request.socket.destroy();
    return;
  }
  if (lost) throw new ApiError(500, 'api_error', 'An error occurred after the request was processed.');
  response.status(answer.status).type('json').send(answer.body);
}

async function handle(house: ApiHouse, route: ApiRoute, request: Request, response: Response): Promise<void> {
  const requestId = newId('req');
  response.set({ 'Request-Id': requestId, 'Stripe-Version': request.get('Stripe-Version') ?? '' });
  house.settle();
  assertKey(request.headers.authorization, house.key);
  const refusal = house.faults.takeRefused(request.method, request.path);
  if (refusal) {
    const limited = refusal.status === 429;
    const message = 'The request was refused before anything was done.';
    throw new ApiError(
      refusal.status,
      limited ? 'invalid_request_error' : 'api_error',
      message,
      limited ? { code: 'rate_limit' } : {},
    );
  }
  const body = formText(request);
  const key = route.method === 'post' ? request.get('Idempotency-Key') : undefined;
  const cause = { id: requestId, idempotency_key: key ?? null };
  if (key === undefined) {
    const answer = execute(house, route, request, body, cause);
    house.changed();
    return send(house, request, response, answer);
  }
  response.set('Idempotency-Key', key);
  const fingerprint = fingerprintOfRequest(request.method, request.path, body);
  const kept = house.idempotency.begin(key, fingerprint);
  if (kept) {
    response.set({ 'Idempotent-Replayed': 'true', 'Original-Request': kept.requestId });
    return send(house, request, response, { ...kept, executed: true });
  }
  try {
    const answer = execute(house, route, request, body, cause);
    if (answer.executed) {
      house.idempotency.keep({ id: key, fingerprint, status: answer.status, body: answer.body, requestId });
    }
    house.changed();
    await send(house, request, response, answer);
  } finally {
    house.idempotency.release(key);
  }
}

const asErrorAnswer: ErrorRequestHandler = (error: unknown, _request, response, _next) => {
  if (error instanceof ApiError) {
    // A caller that retries by itself would hide the fault that was arranged.
    if (error.status >= 500) response.set('Stripe-Should-Retry', 'false');
    response.status(error.status).type('json').send(text(error.body()));
    return;
  }
  const status = error instanceof Error && 'status' in error && typeof error.status === 'number' ? error.status : 500;
  if (status >= 500) console.error(error);
  const type = status >= 500 ? 'api_error' : 'invalid_request_error';
  const message = status >= 500 ? 'The stand-in failed.' : 'The request could not be read.';
  response
    .status(status)
    .type('json')
    .send(text(new ApiError(status, type, message).body()));
};

/** The processor's API under `/v1`: key, idempotency, form, work, faults, answer. */
export function apiRouter(house: ApiHouse, routes: ApiRoute[]): Router {
  const router = Router();
  router.use('/v1', express.text({ type: () => true, limit: '1mb' }));
  for (const route of routes) {
    router[route.method](route.path, (request, response) => handle(house, route, request, response));
  }
  router.use('/v1', (request) => {
    const url = `${request.method}: ${request.originalUrl.split('?')[0] ?? ''}`;
    throw new ApiError(404, 'invalid_request_error', `Unrecognized request URL (${url}).`);
  });
  router.use('/v1', asErrorAnswer);
  return router;
}
