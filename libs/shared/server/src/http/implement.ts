import type { Answer, AnyEndpoint, CheckedInput } from '@seamwright/shared/contracts';
import type { Tx } from '../database/in-transaction';
import type { RequestContext } from './request-context';

export interface FileAnswer {
  readonly fileName: string;
  readonly bytes: Buffer;
}

export type Answered<E extends AnyEndpoint> = E extends { file: string } ? FileAnswer : Answer<E>;

/** Reads or edits: opens its own transactions through use cases. */
export type Handler<E extends AnyEndpoint> = (
  context: RequestContext,
  input: CheckedInput<E>,
) => Promise<Answer<E> | FileAnswer>;

/**
 * Creates or charges. `make` runs once per Idempotency-Key, in the transaction that stores the key, and gives the id of
 * what it made; `afterCommit` may call outside services; `present` shows the resource as it is now, also on a repeat.
 */
export interface Maker<E extends AnyEndpoint> {
  make(tx: Tx, context: RequestContext, input: CheckedInput<E>): Promise<string>;
  afterCommit?(context: RequestContext, id: string, input: CheckedInput<E>): Promise<void>;
  present(tx: Tx, context: RequestContext, id: string): Promise<Answer<E>>;
}

export interface Implementation {
  readonly endpoint: AnyEndpoint;
  readonly handler: Handler<AnyEndpoint> | null;
  readonly maker: Maker<AnyEndpoint> | null;
}

/** Joins a declaration and the function that does it. */
export function implement<E extends AnyEndpoint>(endpoint: E, handler: Handler<E>): Implementation {
  if (endpoint.idempotent) throw new Error(`${endpoint.id} is idempotent: use implementOnce`);
  return { endpoint, handler: handler as unknown as Handler<AnyEndpoint>, maker: null };
}

/** Joins a declaration that needs an Idempotency-Key and the deed that is done once per key. */
export function implementOnce<E extends AnyEndpoint>(endpoint: E, maker: Maker<E>): Implementation {
  if (!endpoint.idempotent) throw new Error(`${endpoint.id} is not declared idempotent`);
  return { endpoint, handler: null, maker: maker as unknown as Maker<AnyEndpoint> };
}
