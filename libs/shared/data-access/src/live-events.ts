import { DOCUMENT, inject, Injectable, type OnDestroy } from '@angular/core';
import { filter, Subject, type Observable } from 'rxjs';
import { ACCESS_TOKEN_SOURCE } from './access-token';
import { readServerSentEvents } from './server-sent-events';

/** Something changed: its type and id, to be fetched under one's own permission. `again` means anything may have. */
export interface LiveChange {
  readonly type: string;
  readonly id: string;
}

const AGAIN: LiveChange = { type: 'again', id: '' };
const RETRY_MS = 3_000;

/**
 * Live changes from the server. One stream per browser and application: the tab that holds the lock reads it and passes
 * on what it hears to the others.
 */
@Injectable({ providedIn: 'root' })
export class LiveEvents implements OnDestroy {
  readonly #tokens = inject(ACCESS_TOKEN_SOURCE, { optional: true });
  // Both applications may lie on one origin, and who is signed in to one hears less than who is to the other.
  readonly #name = `seamwright-live ${new URL(inject(DOCUMENT).baseURI).pathname}`;
  readonly #changes = new Subject<LiveChange>();
  readonly #channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(this.#name);
  readonly #ended = new AbortController();
  #running = false;

  constructor() {
    if (this.#channel)
      this.#channel.onmessage = (message: MessageEvent<LiveChange>) => this.#changes.next(message.data);
  }

  ngOnDestroy(): void {
    this.#ended.abort();
    this.#channel?.close();
  }

  /** Changes of the given types; also `again`, after the stream was lost and found. */
  changes(...types: readonly string[]): Observable<LiveChange> {
    this.#start();
    return this.#changes.pipe(filter((change) => change.type === 'again' || types.includes(change.type)));
  }

  #start(): void {
    if (this.#running || !this.#tokens || typeof navigator === 'undefined' || !navigator.locks) return;
    this.#running = true;
    const { signal } = this.#ended;
    // Refused only when it is given up while another tab reads.
    navigator.locks.request(this.#name, { signal }, () => this.#readOn(signal)).catch(() => undefined);
  }

  async #readOn(signal: AbortSignal): Promise<void> {
    for (let again = false; !signal.aborted;) {
      const token = this.#tokens?.current();
      if (token) {
        await this.#read(token, again, signal).catch(() => undefined);
        again = true;
      }
      await rest(RETRY_MS, signal);
    }
  }

  /** Reads a stream to its end. Whatever came between two streams was missed. */
  async #read(token: string, again: boolean, signal: AbortSignal): Promise<void> {
    const response = await fetch('/api/v1/live', { headers: { authorization: `Bearer ${token}` }, signal });
    if (!response.ok || !response.body) return;
    if (again) this.#tell(AGAIN);
    for await (const event of readServerSentEvents(response.body)) {
      if (event.name === 'changed') this.#tell(JSON.parse(event.data) as LiveChange);
      if (event.name === 'again') this.#tell(AGAIN);
    }
  }

  #tell(change: LiveChange): void {
    this.#changes.next(change);
    this.#channel?.postMessage(change);
  }
}

const rest = (ms: number, signal: AbortSignal): Promise<void> =>
  new Promise((resolve) => {
    const done = () => {
      clearTimeout(timer);
      signal.removeEventListener('abort', done);
      resolve();
    };
    const timer = setTimeout(done, ms);
    signal.addEventListener('abort', done);
    if (signal.aborted) done();
  });
