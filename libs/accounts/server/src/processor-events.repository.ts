import type { Tx } from '@seamwright/shared/server';
import type { ProcessorEvent } from './processor';

/** Keeps an event; false when it was kept before. */
export async function keepEvent(tx: Tx, now: Date, event: ProcessorEvent): Promise<boolean> {
  const { id, type, objectId, payload } = event;
  const kept = await tx
    .insertInto('processorEvents')
    .values({ id, type, objectId, payload: JSON.stringify(payload), receivedAt: now })
    .onConflict((conflict) => conflict.column('id').doNothing())
    .executeTakeFirst();
  return kept.numInsertedOrUpdatedRows === 1n;
}

export interface KeptEvent extends ProcessorEvent {
  readonly appliedAt: Date | null;
}

export async function eventById(tx: Tx, id: string): Promise<KeptEvent | undefined> {
  const row = await tx
    .selectFrom('processorEvents')
    .select(['id', 'type', 'objectId', 'payload', 'appliedAt'])
    .where('id', '=', id)
    .executeTakeFirst();
  return row && { ...row, payload: row.payload as ProcessorEvent['payload'] };
}

export async function markApplied(tx: Tx, now: Date, id: string): Promise<void> {
  await tx.updateTable('processorEvents').set({ appliedAt: now }).where('id', '=', id).execute();
}
