import { inject, Injectable } from '@angular/core';
import { filter, Subject, type Observable } from 'rxjs';
import { ACCESS_TOKEN_SOURCE } from './access-token';
import { readServerSentEvents } from './server-sent-events';

/** Something changed: its type and id, to be fetched under one's own permission. `again` means anything may have. */
export interface LiveChange {
  readonly type: string;
  readonly id: string;
}

const LOCK = 'seamwright-live';
const RETRY_MS = 3_000;

/**
 * Live changes from the server. One stream per browser: the tab that holds the lock reads it and passes on what it
 * hears to the others.
 */
@Injectable({ providedIn: 'root' })
export class LiveEvents {
  readonly #tokens = inject(ACCESS_TOKEN_SOURCE, { optional: true });
  readonly #changes = new Subject<LiveChange>();
  readonly #channel = typeof BroadcastChannel === 'undefined' ? null : new BroadcastChannel(LOCK);
  #running = false;

  constructor() {
    if (this.#channel)
      this.#channel.onmessage = (message: MessageEvent<LiveChange>) => this.#changes.next(message.data);
  }

  /** Changes of the given types; also `again`, after the stream was lost and found. */
  changes(...types: readonly string[]): Observable<LiveChange> {
    this.#start();
    return this.#changes.pipe(filter((change) => change.type === 'again' || types.includes(change.type)));
  }

  #start(): void {
    if (this.#running || !this.#tokens || typeof navigator === 'undefined' || !navigator.locks) return;
    this.#running = true;
    void navigator.locks.request(LOCK, () => this.#readForever());
  }

  async #readForever(): Promise<never> {
    for (let first = true; ; first = false) {
      const token = this.#tokens?.current();
      if (token) await this.#read(token, !first).catch(() => undefined);
      await new Promise((resolve) => setTimeout(resolve, RETRY_MS));
    }
  }

  async #read(token: string, again: boolean): Promise<void> {
    const response = await fetch('/api/v1/live', { headers: { authorization: `Bearer ${token}` } });
    if (!response.ok || !response.body) return;
    if (again) this.#tell({ type: 'again', id: '' });
    for await (const event of readServerSentEvents(response.body)) {
      if (event.name === 'changed') this.#tell(JSON.parse(event.data) as LiveChange);
      if (event.name === 'again') this.#tell({ type: 'again', id: '' });
    }
  }

  #tell(change: LiveChange): void {
    this.#changes.next(change);
    this.#channel?.postMessage(change);
  }
}
