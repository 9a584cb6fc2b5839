import { clearWaiting, orderById } from '@seamwright/ordering/server';
import {
  closeCuttingDay,
  finishCuttingDay,
  getCuttingDay,
  getCuttingList,
  getPullList,
  listCuttingDays,
  releaseCuttingDay,
} from '@seamwright/plant/contracts';
import { inTransaction, system } from '@seamwright/shared/server';
import { TEST_NOW, waitForLock } from '@seamwright/shared/server/testing';
import { newId, unwrap, type PlantDate } from '@seamwright/shared/util';
import { DELIVERY_DAY, openTestPlant, type TestPlant } from '../testing/src/index';
import { lockDay } from './cutting-days.repository';
import { cuttingDayPort } from './day-port';

let plant: TestPlant;
beforeAll(async () => {
  plant = await openTestPlant();
});
afterAll(() => plant.house.close());

const params = (deliveryDay = DELIVERY_DAY) => ({ params: { deliveryDay } });
const version = async (deliveryDay = DELIVERY_DAY) =>
  (await plant.house.call(plant.planner, getCuttingDay, params(deliveryDay))).body.rowVersion;
const close = async (deliveryDay = DELIVERY_DAY) =>
  plant.house.call(plant.planner, closeCuttingDay, { ...params(deliveryDay), ifMatch: await version(deliveryDay) });

const isReleased = async (orderId: string): Promise<boolean> => {
  const order = await inTransaction(plant.house.database, plant.planner, (tx) => orderById(tx, orderId));
  return order.releasedAt !== null;
};

