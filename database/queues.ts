import PgBoss from 'pg-boss';
import { withClient } from './roles';

export const DELIVERIES_QUEUE = 'deliveries';
export const PERIODIC_QUEUE = 'periodic';

/** Makes the queue's own schema and our queues; the worker's role may use them, the API's may not. */
export async function ensureQueues(ownerUrl: string): Promise<void> {
  const boss = new PgBoss({ connectionString: ownerUrl, supervise: false, schedule: false, max: 1 });
  await boss.start();
  try {
    for (const name of [DELIVERIES_QUEUE, PERIODIC_QUEUE]) await boss.createQueue(name);
  } finally {
    await boss.stop({ graceful: false });
  }
  await withClient(ownerUrl, (client) =>
    client.query(`
      grant usage on schema pgboss to seamwright_worker;
      grant select, insert, update, delete on all tables in schema pgboss to seamwright_worker;
      grant execute on all functions in schema pgboss to seamwright_worker;`),
  );
}
