import { createTestDatabase, type TestDatabase } from '@seamwright/database/testing';
import { TEST_NOW, watchPlans } from '@seamwright/shared/server/testing';
import { SetClock } from '../clock';
import { openDatabase, type Database } from '../database/database';
import { createLog } from '../log';
import { dispatchOnce } from './dispatcher';

let urls: TestDatabase;
let worker: Database;
beforeAll(async () => {
  urls = await createTestDatabase();
  worker = openDatabase(urls.workerUrl, { max: 2 });
  const owner = openDatabase(urls.ownerUrl, { max: 1 });
  await owner.pool.query(`select set_config('seamwright.caller', 'system', false),
    set_config('seamwright.customers', '*', false)`);
  // Years of events that everybody was told of, and three that nobody was.
  await owner.pool.query(`insert into outbox_events (type, subject_id, at, dispatched_at)
    select 'lot-changed', gen_random_uuid(), '2026-11-01', case when n <= 5000 then timestamptz '2026-11-01' end
    from generate_series(1, 5003) as n`);
  await owner.pool.query('vacuum analyze outbox_events');
  await owner.close();
});
afterAll(async () => {
  await worker.close();
  await urls.drop();
});

describe('the dispatcher', () => {
  it('finds the events that wait without reading those that don’t', async () => {
    const { database, reads } = watchPlans(worker, 'as-it-would');
    const context = { database, clock: new SetClock(TEST_NOW), log: createLog('silent', 'test') };
    expect(await dispatchOnce(context, [], async () => undefined)).toBe(3);
    expect(reads.map(({ table, index }) => [table, index])).toEqual([['outbox_events', 'outbox_events_waiting']]);
    expect(await dispatchOnce(context, [], async () => undefined)).toBe(0);
  });
});
