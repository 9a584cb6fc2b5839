import { cancelOrder, getOrder, placeOrder, type OrderDetail } from '@seamwright/ordering/contracts';
import { openOrderingHouse, type OrderingHouse } from '@seamwright/ordering/server/testing';
import { inTransaction, system, type Tx } from '@seamwright/shared/server';
import { newId, type PlantDate } from '@seamwright/shared/util';
import { addPack } from '@seamwright/stock/server';
import { clearWaiting, markPacked, markShort, releaseOrdersOfDay, type ShortDeed } from './move-orders';
import { ordersOfDay } from './orders.repository';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
afterAll(() => house.close());

const DAY = '2026-12-02' as PlantDate;
const now = new Date('2026-12-01T15:00:00Z');
const job = <T>(work: (tx: Tx) => Promise<T>) => inTransaction(house.database, system('job'), work);
const staff = <T>(work: (tx: Tx) => Promise<T>) => inTransaction(house.database, house.rep, work);

async function place(
  card: 'pre-authorised' | 'declined' | null = null,
  deliveryDay: string = DAY,
): Promise<OrderDetail> {
  const cardId = newId();
  if (card) house.cards.cards.set(cardId, { customerId: house.heron.id, answer: card });
  const { body } = await house.call(house.heron.buyer, placeOrder, {
    body: {
      siteId: house.heron.siteId,
      deliveryDay,
      settlement: card ? 'card' : 'account',
      ...(card ? { cardId } : {}),
      lines: [{ code: 'BF-901', quantity: { unit: 'piece', count: 10 } }],
    },
  });
  return body;
}
const read = async (order: OrderDetail) =>
  (await house.call(house.heron.buyer, getOrder, { params: { orderId: order.id } })).body;
const eventsOf = async (order: OrderDetail) =>
  (
    await job((tx) =>
      tx.selectFrom('outboxEvents').select('type').where('subjectId', '=', order.id).orderBy('id').execute(),
    )
  ).map(({ type }) => type);
const short = (order: OrderDetail, stated: Partial<ShortDeed> = {}) => {
  const orderLineId = order.lines[0]?.id ?? '';
  return staff((tx) =>
    markShort(tx, { now, caller: house.rep, orderLineId, shortPieces: 2, reason: 'no stock', ...stated }),
  );
};
const pack = (order: OrderDetail, pieces: number, netGrams: number) => {
  const [line] = order.lines;
  return staff((tx) =>
    addPack(
      tx,
      { now, caller: house.rep },
      {
        customerId: order.customer.id,
        orderId: order.id,
        orderLineId: line?.id ?? '',
        versionId: line?.versionId ?? '',
        lotId: null,
        pieces,
        netGrams,
        tareGrams: 18,
        inputGrams: netGrams,
        outOfLimits: false,
        reason: null,
      },
    ),
  );
};

describe('what an order waits for', () => {
  it('is struck once; the order is confirmed and mailed once', async () => {
    const order = await place('declined');
    expect(order.stage).toBe('waiting');
    const clear = () => job((tx) => clearWaiting(tx, { now, orderId: order.id, what: 'payment' }));
    await clear();
    await clear();
    expect((await read(order)).stage).toBe('confirmed');
    expect(await eventsOf(order)).toEqual(['order-placed', 'order-confirmed']);
    await house.drain();
    await house.drain();
    const mails = await job((tx) =>
      tx.selectFrom('mails').select('id').where('dedupeKey', 'like', `order-confirmation:${order.id}:%`).execute(),
    );
    expect(mails).toHaveLength(1);
  });

  it('no longer matters once the order is cancelled', async () => {
    const order = await place('declined');
    await house.call(house.heron.buyer, cancelOrder, {
      params: { orderId: order.id },
      ifMatch: order.rowVersion,
      body: {},
    });
    await job((tx) => clearWaiting(tx, { now, orderId: order.id, what: 'payment' }));
    expect((await read(order)).stage).toBe('cancelled');
    expect(await eventsOf(order)).toEqual(['order-placed', 'order-cancelled']);
  });
});

describe('the day', () => {
  it('is released for confirmed orders; those that wait stay behind, and cancelled ones are not in it', async () => {
    const [ready, waiting, cancelled] = [await place(), await place('declined'), await place()];
    await house.call(house.rep, cancelOrder, {
      params: { orderId: cancelled.id },
      ifMatch: cancelled.rowVersion,
      body: { reason: 'rang off' },
    });
    const ofDay = (await staff((tx) => ordersOfDay(tx, DAY))).map(({ id }) => id);
    expect(ofDay).toEqual(expect.arrayContaining([ready.id, waiting.id]));
    expect(ofDay).not.toContain(cancelled.id);
    const released = await staff((tx) => releaseOrdersOfDay(tx, { now, day: DAY }));
    expect(released).toContain(ready.id);
    expect(released).not.toContain(waiting.id);
    expect(await staff((tx) => releaseOrdersOfDay(tx, { now, day: DAY }))).toEqual([]);
    expect((await read(ready)).stage).toBe('released');
    const late = await house.call(house.rep, cancelOrder, {
      params: { orderId: ready.id },
      ifMatch: 2,
      body: { reason: 'too late' },
    });
    expect([late.status, late.problem.code]).toEqual([409, 'order-settled']);
  });
});

describe('packing an order', () => {
  it('makes its weights and total real, with what is short said on its line', async () => {
    const order = await place();
    await expect(short(order)).rejects.toMatchObject({ refusal: { code: 'order-not-released' } });
    await staff((tx) => releaseOrdersOfDay(tx, { now, day: DAY }));
    await pack(order, 8, 2260);
    expect((await read(order)).stage).toBe('in-work');
    const finish = () => staff((tx) => markPacked(tx, { now, orderId: order.id, caller: house.rep }));
    await expect(finish()).rejects.toMatchObject({ refusal: { code: 'line-not-finished' } });
    await expect(short(order, { shortPieces: 3 })).rejects.toMatchObject({
      refusal: { code: 'short-too-many', params: { most: 2 } },
    });
    await expect(short(order, { reason: ' ' })).rejects.toMatchObject({ refusal: { code: 'reason-missing' } });
    await short(order);
    await finish();
    await finish();
    const packed = await read(order);
    // 2.260 kg at £24.00 is £54.24; delivery £6.50.
    expect(packed).toMatchObject({
      stage: 'packed',
      totals: { packed: { netMinor: 6074, taxMinor: 0, totalMinor: 6074 } },
      lines: [{ packedPieces: 8, packedGrams: 2260, packedMinor: 5424, shortPieces: 2, shortReason: 'no stock' }],
    });
    expect(packed.history.map(({ what }) => what)).toEqual(['placed', 'confirmed', 'released', 'short', 'packed']);
    expect((await eventsOf(order)).filter((type) => type === 'order-packed')).toHaveLength(1);
    await expect(short(order)).rejects.toMatchObject({ refusal: { code: 'order-packed-already' } });
  });

  it('leaves its history as it was written', async () => {
    const order = await place();
    const change = staff((tx) =>
      tx.updateTable('orderChanges').set({ what: 'x' }).where('orderId', '=', order.id).execute(),
    );
    await expect(change).rejects.toMatchObject({ constraint: 'append_only' });
  });
});
