import { sql } from 'kysely';
import { system } from '../database/caller';
import { inTransaction, type Tx } from '../database/in-transaction';
import type { JobContext, Subscriber } from './subscriber';

const BATCH = 100;
/** PostgreSQL takes at most 8000 bytes in one notification. */
const IDS_PER_NOTICE = 40;

/** Hands the ids of new deliveries to the queue, inside the dispatcher's transaction. */
export type Enqueue = (tx: Tx, deliveryIds: readonly number[]) => Promise<void>;

/**
 * Takes a batch of events that nobody was told of: makes one delivery row per subscriber, queues them, and notifies the
 * live listeners with ids only. The one place that notifies (it takes a lock at commit). Gives the number of events.
 */
export async function dispatchOnce(
  context: JobContext,
  subscribers: readonly Subscriber[],
  enqueue: Enqueue,
): Promise<number> {
  const now = await context.clock.now();
  return inTransaction(context.database, system('job'), async (tx) => {
    const events = await tx
      .selectFrom('outboxEvents')
      .select(['id', 'type', 'subjectId', 'customerId'])
      .where('dispatchedAt', 'is', null)
      .orderBy('id')
      .limit(BATCH)
      .forUpdate()
      .skipLocked()
      .execute();
    if (events.length === 0) return 0;
    const deliveries = events.flatMap((event) =>
      subscribers
        .filter((subscriber) => subscriber.events.includes(event.type))
        .map((subscriber) => ({ eventId: event.id, subscriber: subscriber.name, dueAt: now })),
    );
    if (deliveries.length > 0) {
      const rows = await tx
        .insertInto('outboxDeliveries')
        .values(deliveries)
        .onConflict((conflict) => conflict.doNothing())
        .returning('id')
        .execute();
      await enqueue(
        tx,
        rows.map((row) => row.id),
      );
    }
    for (let at = 0; at < events.length; at += IDS_PER_NOTICE) {
      const notices = events
        .slice(at, at + IDS_PER_NOTICE)
        .map(({ type, subjectId, customerId }) => [type, subjectId, customerId]);
      await sql`select pg_notify('live', ${JSON.stringify(notices)})`.execute(tx);
    }
    await tx
      .updateTable('outboxEvents')
      .set({ dispatchedAt: now })
      .where(
        'id',
        'in',
        events.map((event) => event.id),
      )
      .execute();
    return events.length;
  });
}