describe('a cutting day', () => {
  it('comes into being with the first order for it, cut on the working day before', async () => {
    expect((await plant.house.call(plant.planner, getCuttingDay, params())).status).toBe(404);
    const placed = await plant.place([
      { code: 'BF-901', count: 2, unit: 'case' },
      { code: 'LM-901', count: 3 },
    ]);
    expect(placed.ok).toBe(true);
    await plant.place([{ code: 'BF-901', count: 5 }], { by: 'hotel' });
    const day = await plant.house.call(plant.planner, getCuttingDay, params());
    expect(day.body).toMatchObject({
      deliveryDay: '2026-12-03',
      cuttingDay: '2026-12-02',
      state: 'open',
      orders: 2,
      lines: 3,
      waitingOrders: 0,
      packedOrders: 0,
      closedAt: null,
    });
  });

  it('shows its cutting list while orders still come in', async () => {
    const { body } = await plant.house.call(plant.planner, getCuttingList, params());
    // Steak: 29 × 280 g = 8,120 g out; over 0.784 = 10,357.2 g in. Shoulder: 3 × 2,000 g = 6,000 g, 7,653.1 g in.
    expect(
      body.primals.map(({ primal, rows }) => [
        primal.name,
        ...rows.map((row) => [row.cut.code, row.pieces, row.cases, row.loosePieces, row.outGrams, row.inGrams]),
      ]),
    ).toEqual([
      ['Shoulder', ['LM-901', 3, 0, 3, 6_000, 7_654]],
      ['Striploin', ['BF-901', 29, 2, 5, 8_120, 10_358]],
    ]);
    expect(body.primals[1]?.rows[0]?.customers.map(({ customer, pieces }) => [customer.name, pieces])).toEqual([
      ['Test hotel', 5],
      ['Test pub', 24],
    ]);
    expect(body.customers.map(({ customer, totals }) => [customer.name, totals.pieces, totals.outGrams])).toEqual([
      ['Test hotel', 5, 1_400],
      ['Test pub', 27, 12_720],
    ]);
    expect(body.totals).toMatchObject({ pieces: 32, outGrams: 14_120, inGrams: 18_012 });
    // Portioning: 300 s set-up for each row + 40 s/kg in + 12 s a piece.
    // Steak 300 + 414.3 → 415 + 348 = 1,063; shoulder 300 + 306.1 → 307 + 36 = 643.
    expect(body.stations).toEqual([{ station: 'portioning', seconds: 1_063 + 643 }]);
    expect(body.cautions).toEqual(['knives']);
  });

  it('shows what to pull, first expired first', async () => {
    const { body } = await plant.house.call(plant.planner, getPullList, params());
    expect(
      body.rows.map(({ primal, pulls, leftOverGrams, shortGrams }) => [
        primal.name,
        pulls.map((p) => [p.lotCode, p.pieces, p.pulledGrams]),
        leftOverGrams,
        shortGrams,
      ]),
    ).toEqual([
      ['Shoulder', [['L-1', 2, 10_000]], 2_346, 0],
      ['Striploin', [['B-1', 2, 12_000]], 1_642, 0],
    ]);
    expect(body.totals).toMatchObject({ pieces: 4, neededGrams: 18_012, pulledGrams: 22_000 });
  });

  it('is closed by the planner who saw it as it is; its confirmed orders are released, those that wait are not', async () => {
    const waiting = unwrap(await plant.place([{ code: 'LM-901', count: 1 }], { cardId: newId() }));
    expect(waiting.waitingFor).toEqual(['payment']);
    const ifMatch = await version();
    expect((await plant.house.call(plant.planner, closeCuttingDay, { ...params(), ifMatch: ifMatch + 1 })).status).toBe(
      412,
    );
    const closed = await plant.house.call(plant.planner, closeCuttingDay, { ...params(), ifMatch });
    expect(closed.body).toMatchObject({ state: 'closed', waitingOrders: 1, orders: 3, rowVersion: ifMatch + 1 });
    expect(closed.body.closedAt).not.toBeNull();
    expect(
      (await plant.house.call(plant.planner, closeCuttingDay, { ...params(), ifMatch: ifMatch + 1 })).problem,
    ).toMatchObject({
      status: 409,
      code: 'move-not-allowed',
    });
    const late = await plant.place([{ code: 'LM-901', count: 1 }]);
    expect(late).toMatchObject({ ok: false, refusal: { code: 'day-closed' } });

    // What waits is not on the list; once its payment comes it is, and it is released.
    const list = await plant.house.call(plant.planner, getCuttingList, params());
    expect(list.body.totals.pieces).toBe(32);
    await inTransaction(plant.house.database, system('job'), (tx) =>
      clearWaiting(tx, { now: new Date('2026-12-01T13:00:00Z'), orderId: waiting.id, what: 'payment' }),
    );
    await plant.house.drain();
    expect(await isReleased(waiting.id)).toBe(true);
    expect((await plant.house.call(plant.planner, getCuttingList, params())).body.totals.pieces).toBe(33);
  });

  it('goes to the floor by way of the plan, and is not finished before its orders are packed', async () => {
    const released = await plant.house.call(plant.planner, releaseCuttingDay, {
      ...params(),
      ifMatch: await version(),
    });
    expect(released.body).toMatchObject({ state: 'released' });
    const finished = await plant.house.call(plant.planner, finishCuttingDay, { ...params(), ifMatch: await version() });
    expect(finished.problem).toMatchObject({ status: 409, code: 'day-not-packed' });
    expect(finished.problem.detail).toContain('3 released orders');
  });

  it('is not released before it is closed', async () => {
    const day = '2026-12-08';
    await plant.place([{ code: 'LM-901', count: 1 }], { deliveryDay: day });
    const early = await plant.house.call(plant.planner, releaseCuttingDay, {
      ...params(day),
      ifMatch: await version(day),
    });
    expect(early.problem).toMatchObject({ code: 'move-not-allowed' });
  });

  it('stands in the list, the latest first, page by page and by state', async () => {
    const first = await plant.house.call(plant.planner, listCuttingDays, { query: { limit: 1 } });
    expect(first.body.items.map((day) => day.deliveryDay)).toEqual(['2026-12-08']);
    const second = await plant.house.call(plant.planner, listCuttingDays, {
      query: { limit: 1, cursor: first.body.nextCursor ?? '' },
    });
    expect(second.body.items.map((day) => day.deliveryDay)).toEqual(['2026-12-03']);
    expect(second.body.nextCursor).toBeNull();
    const open = await plant.house.call(plant.planner, listCuttingDays, { query: { state: 'open' } });
    expect(open.body.items.map((day) => day.state)).toEqual(['open']);
    // A buyer asked for a day and ordered nothing in the end.
    await inTransaction(plant.house.database, plant.market.pubBuyer, (tx) =>
      cuttingDayPort.isClosed(tx, '2026-12-22' as PlantDate),
    );
    const all = await plant.house.call(plant.planner, listCuttingDays, { query: {} });
    expect(all.body.items.map((day) => day.deliveryDay)).toEqual(['2026-12-08', '2026-12-03']);
    const bad = await plant.house.call(plant.planner, listCuttingDays, { query: { cursor: 'nonsense' } });
    expect(bad.status).toBe(422);
  });

  it('is only looked at when buyers ask which days are closed: nothing is made or locked', async () => {
    const { database } = plant.house;
    const asked = [DELIVERY_DAY, '2026-12-08', '2026-12-23'] as PlantDate[];
    const closed = await inTransaction(database, plant.planner, async (tx) => {
      await lockDay(tx, DELIVERY_DAY as PlantDate);
      return inTransaction(database, plant.market.pubBuyer, (other) => cuttingDayPort.closedDays(other, asked));
    });
    expect([...closed]).toEqual([DELIVERY_DAY]);
    expect((await plant.house.call(plant.planner, getCuttingDay, params('2026-12-23'))).status).toBe(404);
    const none = await inTransaction(database, plant.market.pubBuyer, (tx) => cuttingDayPort.closedDays(tx, []));
    expect(none.size).toBe(0);
  });

  it('is cut before a closure of the plant', async () => {
    await inTransaction(plant.house.database, system('seed'), (tx) =>
      tx.insertInto('plantClosures').values({ day: '2026-12-09', reason: 'Boiler inspection' }).execute(),
    );
    const placed = await plant.place([{ code: 'LM-901', count: 1 }], { deliveryDay: '2026-12-10' });
    expect(placed.ok).toBe(true);
    const day = await plant.house.call(plant.planner, getCuttingDay, params('2026-12-10'));
    expect(day.body.cuttingDay).toBe('2026-12-08');
  });

  it('can be moved by the planner only, and is not seen by buyers', async () => {
    const { house, packer, market } = plant;
    const ifMatch = await version();
    expect((await house.call(packer, closeCuttingDay, { ...params(), ifMatch })).status).toBe(403);
    expect((await house.call(market.rep, closeCuttingDay, { ...params(), ifMatch })).status).toBe(403);
    expect((await house.call(market.pubBuyer, getCuttingList, params())).status).toBe(403);
    expect((await house.call({ kind: 'anonymous' }, getCuttingDay, params())).status).toBe(401);
    expect((await house.call(plant.planner, closeCuttingDay, params())).status).toBe(428);
    expect((await house.call(plant.planner, getCuttingDay, params('tomorrow'))).status).toBe(404);
  });
});

