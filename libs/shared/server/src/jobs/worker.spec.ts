import { newId } from '@seamwright/shared/util';
import { createTestDatabase, type TestDatabase } from '@seamwright/database/testing';
import { SetClock } from '../clock';
import { system } from '../database/caller';
import { openDatabase, type Database } from '../database/database';
import { inTransaction } from '../database/in-transaction';
import { createLog } from '../log';
import { emit } from './outbox';
import { startWorker } from './worker';

/** A promise with its key on the outside. */
function promised<T>(): { promise: Promise<T>; resolve: (value: T) => void } {
  let resolve: (value: T) => void = () => undefined;
  const promise = new Promise<T>((settle) => (resolve = settle));
  return { promise, resolve };
}

const NOON = new Date('2026-12-01T12:00:00Z');

describe('the worker', () => {
  let urls: TestDatabase;
  let database: Database;
  beforeAll(async () => {
    urls = await createTestDatabase();
    database = openDatabase(urls.workerUrl);
  });
  afterAll(async () => {
    await database.close();
    await urls.drop();
  });

  it('delivers through the queue under its own role, and comes round to periodic jobs', async () => {
    const subjectId = newId();
    const context = {
      database,
      clock: new SetClock(NOON),
      log: createLog('silent', 'test'),
    };
    const told = promised<string>();
    const round = promised<void>();
    const worker = await startWorker(
      context,
      urls.workerUrl,
      [{ name: 'told', events: ['order-placed'], handle: async (_context, event) => told.resolve(event.subjectId) }],
      [{ name: 'round', everySeconds: 1, run: async () => round.resolve() }],
    );
    await inTransaction(database, system('job'), (tx) =>
      emit(tx, NOON, { type: 'order-placed', subjectId, customerId: null }),
    );
    expect(await told.promise).toBe(subjectId);
    await expect(round.promise).resolves.toBeUndefined();
    await worker.stop();
  }, 20_000);
});
