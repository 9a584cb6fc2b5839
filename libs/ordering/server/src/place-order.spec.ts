import { cancelOrder, getOrder, listOrders, placeOrder, type NewOrderWire } from '@seamwright/ordering/contracts';
import { openOrderingHouse, type OrderingHouse } from '@seamwright/ordering/server/testing';
import { withdrawSpecification } from '@seamwright/catalogue/server';
import { inTransaction, system } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
afterAll(() => house.close());

const WEDNESDAY = '2026-12-02';
const THURSDAY = '2026-12-03';
const noon = new Date('2026-12-01T12:00:00Z');

beforeEach(() => {
  house.clock.set(noon);
  house.closedDays.clear();
});

const order = (stated: Partial<NewOrderWire> = {}): NewOrderWire => ({
  siteId: house.heron.siteId,
  deliveryDay: WEDNESDAY,
  settlement: 'account',
  lines: [{ code: 'BF-901', quantity: { unit: 'piece', count: 10 } }],
  ...stated,
});
const place = (body: NewOrderWire, idempotencyKey: string = newId(), caller = house.heron.buyer) =>
  house.call(caller, placeOrder, { body, idempotencyKey });
const countOrders = async (): Promise<number> =>
  (await house.call(house.admin, listOrders, { query: { limit: 200 } })).body.items.length;

