import type { Answer, AnyEndpoint, CallInput } from '@seamwright/shared/contracts';
import {
  drainOutbox,
  inTransaction,
  type Caller,
  type Implementation,
  type JobContext,
  type PeriodicJob,
  type RequestContext,
  type SetClock,
  type Subscriber,
} from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

interface Furnishing {
  readonly implementations: readonly Implementation[];
  readonly subscribers: readonly Subscriber[];
  readonly periodic: readonly PeriodicJob[];
  readonly jobs: JobContext;
  readonly clock: SetClock;
}

/** Plays the house's own endpoints without a network, so that the demo's history is made by the use cases. */
export class Desk {
  readonly clock: SetClock;
  readonly #furnishing: Furnishing;

  constructor(furnishing: Furnishing) {
    this.#furnishing = furnishing;
    this.clock = furnishing.clock;
  }

  /** Does what an endpoint does, as the caller, at the clock's time. What is wrong is thrown. */
  async call<E extends AnyEndpoint>(
    caller: Caller,
    endpoint: E,
    sent: Omit<CallInput<E>, 'file'> & { readonly file?: { readonly fileName: string; readonly bytes: Buffer } },
  ): Promise<Answer<E>> {
    const implementation = this.#furnishing.implementations.find((each) => each.endpoint === endpoint);
    if (!implementation) throw new Error(`Nobody answers ${endpoint.id}`);
    const { database } = this.#furnishing.jobs;
    const context = await this.#context(caller, endpoint, sent.ifMatch ?? 0, sent.file ?? null);
    const input = {
      params: endpoint.params.parse(sent.params ?? {}),
      query: endpoint.query.parse(sent.query ?? {}),
      body: endpoint.body?.parse(sent.body ?? {}),
    };
    const { handler, maker } = implementation;
    if (handler) return (await handler(context, input)) as Answer<E>;
    if (!maker) throw new Error(`${endpoint.id} has nothing to do`);
    const id = await inTransaction(database, caller, (tx) => maker.make(tx, context, input));
    await maker.afterCommit?.(context, id, input);
    return (await inTransaction(database, caller, (tx) => maker.present(tx, context, id))) as Answer<E>;
  }

  /** Lets the jobs do what waits for them. */
  async settle(): Promise<void> {
    await drainOutbox(this.#furnishing.jobs, this.#furnishing.subscribers);
  }

  /** Comes round to every periodic job once, and to what follows. */
  async comeRound(): Promise<void> {
    for (const job of this.#furnishing.periodic) await job.run(this.#furnishing.jobs);
    await this.settle();
  }

  async #context(
    caller: Caller,
    endpoint: AnyEndpoint,
    ifMatch: number,
    upload: RequestContext['upload'],
  ): Promise<RequestContext> {
    const { database, log } = this.#furnishing.jobs;
    return {
      caller,
      now: await this.clock.now(),
      requestId: newId(),
      log: log.child({ endpoint: endpoint.id }),
      database,
      ifMatch,
      upload,
      source: 'seeds',
      userAgent: 'seeds',
      origin: null,
      cookie: () => null,
      setCookie: () => undefined,
    };
  }
}
