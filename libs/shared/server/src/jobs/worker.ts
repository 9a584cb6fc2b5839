import { CompiledQuery } from 'kysely';
import PgBoss from 'pg-boss';
import { DELIVERIES_QUEUE, PERIODIC_QUEUE } from '@seamwright/database';
import type { Tx } from '../database/in-transaction';
import { deliver } from './deliver';
import { dispatchOnce } from './dispatcher';
import type { JobContext, PeriodicJob, Subscriber } from './subscriber';

const DISPATCH_EVERY_MS = 250;

export interface Worker {
  stop(): Promise<void>;
}

/** Runs the jobs: dispatches the outbox, delivers to subscribers through the queue, and comes round to the periodic jobs. */
export async function startWorker(
  context: JobContext,
  url: string,
  subscribers: readonly Subscriber[],
  periodic: readonly PeriodicJob[],
): Promise<Worker> {
  const boss = new PgBoss({ connectionString: url, migrate: false, schedule: false, max: 4 });
  boss.on('error', (error) => context.log.error({ err: error }, 'the queue failed'));
  await boss.start();

  const options = { retryLimit: 12, retryDelay: 2, retryBackoff: true, expireInMinutes: 5 };
  const enqueue = async (tx: Tx, ids: readonly number[]): Promise<void> => {
    const db = {
      executeSql: async (text: string, values: unknown[]) => tx.executeQuery(CompiledQuery.raw(text, values)),
    };
    for (const id of ids) await boss.send(DELIVERIES_QUEUE, { id }, { ...options, db });
  };

  await boss.work<{ id: number }>(DELIVERIES_QUEUE, { batchSize: 5, pollingIntervalSeconds: 0.5 }, async (jobs) => {
    const results = await Promise.allSettled(jobs.map((job) => deliver(context, subscribers, job.data.id)));
    const failed = results.find((result) => result.status === 'rejected');
    if (failed) {
      context.log.warn({ err: failed.reason }, 'a delivery failed and will be tried again');
      throw failed.reason;
    }
  });
  await boss.work<{ name: string }>(PERIODIC_QUEUE, { pollingIntervalSeconds: 0.5 }, async ([job]) => {
    const wanted = periodic.find(({ name }) => name === job?.data.name);
    if (wanted) await wanted.run(context);
  });

  let stopping = false;
  const dispatching = (async () => {
    while (!stopping) {
      const count = await dispatchOnce(context, subscribers, enqueue).catch((error: unknown) => {
        context.log.error({ err: error }, 'dispatching failed');
        return 0;
      });
      if (count === 0) await new Promise((resolve) => setTimeout(resolve, DISPATCH_EVERY_MS));
    }
  })();
  // One worker of all sends each round: the singleton key keeps the others' copies out.
  const timers = periodic.map(({ name, everySeconds }) =>
    setInterval(() => {
      boss
        .send(PERIODIC_QUEUE, { name }, { singletonKey: name, singletonSeconds: everySeconds })
        .catch((error: unknown) => context.log.error({ err: error }, 'a periodic job was not queued'));
    }, everySeconds * 1000),
  );

  return {
    async stop() {
      stopping = true;
      timers.forEach(clearInterval);
      await dispatching;
      await boss.stop({ graceful: true, timeout: 10_000 });
    },
  };
}