describe('placing an order', () => {
  it('fixes version, weights and price on each line, by the piece, the case and the kg', async () => {
    const { status, body } = await place(
      order({
        customerReference: 'PO 77',
        lines: [
          { code: 'BF-901', quantity: { unit: 'piece', count: 10 } },
          { code: 'bf-901', chosen: { trim: '3' }, quantity: { unit: 'case', count: 2 }, whenShort: 'ask-me' },
          {
            specificationId: house.shoulder.specificationId,
            quantity: { unit: 'kg', grams: 10_000, notLess: true },
            note: 'tie twice',
          },
        ],
      }),
    );
    expect(status).toBe(201);
    expect(body).toMatchObject({
      stage: 'confirmed',
      source: 'storefront',
      customerReference: 'PO 77',
      mayCancel: true,
    });
    expect(body.lines.map((line) => [line.pieces, line.minGrams, line.estimateGrams, line.maxGrams])).toEqual([
      [10, 2660, 2800, 2940],
      [24, 6384, 6720, 7056],
      [6, 9000, 10_800, 12_600],
    ]);
    // 10 pieces: 2.660, 2.800, 2.940 kg at £24.00. 2 cases: 6.384, 6.720, 7.056 kg at £25.00. 6 shoulders at £13.50.
    expect(body.lines.map((line) => line.amounts)).toEqual([
      { minMinor: 6384, estimateMinor: 6720, maxMinor: 7056 },
      { minMinor: 15_960, estimateMinor: 16_800, maxMinor: 17_640 },
      { minMinor: 12_150, estimateMinor: 14_580, maxMinor: 17_010 },
    ]);
    expect(body.lines[1]).toMatchObject({
      chosen: { trim: '3', ageing: 'fresh' },
      priceMinor: 2500,
      whenShort: 'ask-me',
    });
    expect(body.lines[1]?.priceWhy.parts.map((part) => part.minor)).toEqual([2400, 100]);
    // Lines at most £70.56 + £176.40 + £170.10, delivery £6.50, food is zero-rated.
    expect(body.totals.max).toEqual({ netMinor: 42_356, taxMinor: 0, totalMinor: 42_356 });
    expect(body.history.map(({ what }) => what)).toEqual(['placed', 'confirmed']);
  });

  it('keeps the price that was placed when the list changes afterwards', async () => {
    const { body } = await place(order());
    await inTransaction(house.database, system('seed'), (tx) =>
      tx
        .updateTable('priceLines')
        .set({ priceMinor: 9900 })
        .where('specificationId', '=', house.steak.specificationId)
        .execute(),
    );
    const again = await house.call(house.heron.buyer, getOrder, { params: { orderId: body.id } });
    const next = await place(order());
    await inTransaction(house.database, system('seed'), (tx) =>
      tx
        .updateTable('priceLines')
        .set({ priceMinor: 2400 })
        .where('specificationId', '=', house.steak.specificationId)
        .execute(),
    );
    expect(again.body.lines[0]?.priceMinor).toBe(2400);
    expect(next.body.lines[0]?.priceMinor).toBe(9900);
  });

  it('places once for the same key, also when both come at once, and refuses the key for another order', async () => {
    const before = await countOrders();
    const key = newId();
    const [one, other] = await Promise.all([place(order(), key), place(order(), key)]);
    expect([one.status, other.status]).toEqual([201, 201]);
    expect(other.body.id).toBe(one.body.id);
    expect((await place(order(), key)).body.id).toBe(one.body.id);
    expect(await countOrders()).toBe(before + 1);
    const reused = await place(order({ note: 'another' }), key);
    expect([reused.status, reused.problem.code]).toEqual([422, 'key-reused']);
  });

  it('holds the card for the upper bound and is confirmed by mail once it is held', async () => {
    const cardId = newId();
    house.cards.cards.set(cardId, { customerId: house.heron.id, answer: 'pre-authorised' });
    const { body } = await place(order({ settlement: 'card', cardId }));
    expect(body).toMatchObject({
      stage: 'confirmed',
      waitingFor: [],
      payment: { state: 'pre-authorised', holdMinor: 7056 + 650, capturedMinor: 0 },
    });
    await house.drain();
    const mails = await inTransaction(house.database, system('job'), (tx) =>
      tx.selectFrom('mails').selectAll().where('dedupeKey', 'like', `order-confirmation:${body.id}:%`).execute(),
    );
    expect(mails).toHaveLength(1);
    expect(mails[0]?.subject).toBe(`Order ${body.number} is confirmed for Wednesday 2 December 2026`);
    for (const words of [
      'Hello Buyer of The Heron Rooms',
      'BF-901',
      '2.660',
      '2.940',
      '£67.20',
      '£70.34',
      '£77.06 is held',
    ])
      expect(mails[0]?.bodyText).toContain(words);
  });

  it.each([
    ['declined', 'declined'],
    ['lost', 'started'],
  ] as const)('keeps the order waiting for payment when the hold is %s', async (answer, state) => {
    const cardId = newId();
    house.cards.cards.set(cardId, { customerId: house.heron.id, answer });
    const { status, body } = await place(order({ settlement: 'card', cardId }));
    expect(status).toBe(201);
    expect(body).toMatchObject({ stage: 'waiting', waitingFor: ['payment'], payment: { state } });
    expect(body.history.map(({ what }) => what)).toEqual(['placed']);
  });

  it('takes a phone order from a rep for the customer named, also after cut-off while the day is open', async () => {
    house.clock.set(new Date('2026-12-01T15:00:00Z'));
    const late = await place(order());
    expect(late.problem.code).toBe('cut-off-passed');
    const { status, body } = await place(order({ customerId: house.heron.id }), newId(), house.rep);
    expect(status).toBe(201);
    expect(body.source).toBe('desk');
  });

  it('takes an order until the last millisecond before cut-off', async () => {
    house.clock.set(new Date('2026-12-01T13:59:59.999Z'));
    expect((await place(order())).status).toBe(201);
    house.clock.set(new Date('2026-12-01T14:00:00Z'));
    expect((await place(order())).problem.code).toBe('cut-off-passed');
  });
});

