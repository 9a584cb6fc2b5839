import type { Clock } from '../clock';
import type { Database } from '../database/database';
import type { Log } from '../log';
import type { OutboxEvent } from './outbox';

/** What a job may use. It opens its own transactions as `system('job')`. */
export interface JobContext {
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Log;
}

/**
 * Reacts to events. Told at least once: a repeat must change nothing. `event` may be several types.
 * `handle` runs outside a transaction, so that it may call outside services.
 */
export interface Subscriber {
  readonly name: string;
  readonly events: readonly string[];
  handle(context: JobContext, event: OutboxEvent): Promise<void>;
}

/** Work that comes round: repairs and expiries whose due times are columns. Must do nothing when nothing is due. */
export interface PeriodicJob {
  readonly name: string;
  readonly everySeconds: number;
  run(context: JobContext): Promise<void>;
}
