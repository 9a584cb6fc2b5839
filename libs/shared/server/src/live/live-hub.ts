import { Client } from 'pg';
import type { Request, Response } from 'express';
import type { Caller } from '../database/caller';
import type { Log } from '../log';

export interface LiveNotice {
  readonly type: string;
  readonly subjectId: string;
  readonly customerId: string | null;
}

const HEARTBEAT_MS = 20_000;
const RECONNECT_MS = 1_000;

/** Whether a caller may be told that something of this customer changed. They then fetch it under their own permission. */
export function mayHear(caller: Caller, notice: LiveNotice): boolean {
  switch (caller.kind) {
    case 'user':
      return notice.customerId === caller.customerId;
    case 'staff':
      return caller.customers === '*' || notice.customerId === null || caller.customers.includes(notice.customerId);
    default:
      return false;
  }
}

/** One dedicated listening connection per process, spread to the browsers that hold a stream. */
export class LiveHub {
  readonly #listeners = new Set<{ caller: Caller; response: Response }>();
  #client: Client | null = null;
  #closed = false;

  constructor(
    private readonly url: string,
    private readonly log: Log,
  ) {}

  async start(): Promise<void> {
    const client = new Client({ connectionString: this.url });
    client.on('notification', ({ payload }) => this.#spread(payload ?? '[]'));
    client.on('error', (error) => this.log.warn({ err: error }, 'the live connection broke'));
    await client.connect();
    await client.query('listen live');
    // Only a connection that stood is missed: one that never came about is tried again by whoever wanted it.
    client.once('end', () => this.#again());
    this.#client = client;
    // Whatever was missed meanwhile: browsers fetch anew.
    this.#listeners.forEach(({ response }) => response.write('event: again\ndata: {}\n\n'));
  }

  /** Holds the answer open as a stream of server-sent events. */
  attach(caller: Caller, request: Request, response: Response): void {
    response.writeHead(200, {
      'content-type': 'text/event-stream',
      'cache-control': 'no-store, no-transform',
      'x-accel-buffering': 'no',
    });
    response.write('event: ready\ndata: {}\n\n');
    const listener = { caller, response };
    this.#listeners.add(listener);
    const heartbeat = setInterval(() => response.write(': still here\n\n'), HEARTBEAT_MS);
    request.on('close', () => {
      clearInterval(heartbeat);
      this.#listeners.delete(listener);
    });
  }

  async close(): Promise<void> {
    this.#closed = true;
    this.#listeners.forEach(({ response }) => response.end());
    await this.#client?.end();
  }

  #spread(payload: string): void {
    const notices = (JSON.parse(payload) as [string, string, string | null][]).map(
      ([type, subjectId, customerId]): LiveNotice => ({ type, subjectId, customerId }),
    );
    for (const { caller, response } of this.#listeners) {
      for (const notice of notices.filter((each) => mayHear(caller, each))) {
        response.write(`event: changed\ndata: ${JSON.stringify({ type: notice.type, id: notice.subjectId })}\n\n`);
      }
    }
  }

  #again(): void {
    this.#client = null;
    if (this.#closed) return;
    setTimeout(() => {
      if (!this.#closed) this.start().catch(() => this.#again());
    }, RECONNECT_MS);
  }
}