describe('an order that is refused', () => {
  const refused = async (body: unknown, caller = house.heron.buyer) => {
    const before = await countOrders();
    const { status, problem } = await place(body as NewOrderWire, newId(), caller);
    expect(await countOrders()).toBe(before);
    return [status, problem.code, problem.errors[0]?.pointer];
  };
  const line = (stated: object) =>
    order({ lines: [{ code: 'BF-901', quantity: { unit: 'piece', count: 1 }, ...stated }] });

  it('is for a day that is past, closed, without a van, or too far', async () => {
    expect(await refused(order({ deliveryDay: '2026-11-30' }))).toEqual([422, 'day-past', '/deliveryDay']);
    expect(await refused(order({ deliveryDay: '2026-12-05' }))).toEqual([422, 'no-delivery-that-day', '/deliveryDay']);
    expect(await refused(order({ deliveryDay: '2027-12-01' }))).toEqual([422, 'day-too-far', '/deliveryDay']);
    house.closedDays.add(WEDNESDAY);
    expect(await refused(order())).toEqual([422, 'day-closed', '/deliveryDay']);
    await inTransaction(house.database, house.admin, (tx) =>
      tx.insertInto('plantClosures').values({ day: '2026-12-25', reason: 'Christmas' }).execute(),
    );
    expect(await refused(order({ deliveryDay: '2026-12-25' }))).toEqual([422, 'plant-closed', '/deliveryDay']);
  });

  it('asks for what is withdrawn, unknown, not to be chosen, or without a price', async () => {
    expect(await refused(line({ code: 'XX-000' }))).toEqual([422, 'specification-not-offered', '/lines/0/code']);
    expect(await refused(line({ chosen: { trim: '99' } }))).toEqual([
      422,
      'choice-value-unknown',
      '/lines/0/chosen/trim',
    ]);
    expect(await refused(line({ code: 'BF-999' }))).toEqual([422, 'price-on-request', '/lines/0/code']);
    expect(await refused(line({ chosen: { ageing: 'hung' } }))).toEqual([422, 'lead-days-short', '/lines/0/chosen']);
    expect((await place({ ...line({ chosen: { ageing: 'hung' } }), deliveryDay: '2026-12-07' })).status).toBe(201);
  });

  it('asks for a quantity that is negative, broken or absurd', async () => {
    const many = (quantity: unknown) => line({ quantity });
    expect(await refused(many({ unit: 'piece', count: -1 }))).toEqual([422, 'invalid', '/lines/0/quantity/count']);
    expect(await refused(many({ unit: 'piece', count: 1.5 }))).toEqual([422, 'invalid', '/lines/0/quantity/count']);
    expect(await refused(many({ unit: 'kg', grams: 1e12 }))).toEqual([422, 'invalid', '/lines/0/quantity/grams']);
    expect(await refused(many({ unit: 'case', count: 99_999 }))).toEqual([422, 'line-too-heavy', '/lines/0/quantity']);
    expect(await refused(order({ lines: [] }))).toEqual([422, 'invalid', '/lines']);
    const lines = Array.from({ length: 301 }, () => ({
      code: 'BF-901',
      quantity: { unit: 'piece' as const, count: 1 },
    }));
    expect(await refused(order({ lines }))).toEqual([422, 'invalid', '/lines']);
    expect(await refused({ ...order(), priceMinor: 1 })).toEqual([422, 'invalid', '/priceMinor']);
  });

  it('holds control characters in what was typed', async () => {
    expect(await refused(order({ note: 'ring\u0000first' }))).toEqual([422, 'invalid', '/note']);
    expect(await refused(order({ customerReference: 'PO\u001b77' }))).toEqual([422, 'invalid', '/customerReference']);
    const lines = [{ code: 'BF\u0000901', quantity: { unit: 'piece' as const, count: 1 } }];
    expect(await refused(order({ lines }))).toEqual([422, 'invalid', '/lines/0/code']);
    expect((await place(order({ note: 'back door\nring first' }))).body.note).toBe('back door\nring first');
  });

  it('names another customer, another site, or another card', async () => {
    expect(await refused(order({ siteId: house.quayside.siteId }))).toEqual([404, 'not-found', undefined]);
    expect(await refused(order({ customerId: house.quayside.id }))).toEqual([404, 'not-found', undefined]);
    expect(await refused(order(), house.heron.annexeBuyer)).toEqual([404, 'not-found', undefined]);
    const cardId = newId();
    house.cards.cards.set(cardId, { customerId: house.quayside.id, answer: 'pre-authorised' });
    expect(await refused(order({ settlement: 'card', cardId }))).toEqual([404, 'not-found', undefined]);
    expect(await refused(order({ settlement: 'card' }))).toEqual([422, 'card-missing', '/cardId']);
    expect(await refused(order({ cardId }))).toEqual([422, 'card-not-wanted', '/cardId']);
    expect(await refused(order(), house.rep)).toEqual([422, 'customer-missing', '/customerId']);
  });

  it('would come to more than the buyer was shown', async () => {
    expect(await refused(order({ agreedMaxMinor: 7705 }))).toEqual([409, 'price-moved', undefined]);
    expect((await place(order({ agreedMaxMinor: 7706 }))).status).toBe(201);
  });

  it('asks for what was withdrawn since it was put in the basket', async () => {
    await inTransaction(house.database, system('seed'), (tx) =>
      withdrawSpecification(tx, { now: noon, code: 'LM-204', reason: 'no more lamb', rowVersion: 1 }),
    );
    const lines = [{ specificationId: house.shoulder.specificationId, quantity: { unit: 'piece' as const, count: 1 } }];
    expect(await refused(order({ lines }))).toEqual([422, 'specification-not-offered', '/lines/0/specificationId']);
  });

  it('names every fault of its lines at once', async () => {
    const { problem } = await place(
      order({
        lines: [
          { code: 'XX-000', quantity: { unit: 'piece', count: 1 } },
          { code: 'BF-901', quantity: { unit: 'piece', count: 1 } },
          { code: 'BF-999', quantity: { unit: 'piece', count: 1 } },
        ],
      }),
    );
    expect(problem.errors.map(({ pointer }) => pointer)).toEqual(['/lines/0/code', '/lines/2/code']);
  });
});

