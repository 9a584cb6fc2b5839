import { sql } from 'kysely';
import { system } from '../database/caller';
import { inTransaction } from '../database/in-transaction';
import type { OutboxEvent } from './outbox';
import type { JobContext, Subscriber } from './subscriber';

/** Tells one subscriber of one event, unless that was done already. A failure is noted and thrown, so that the queue tries again. */
export async function deliver(
  context: JobContext,
  subscribers: readonly Subscriber[],
  deliveryId: number,
): Promise<void> {
  const found = await inTransaction(context.database, system('job'), (tx) =>
    tx
      .selectFrom('outboxDeliveries as d')
      .innerJoin('outboxEvents as e', 'e.id', 'd.eventId')
      .select(['d.subscriber', 'd.doneAt', 'e.id', 'e.type', 'e.subjectId', 'e.customerId', 'e.payload', 'e.at'])
      .where('d.id', '=', deliveryId)
      .executeTakeFirst(),
  );
  if (!found || found.doneAt) return;
  const subscriber = subscribers.find(({ name }) => name === found.subscriber);
  if (!subscriber) return;
  try {
    await subscriber.handle(context, { ...found, payload: found.payload as OutboxEvent['payload'] });
  } catch (error) {
    await note(context, deliveryId, { lastError: (error as Error).message.slice(0, 500) });
    throw error;
  }
  await note(context, deliveryId, { doneAt: await context.clock.now(), lastError: null });
}

async function note(
  context: JobContext,
  deliveryId: number,
  change: { doneAt?: Date; lastError: string | null },
): Promise<void> {
  await inTransaction(context.database, system('job'), (tx) =>
    tx
      .updateTable('outboxDeliveries')
      .set({ ...change, attempts: sql`attempts + 1` })
      .where('id', '=', deliveryId)
      .execute(),
  );
}
