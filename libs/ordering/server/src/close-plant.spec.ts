import { getCalendar, listOrders, placeOrder, setClosure } from '@seamwright/ordering/contracts';
import { openOrderingHouse, type OrderingHouse } from '@seamwright/ordering/server/testing';
import { inTransaction } from '@seamwright/shared/server';
import { TEST_NOW, waitForLock } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';
import { closePlant } from './close-plant';
import { placeOrder as place } from './place-order';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
afterAll(() => house.close());

const orderFor = (deliveryDay: string) => ({
  siteId: house.heron.siteId,
  deliveryDay,
  settlement: 'account' as const,
  customerReference: '',
  note: '',
  lines: [
    {
      code: 'BF-901',
      chosen: {},
      quantity: { unit: 'piece' as const, count: 1 },
      whenShort: 'ask-me' as const,
      note: '',
    },
  ],
});
const placing = (day: string) =>
  house.call(house.heron.buyer, placeOrder, { body: orderFor(day), idempotencyKey: newId() });
const closing = (day: string) =>
  house.call(house.admin, setClosure, { params: { day }, body: { reason: 'Stocktake' } });

describe('closing the plant when the plant cuts on that day', () => {
  it('is refused with what the plant says, and the day stays open', async () => {
    const day = '2026-12-17';
    house.cutDays.add(day);
    expect((await closing(day)).problem).toMatchObject({ status: 409, code: 'day-being-cut' });
    const { closures } = (await house.call(house.admin, getCalendar, {})).body;
    expect(closures.map((closure) => closure.day)).not.toContain(day);
  });
});

describe('closing the plant while orders are placed', () => {
  it('waits for an order that is being placed, and is refused since that stands', async () => {
    const day = '2026-12-08';
    let closed: ReturnType<typeof closing> | undefined;
    await inTransaction(house.database, house.heron.buyer, async (tx) => {
      await place(tx, { now: TEST_NOW, caller: house.heron.buyer }, house.parts, orderFor(day));
      closed = closing(day);
      await waitForLock(tx);
    });
    expect((await closed)?.problem).toMatchObject({ status: 409, code: 'closure-has-orders' });
  });

  it('makes an order that comes meanwhile wait, and then refuses it', async () => {
    const day = '2026-12-09';
    let placed: ReturnType<typeof placing> | undefined;
    await inTransaction(house.database, house.admin, async (tx) => {
      await closePlant(tx, { ...house.parts, now: TEST_NOW, day, reason: 'Stocktake' });
      placed = placing(day);
      await waitForLock(tx);
    });
    expect((await placed)?.problem).toMatchObject({ status: 422, code: 'plant-closed' });
  });

  it('does not keep an order for another day waiting', async () => {
    const placed = await inTransaction(house.database, house.admin, async (tx) => {
      await closePlant(tx, { ...house.parts, now: TEST_NOW, day: '2026-12-10', reason: 'Stocktake' });
      return placing('2026-12-11');
    });
    expect(placed.status).toBe(201);
  });

  it('never leaves an order on a closed day, whoever comes first', async () => {
    for (const day of ['2026-12-14', '2026-12-15', '2026-12-16']) {
      const [closed, ...placed] = await Promise.all([closing(day), placing(day), placing(day), placing(day)]);
      const { items } = (await house.call(house.admin, listOrders, { query: { deliveryDay: day } })).body;
      const { closures } = (await house.call(house.admin, getCalendar, {})).body;
      const isClosed = closures.some((closure) => closure.day === day);
      expect(isClosed).toBe(closed.status === 200);
      expect(items).toHaveLength(placed.filter(({ status }) => status === 201).length);
      expect(isClosed ? items : []).toEqual([]);
    }
  });
});