describe('who sees an order', () => {
  it('is its own customer, and its own sites for a buyer who is kept to some', async () => {
    const { body } = await place(order());
    const params = { orderId: body.id };
    expect((await house.call(house.quayside.buyer, getOrder, { params })).status).toBe(404);
    expect((await house.call(house.heron.annexeBuyer, getOrder, { params })).status).toBe(404);
    const lines = await inTransaction(house.database, house.heron.annexeBuyer, (tx) =>
      tx.selectFrom('orderLines').select('id').execute(),
    );
    expect(lines).toEqual([]);
    const own = await place(order({ siteId: house.heron.annexeId }), newId(), house.heron.annexeBuyer);
    expect(own.status).toBe(201);
    const list = await house.call(house.heron.annexeBuyer, listOrders, { query: {} });
    expect(list.body.items.map(({ id }) => id)).toEqual([own.body.id]);
  });

  it('pages from the newest, filtered by day and state', async () => {
    house.clock.set(new Date('2026-12-01T12:30:00Z'));
    const later = await place(order({ deliveryDay: THURSDAY }));
    house.clock.set(new Date('2026-12-01T12:31:00Z'));
    const last = await place(order({ deliveryDay: THURSDAY }));
    const query = { deliveryDay: THURSDAY, state: 'confirmed' as const, limit: 1 };
    const first = await house.call(house.rep, listOrders, { query });
    expect(first.body.items.map(({ id }) => id)).toEqual([last.body.id]);
    const second = await house.call(house.rep, listOrders, {
      query: { ...query, cursor: first.body.nextCursor ?? '' },
    });
    expect(second.body.items.map(({ id }) => id)).toEqual([later.body.id]);
    expect(second.body.nextCursor).toBeNull();
    const bad = await house.call(house.rep, listOrders, {
      query: { cursor: Buffer.from('["x","y"]').toString('base64url') },
    });
    expect([bad.status, bad.problem.code]).toEqual([422, 'invalid']);
  });
});

describe('cancelling', () => {
  const cancel = (caller: typeof house.rep, order: { id: string; rowVersion: number }, reason = '') =>
    house.call(caller, cancelOrder, { params: { orderId: order.id }, ifMatch: order.rowVersion, body: { reason } });

  it('is the buyer’s until cut-off, and guarded', async () => {
    const { body } = await place(order());
    expect((await cancel(house.heron.buyer, { ...body, rowVersion: 9 })).status).toBe(412);
    expect((await cancel(house.quayside.buyer, body)).status).toBe(404);
    const cancelled = await cancel(house.heron.buyer, body);
    expect(cancelled.body).toMatchObject({ stage: 'cancelled', mayCancel: false });
    expect((await cancel(house.heron.buyer, cancelled.body)).problem.code).toBe('order-settled');
    const late = await place(order());
    house.clock.set(new Date('2026-12-01T14:00:00Z'));
    expect((await cancel(house.heron.buyer, late.body)).problem.code).toBe('cut-off-passed-for-change');
    expect((await cancel(house.rep, late.body)).problem.code).toBe('reason-missing');
    expect((await cancel(house.rep, late.body, 'van broke down')).body.cancelledBecause).toBe('van broke down');
  });
});
