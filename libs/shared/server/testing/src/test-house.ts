import cookieParser from 'cookie-parser';
import express, { type Express, type Request } from 'express';
import request from 'supertest';
import type { Answer, AnyEndpoint, CallInput, Problem } from '@seamwright/shared/contracts';
import {
  apiRouter,
  createLog,
  drainOutbox,
  openDatabase,
  problemHandler,
  requestLog,
  SetClock,
  type Caller,
  type Database,
  type Implementation,
  type JobContext,
  type Subscriber,
} from '../../src/index';
import { newId } from '@seamwright/shared/util';
import { createTestDatabase } from '@seamwright/database/testing';

export interface Called<E extends AnyEndpoint> {
  readonly status: number;
  readonly body: Answer<E>;
  readonly problem: Problem;
  readonly bytes: Buffer;
  readonly headers: Readonly<Record<string, string>>;
}

/** What a test sends: a file is its bytes and name. */
export type TestInput<E extends AnyEndpoint> = Omit<CallInput<E>, 'file'> & { file?: { bytes: Buffer; name: string } };

export interface TestHouse {
  readonly app: Express;
  /** The API's role. */
  readonly database: Database;
  /** What jobs are given; its database is the worker's role. */
  readonly jobs: JobContext;
  readonly clock: SetClock;
  /** Calls an endpoint over HTTP as the given caller. */
  call<E extends AnyEndpoint>(caller: Caller, endpoint: E, input: TestInput<E>): Promise<Called<E>>;
  /** Tells the subscribers of everything that is waiting. */
  drain(): Promise<void>;
  close(): Promise<void>;
}

/** Noon on a Tuesday: tests move it as they need. */
export const TEST_NOW = new Date('2026-12-01T12:00:00Z');

interface Furnishing {
  readonly implementations?: (parts: { database: Database; clock: SetClock }) => readonly Implementation[];
  readonly subscribers?: readonly Subscriber[];
}

/**
 * The API over a fresh database, for the spec file of a `server` room: real HTTP, real PostgreSQL, the caller given
 * instead of signed in. Call `close` in `afterAll`.
 */
export async function openTestHouse({ implementations, subscribers = [] }: Furnishing = {}): Promise<TestHouse> {
  const urls = await createTestDatabase();
  const database = openDatabase(urls.appUrl, { max: 4 });
  const workerDatabase = openDatabase(urls.workerUrl, { max: 2 });
  const clock = new SetClock(TEST_NOW);
  const log = createLog('silent', 'test');
  const jobs: JobContext = { database: workerDatabase, clock, log };
  const callers = new Map<string, Caller>();
  const authenticate = async (incoming: Request): Promise<Caller | null> =>
    callers.get(incoming.get('authorization') ?? '') ?? null;

  const app = express();
  app.use(requestLog(log), cookieParser());
  app.use(
    '/api/v1',
    apiRouter(implementations?.({ database, clock }) ?? [], {
      database,
      clock,
      log,
      secureCookies: false,
      authenticate,
    }),
  );
  app.use(problemHandler(log));

  return {
    app,
    database,
    jobs,
    clock,
    async call(caller, endpoint, input) {
      const token = `Test ${JSON.stringify(caller)}`;
      callers.set(token, caller);
      const response = await send(app, endpoint, input as Sent, token);
      const { body, status, headers } = response;
      return {
        status,
        body,
        problem: readProblem(response),
        bytes: Buffer.isBuffer(body) ? body : Buffer.alloc(0),
        headers,
      };
    },
    drain: () => drainOutbox(jobs, subscribers),
    async close() {
      await Promise.all([database.close(), workerDatabase.close()]);
      await urls.drop();
    },
  };
}

interface Sent {
  params?: Record<string, unknown>;
  query?: Record<string, unknown>;
  body?: object;
  ifMatch?: number;
  idempotencyKey?: string;
  file?: { bytes: Buffer; name: string };
}

async function send(app: Express, endpoint: AnyEndpoint, input: Sent, token: string): Promise<request.Response> {
  const path = endpoint.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(input.params?.[name])));
  const method = endpoint.method.toLowerCase() as 'get' | 'post' | 'put' | 'patch' | 'delete';
  let sending = request(app)
    [method](`/api/v1${path}`)
    .set('authorization', token)
    .query(input.query ?? {});
  if (endpoint.file) sending = sending.buffer(true).parse(readBytes);
  if (endpoint.idempotent) sending = sending.set('idempotency-key', input.idempotencyKey ?? newId());
  if (input.ifMatch !== undefined) sending = sending.set('if-match', `"${input.ifMatch}"`);
  if (endpoint.upload) {
    for (const [name, value] of Object.entries(input.body ?? {})) sending = sending.field(name, String(value));
    return input.file ? sending.attach('file', input.file.bytes, input.file.name) : sending;
  }
  return input.body === undefined ? sending : sending.send(input.body);
}

function readProblem(response: request.Response): Problem {
  if (response.status < 400) return {} as Problem;
  if (Buffer.isBuffer(response.body)) return JSON.parse(response.body.toString('utf8')) as Problem;
  return (Object.keys(response.body as object).length ? response.body : JSON.parse(response.text || '{}')) as Problem;
}

function readBytes(response: request.Response, done: (error: Error | null, body: Buffer) => void): void {
  const chunks: Buffer[] = [];
  const stream = response as unknown as NodeJS.ReadableStream;
  stream.on('data', (chunk: Buffer) => chunks.push(chunk));
  stream.on('end', () => done(null, Buffer.concat(chunks)));
}
