import { system } from '../database/caller';
import { inTransaction } from '../database/in-transaction';
import { deliver } from './deliver';
import { dispatchOnce } from './dispatcher';
import type { JobContext, Subscriber } from './subscriber';

const ROUNDS = 50;

/** Tells everybody of everything that is waiting, now and in order: tests and seeds call it instead of waiting for the queue. */
export async function drainOutbox(context: JobContext, subscribers: readonly Subscriber[]): Promise<void> {
  for (let round = 0; round < ROUNDS; round++) {
    const dispatched = await dispatchOnce(context, subscribers, async () => undefined);
    const open = await inTransaction(context.database, system('job'), (tx) =>
      tx.selectFrom('outboxDeliveries').select('id').where('doneAt', 'is', null).orderBy('id').execute(),
    );
    if (dispatched === 0 && open.length === 0) return;
    for (const { id } of open) await deliver(context, subscribers, id);
  }
  throw new Error(`Jobs keep making jobs: not drained after ${ROUNDS} rounds`);
}
