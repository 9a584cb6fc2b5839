import type { Tx } from '../database/in-transaction';

/** Something that happened. Written in the transaction that made it so: what is committed will be told. */
export interface NewEvent {
  /** `order-placed`: a noun and what became of it. */
  readonly type: string;
  readonly subjectId: string;
  readonly customerId: string | null;
  readonly payload?: Readonly<Record<string, unknown>>;
}

export interface OutboxEvent {
  readonly id: number;
  readonly type: string;
  readonly subjectId: string;
  readonly customerId: string | null;
  readonly payload: Readonly<Record<string, unknown>>;
  readonly at: Date;
}

export async function emit(tx: Tx, now: Date, ...events: readonly NewEvent[]): Promise<void> {
  if (events.length === 0) return;
  await tx
    .insertInto('outboxEvents')
    .values(
      events.map(({ type, subjectId, customerId, payload }) => ({
        type,
        subjectId,
        customerId,
        payload: JSON.stringify(payload ?? {}),
        at: now,
      })),
    )
    .execute();
}
