import { newId } from '@seamwright/shared/util';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { anonymous, system } from '../database/caller';
import { inTransaction } from '../database/in-transaction';
import { mailSubscriber, queueMail, type Mailer } from '../mail/mail';
import { drainOutbox } from './drain';
import { emit, type OutboxEvent } from './outbox';
import type { Subscriber } from './subscriber';

describe('the outbox', () => {
  let house: TestHouse;
  let heard: OutboxEvent[];
  let fail = 0;
  const listening = (name: string, ...events: string[]): Subscriber => ({
    name,
    events,
    async handle(_context, event) {
      if (fail > 0) {
        fail -= 1;
        throw new Error('the line was busy');
      }
      heard.push(event);
    },
  });
  const tell = (type: string, subjectId = newId()) =>
    inTransaction(house.database, system('job'), (tx) =>
      emit(tx, TEST_NOW, { type, subjectId, customerId: null, payload: { n: 1 } }),
    );

  beforeAll(async () => {
    house = await openTestHouse();
  });
  beforeEach(() => {
    heard = [];
    fail = 0;
  });
  afterAll(() => house.close());

  it('tells each subscriber of the events it asked for, once', async () => {
    await tell('order-placed');
    const subscribers = [
      listening('a', 'order-placed'),
      listening('b', 'order-placed', 'order-packed'),
      listening('c', 'other'),
    ];
    await drainOutbox(house.jobs, subscribers);
    await drainOutbox(house.jobs, subscribers);
    expect(heard.map(({ type, payload, at }) => [type, payload, at])).toEqual([
      ['order-placed', { n: 1 }, TEST_NOW],
      ['order-placed', { n: 1 }, TEST_NOW],
    ]);
  });

  it('tells of nothing that was rolled back', async () => {
    const failing = inTransaction(house.database, system('job'), async (tx) => {
      await emit(tx, TEST_NOW, { type: 'order-placed', subjectId: newId(), customerId: null });
      throw new Error('no');
    });
    await expect(failing).rejects.toThrow('no');
    await drainOutbox(house.jobs, [listening('a', 'order-placed')]);
    expect(heard).toEqual([]);
  });

  it('keeps what could not be told, with the reason, and tells it later', async () => {
    await tell('order-packed');
    fail = 1;
    const subscribers = [listening('later', 'order-packed')];
    await expect(drainOutbox(house.jobs, subscribers)).rejects.toThrow('the line was busy');
    const open = await inTransaction(house.database, system('job'), (tx) =>
      tx
        .selectFrom('outboxDeliveries')
        .select(['attempts', 'lastError'])
        .where('doneAt', 'is', null)
        .executeTakeFirstOrThrow(),
    );
    expect(open).toEqual({ attempts: 1, lastError: 'the line was busy' });
    await drainOutbox(house.jobs, subscribers);
    expect(heard).toHaveLength(1);
  });

  it('can be written by anyone and read by jobs only', async () => {
    await inTransaction(house.database, anonymous, (tx) =>
      emit(tx, TEST_NOW, { type: 'seen', subjectId: newId(), customerId: null }),
    );
    const seen = await inTransaction(house.database, anonymous, (tx) =>
      tx.selectFrom('outboxEvents').select('id').execute(),
    );
    expect(seen).toEqual([]);
  });

  describe('mail', () => {
    const sent: { to: string; attachment: unknown }[] = [];
    const mailer: Mailer = {
      send: async ({ to, attachment }) => void sent.push({ to, attachment }),
      close: () => undefined,
    };

    it('is sent once after the commit, however often it was queued', async () => {
      const queue = () =>
        inTransaction(house.database, system('job'), (tx) =>
          queueMail(tx, TEST_NOW, {
            to: 'chef@kitchen.example',
            subject: 'Order 1001',
            text: 'Thank you',
            customerId: null,
            dedupeKey: 'order:1',
          }),
        );
      await queue();
      await queue();
      await drainOutbox(house.jobs, [mailSubscriber(mailer)]);
      await drainOutbox(house.jobs, [mailSubscriber(mailer)]);
      expect(sent).toEqual([{ to: 'chef@kitchen.example', attachment: null }]);
    });
  });
});
