import { json, Router, type NextFunction, type Request, type Response } from 'express';
import multer from 'multer';
import type { AnyEndpoint, CheckedInput } from '@seamwright/shared/contracts';
import { RefusalError } from '@seamwright/shared/util';
import type { Clock } from '../clock';
import { anonymous, rolesOf, type Caller } from '../database/caller';
import type { Database } from '../database/database';
import { inTransaction } from '../database/in-transaction';
import type { Log } from '../log';
import { hashRequest, isIdempotencyKey, once } from './idempotency';
import type { FileAnswer, Implementation } from './implement';
import { faultsOf, ProblemError, problemOf, sendProblem } from './problems';
import { coerceQuery } from './query-coercion';
import type { RequestContext } from './request-context';

export interface ApiDependencies {
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Log;
  readonly secureCookies: boolean;
  /** Tells who asks from the request's bearer token; null when there is none, throws `not-signed-in` for a bad one. */
  authenticate(request: Request): Promise<Caller | null>;
}

/** The id that requestLog gave the request. */
const requestIdOf = (request: Request): string => String((request as { id?: unknown }).id ?? '');

const refusal = (code: string, params = {}): RefusalError => new RefusalError({ code, params });

/** Mounts every implementation at its declared address below /api/v1. */
export function apiRouter(implementations: readonly Implementation[], dependencies: ApiDependencies): Router {
  const router = Router({ caseSensitive: true });
  for (const implementation of implementations) {
    const { endpoint } = implementation;
    const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
    router[method](
      endpoint.path,
      identified(endpoint, dependencies),
      endpoint.upload ? receiveFile(endpoint.upload.maxBytes) : json({ limit: '1mb', strict: true }),
      (request, response) => answer(implementation, dependencies, request, response),
    );
  }
  return router;
}

/** Permission comes before the body is read, so that a stranger can't make us read files. */
function identified(endpoint: AnyEndpoint, dependencies: ApiDependencies) {
  return async (request: Request, response: Response, next: NextFunction): Promise<void> => {
    const caller = (await dependencies.authenticate(request)) ?? anonymous;
    if (endpoint.access.who === 'roles') {
      if (caller.kind === 'anonymous') throw refusal('not-signed-in');
      const { roles } = endpoint.access;
      if (!rolesOf(caller).some((role) => roles.includes(role))) throw refusal('not-allowed');
    }
    response.locals['caller'] = caller;
    next();
  };
}

function receiveFile(maxBytes: number) {
  const upload = multer({
    storage: multer.memoryStorage(),
    limits: { fileSize: maxBytes, files: 1, fields: 20 },
  }).single('file');
  return (request: Request, response: Response, next: NextFunction): void => {
    upload(request, response, (error: unknown) => {
      if (error instanceof multer.MulterError) {
        const tooLarge = error.code === 'LIMIT_FILE_SIZE';
        return next(
          tooLarge ? refusal('too-large', { limit: `${Math.floor(maxBytes / 1_048_576)} MB` }) : refusal('unreadable'),
        );
      }
      if (error) return next(refusal('unreadable'));
      next(request.file ? undefined : refusal('file-missing'));
    });
  };
}

async function answer(
  { endpoint, handler, maker }: Implementation,
  dependencies: ApiDependencies,
  request: Request,
  response: Response,
): Promise<void> {
  const input = check(endpoint, request);
  const context = await contextOf(endpoint, dependencies, request, response);
  if (handler) return send(endpoint, response, await handler(context, input));
  if (!maker) throw new Error(`${endpoint.id} has nothing to do`);
  const { database } = dependencies;
  const key = request.get('idempotency-key');
  if (!key || !isIdempotencyKey(key)) throw refusal('key-missing');
  const hash = hashRequest(input, context.upload?.bytes ?? null);
  const made = await inTransaction(database, context.caller, (tx) =>
    once(tx, { caller: context.caller, endpoint: endpoint.id, key, hash, now: context.now }, () =>
      maker.make(tx, context, input),
    ),
  );
  if (maker.afterCommit && !made.repeated) await maker.afterCommit(context, made.id, input);
  const body = await inTransaction(database, context.caller, (tx) => maker.present(tx, context, made.id));
  send(endpoint, response, body);
}