describe('closing while orders are placed', () => {
  const DAY = '2026-12-14';

  it('lets no order slip in: each is on the closed day, released, or was refused', async () => {
    await plant.place([{ code: 'BF-901', count: 1 }], { deliveryDay: DAY });
    const placing = Array.from({ length: 6 }, (_, index) =>
      plant.place([{ code: 'BF-901', count: index + 2 }], { deliveryDay: DAY, by: index % 2 ? 'hotel' : 'pub' }),
    );
    const [closed, ...placed] = await Promise.all([close(DAY), ...placing]);
    expect(closed.status).toBe(200);
    const taken = placed.flatMap((each) => (each.ok ? [each.value] : []));
    for (const each of placed) if (!each.ok) expect(each.refusal.code).toBe('day-closed');
    for (const { id } of taken) expect(await isReleased(id)).toBe(true);
    const day = await plant.house.call(plant.planner, getCuttingDay, params(DAY));
    expect(day.body).toMatchObject({ state: 'closed', orders: taken.length + 1 });
    const list = await plant.house.call(plant.planner, getCuttingList, params(DAY));
    const pieces = taken.flatMap(({ lines }) => lines.map((line) => line.pieces)).reduce((sum, each) => sum + each, 1);
    expect(list.body.totals.pieces).toBe(pieces);
  });

  it('makes an order that comes while the day is being closed wait, and then refuses it', async () => {
    const { database } = plant.house;
    const day = '2026-12-15';
    await plant.place([{ code: 'BF-901', count: 1 }], { deliveryDay: day });
    let answered = false;
    let placing: ReturnType<TestPlant['place']> | undefined;
    await inTransaction(database, plant.planner, async (tx) => {
      const { id } = await lockDay(tx, day as PlantDate);
      placing = plant.place([{ code: 'BF-901', count: 9 }], { deliveryDay: day });
      void placing.then(() => (answered = true));
      // The order can't be answered while this transaction holds the day.
      await waitForLock(tx);
      expect(answered).toBe(false);
      await tx.updateTable('cuttingDays').set({ state: 'closed', closedAt: TEST_NOW }).where('id', '=', id).execute();
    });
    expect(await placing).toMatchObject({ ok: false, refusal: { code: 'day-closed' } });
  });

  it('makes the planner wait for an order that is being placed, and takes it along', async () => {
    const { database } = plant.house;
    const day = '2026-12-16';
    await plant.place([{ code: 'BF-901', count: 1 }], { deliveryDay: day });
    let closing: ReturnType<typeof close> | undefined;
    await inTransaction(database, plant.market.pubBuyer, async (tx) => {
      expect(await cuttingDayPort.isClosed(tx, day as PlantDate)).toBe(false);
      closing = close(day);
      await waitForLock(tx);
    });
    expect((await closing)?.body.state).toBe('closed');
  });

  it('makes the day once when its first orders come together', async () => {
    const day = '2026-12-17';
    const placed = await Promise.all(
      Array.from({ length: 4 }, () => plant.place([{ code: 'BF-901', count: 1 }], { deliveryDay: day })),
    );
    expect(placed.map((each) => each.ok)).toEqual([true, true, true, true]);
    expect((await plant.house.call(plant.planner, getCuttingDay, params(day))).body.orders).toBe(4);
  });
});