/** Checks params, query and body against the declaration, gathering every fault. */
function check(endpoint: AnyEndpoint, request: Request): CheckedInput<AnyEndpoint> {
  const params = endpoint.params.safeParse(coerceQuery(endpoint.params, request.params));
  // An id of the wrong form in the address can't be anybody's.
  if (!params.success) throw refusal('not-found');
  const query = endpoint.query.safeParse(coerceQuery(endpoint.query, request.query as Record<string, unknown>));
  if (endpoint.body && !endpoint.upload && !request.is('json')) throw refusal('wrong-media-type');
  const body = endpoint.body?.safeParse(endpoint.upload ? { ...request.body } : request.body);
  const faults = [
    ...(query.success ? [] : faultsOf(query.error)),
    ...(body && !body.success ? faultsOf(body.error) : []),
  ];
  if (faults.length > 0) throw new ProblemError(422, { code: 'invalid', params: {} }, faults);
  return { params: params.data, query: query.data, body: body?.data } as CheckedInput<AnyEndpoint>;
}

async function contextOf(
  endpoint: AnyEndpoint,
  dependencies: ApiDependencies,
  request: Request,
  response: Response,
): Promise<RequestContext> {
  const requestId = requestIdOf(request);
  return {
    caller: response.locals['caller'] as Caller,
    now: await dependencies.clock.now(),
    requestId,
    log: dependencies.log.child({ requestId, endpoint: endpoint.id }),
    database: dependencies.database,
    ifMatch: endpoint.guarded ? readIfMatch(request) : 0,
    upload: request.file ? { fileName: request.file.originalname, bytes: request.file.buffer } : null,
    source: request.ip ?? '',
    userAgent: (request.get('user-agent') ?? '').slice(0, 200),
    origin: request.get('origin') ?? null,
    cookie: (name) => (request.cookies as Record<string, string> | undefined)?.[name] ?? null,
    setCookie: (name, value, { path, maxAgeSeconds }) => {
      response.cookie(name, value, {
        path,
        maxAge: value === '' ? 0 : maxAgeSeconds * 1000,
        httpOnly: true,
        sameSite: 'strict',
        secure: dependencies.secureCookies,
      });
    },
  };
}

function readIfMatch(request: Request): number {
  const match = /^(?:W\/)?"(\d{1,9})"$/.exec(request.get('if-match') ?? '');
  if (!match) throw refusal('version-missing');
  return Number(match[1]);
}

const isFile = (body: unknown): body is FileAnswer =>
  typeof body === 'object' && body !== null && 'bytes' in body && Buffer.isBuffer(body.bytes);

function send(endpoint: AnyEndpoint, response: Response, body: unknown): void {
  if (endpoint.file && isFile(body)) {
    const name = encodeURIComponent(body.fileName);
    response
      .status(endpoint.status)
      .type(endpoint.file)
      .set('content-disposition', `attachment; filename*=UTF-8''${name}`);
    response.send(body.bytes);
    return;
  }
  if (!endpoint.response) {
    response.status(endpoint.status).end();
    return;
  }
  // Strict: a field that the contract does not declare never leaves, and is a fault of ours.
  const declared = endpoint.response.parse(body) as { rowVersion?: number };
  if (typeof declared.rowVersion === 'number') response.set('etag', `"${declared.rowVersion}"`);
  response.status(endpoint.status).set('cache-control', 'no-store').json(declared);
}

/** The last handler: every error leaves as a problem document. */
export function problemHandler(log: Log) {
  return (error: unknown, request: Request, response: Response, next: NextFunction): void => {
    if (response.headersSent) return next(error);
    const problem = problemOf(asRefusal(error), request.originalUrl.split('?')[0] ?? '');
    if (problem.status >= 500) log.error({ err: error, requestId: requestIdOf(request) }, 'a request failed');
    sendProblem(response, problem);
  };
}

/** What the body parser throws, as our refusals. */
function asRefusal(error: unknown): unknown {
  const { type, status } = error as { type?: string; status?: number };
  if (type === 'entity.too.large') return refusal('too-large', { limit: '1 MB' });
  if (type === 'entity.parse.failed' || type === 'encoding.unsupported' || type === 'charset.unsupported')
    return refusal('unreadable');
  if (error instanceof URIError) return refusal('not-found');
  if (type && status === 400) return refusal('unreadable');
  return error;
}
