import {
  addPack,
  closeCuttingDay,
  finishCuttingDay,
  finishOrder,
  getCuttingDay,
  getCuttingList,
  listPackingOrders,
  markShort,
  releaseCuttingDay,
  voidPack,
  type PackingLineWire,
  type PackingOrderWire,
} from '@seamwright/plant/contracts';
import { DELIVERY_DAY, openTestPlant, type TestPlant } from '../testing/src/index';
import { inTransaction, system, type Caller } from '@seamwright/shared/server';
import { newId } from '@seamwright/shared/util';
import { lotById } from '@seamwright/stock/server';

let plant: TestPlant;
const seen: { type: string; subjectId: string }[] = [];
beforeAll(async () => {
  plant = await openTestPlant({
    subscribers: [
      {
        name: 'test-listener',
        events: ['pack-added', 'pack-voided', 'order-packed'],
        handle: async (_, { type, subjectId }) => void seen.push({ type, subjectId }),
      },
    ],
  });
  await plant.place(
    [
      { code: 'BF-901', count: 6 },
      { code: 'LM-901', count: 1 },
    ],
    { by: 'pub' },
  );
  await plant.place([{ code: 'BF-901', count: 2 }], { by: 'hotel' });
});
afterAll(() => plant.house.close());

const moveDay = async (move: typeof closeCuttingDay | typeof releaseCuttingDay | typeof finishCuttingDay) => {
  const params = { deliveryDay: DELIVERY_DAY };
  const day = await plant.house.call(plant.planner, getCuttingDay, { params });
  return plant.house.call(plant.planner, move, { params, ifMatch: day.body.rowVersion });
};
const orders = async (caller: Caller = plant.packer) =>
  (await plant.house.call(caller, listPackingOrders, { query: { deliveryDay: DELIVERY_DAY } })).body;
const orderOf = async (name: string): Promise<PackingOrderWire> => {
  const found = (await orders()).orders.find(({ customer }) => customer.name === name);
  if (!found) throw new Error(`${name} has no order on the floor`);
  return found;
};
const lineOf = ({ lines }: PackingOrderWire, code: string): PackingLineWire => {
  const found = lines.find((line) => line.code === code);
  if (!found) throw new Error(`no line of ${code}`);
  return found;
};

interface Weighing {
  code?: string;
  lotId?: string;
  pieces?: number;
  grossGrams?: number;
  tareGrams?: number;
  reason?: string | null;
  idempotencyKey?: string;
}
const weigh = async (order: PackingOrderWire, { code = 'BF-901', idempotencyKey, ...over }: Weighing = {}) =>
  plant.house.call(plant.packer, addPack, {
    params: { orderId: order.id },
    ...(idempotencyKey ? { idempotencyKey } : {}),
    body: {
      orderLineId: lineOf(order, code).id,
      lotId: code === 'BF-901' ? plant.striploinLotId : plant.shoulderLotId,
      pieces: 2,
      grossGrams: 578,
      tareGrams: 18,
      reason: null,
      ...over,
    },
  });

describe('before the day is on the floor', () => {
  it('shows nothing to pack and takes no pack', async () => {
    await moveDay(closeCuttingDay);
    expect(await orders()).toMatchObject({ state: 'closed', orders: [] });
    const orderId = await inTransaction(
      plant.house.database,
      system('job'),
      async (tx) => (await tx.selectFrom('orders').select('id').executeTakeFirstOrThrow()).id,
    );
    const refused = await plant.house.call(plant.packer, finishOrder, { params: { orderId } });
    expect(refused.problem).toMatchObject({ status: 409, code: 'day-not-on-floor' });
    expect((await moveDay(releaseCuttingDay)).body.state).toBe('released');
  });
});

describe('at the scale', () => {
  it('sees each line with its limits, tare, and lots, first expired first', async () => {
    const line = lineOf(await orderOf('Test pub'), 'BF-901');
    expect(line).toMatchObject({
      pieces: 6,
      packedPieces: 0,
      piecesPerPack: 2,
      piece: { nominalGrams: 280, minGrams: 266, maxGrams: 294 },
      tareGrams: 18,
      storageMaxC: 4,
    });
    expect(line.lots.map(({ code }) => code)).toEqual(['B-1', 'B-2']);
  });

  it('keeps a pack: net is gross less tare', async () => {
    const { status, body } = await weigh(await orderOf('Test pub'));
    expect(status).toBe(201);
    expect(lineOf(body, 'BF-901')).toMatchObject({
      packedPieces: 2,
      packedGrams: 560,
      packs: [{ netGrams: 560, tareGrams: 18, outOfLimits: false, reason: null, lotCode: 'B-1', pieces: 2 }],
    });
  });

  it('takes from the lot what stands behind the net weight by simple yield', async () => {
    // 560 g over 0.784 = 714.3 g, rounded up.
    const lot = await inTransaction(plant.house.database, plant.packer, (tx) => lotById(tx, plant.striploinLotId));
    expect(lot).toMatchObject({ receivedGrams: 24_000, remainingGrams: 24_000 - 715 });
  });

  it('keeps one pack when the same deed is sent twice, also at once', async () => {
    const order = await orderOf('Test pub');
    const again = await Promise.all([1, 2, 3].map(() => weigh(order, { idempotencyKey: 'the-same-pack-key-0001' })));
    expect(again.filter(({ status }) => status === 201).length).toBeGreaterThanOrEqual(1);
    expect(lineOf(await orderOf('Test pub'), 'BF-901').packedPieces).toBe(4);
  });

  it('wants a reason outside the limits, and names them', async () => {
    const order = await orderOf('Test pub');
    const refused = await weigh(order, { grossGrams: 618 });
    expect(refused.problem).toMatchObject({ status: 422, code: 'pack-out-of-limits' });
    expect(refused.problem.detail).toContain('532 to 588 g');
    expect(refused.problem.errors).toEqual([{ pointer: '/reason', message: refused.problem.detail }]);
    const kept = await weigh(order, { grossGrams: 618, reason: 'Thick end, agreed with the kitchen' });
    expect(lineOf(kept.body, 'BF-901').packs.at(-1)).toMatchObject({
      netGrams: 600,
      outOfLimits: true,
      reason: 'Thick end, agreed with the kitchen',
    });
  });

  it('takes no more pieces than the line has', async () => {
    const over = await weigh(await orderOf('Test pub'), { pieces: 1, grossGrams: 298 });
    expect(over.problem).toMatchObject({ status: 422, code: 'pack-over-line' });
  });

  it('takes a pack back, once, and gives its weight back to the lot', async () => {
    const order = await orderOf('Test pub');
    const [pack] = lineOf(order, 'BF-901').packs.slice(-1);
    const params = { orderId: order.id, packId: pack?.id ?? '' };
    const { body } = await plant.house.call(plant.packer, voidPack, { params });
    expect(lineOf(body, 'BF-901').packedPieces).toBe(4);
    expect((await plant.house.call(plant.packer, voidPack, { params })).status).toBe(404);
    const elsewhere = { orderId: (await orderOf('Test hotel')).id, packId: lineOf(order, 'BF-901').packs[0]?.id ?? '' };
    expect((await plant.house.call(plant.packer, voidPack, { params: elsewhere })).status).toBe(404);
  });

  it('refuses a lot of another primal, on hold, or past its use-by, and a pack of nothing', async () => {
    const order = await orderOf('Test pub');
    expect((await weigh(order, { lotId: plant.shoulderLotId })).problem.code).toBe('lot-of-another-primal');
    expect((await weigh(order, { lotId: newId() })).status).toBe(404);
    expect((await weigh(order, { grossGrams: 18 })).problem.code).toBe('net-not-positive');
    const lotId = plant.laterStriploinLotId;
    const change = (to: object) =>
      inTransaction(plant.house.database, system('seed'), (tx) =>
        tx.updateTable('lots').set(to).where('id', '=', lotId).execute(),
      );
    await change({ state: 'on-hold', holdReason: 'Torn bags' });
    expect((await weigh(order, { lotId })).problem.code).toBe('lot-not-released');
    expect(lineOf(await orderOf('Test pub'), 'BF-901').lots.map(({ code }) => code)).toEqual(['B-1']);
    await change({ state: 'released', holdReason: null, useBy: '2026-12-02' });
    expect((await weigh(order, { lotId })).problem.code).toBe('lot-past-use-by');
  });

  it('refuses absurd numbers before anything is stored', async () => {
    const order = await orderOf('Test pub');
    for (const over of [
      { pieces: 0 },
      { pieces: 1.5 },
      { grossGrams: -1 },
      { grossGrams: 2_000_000 },
      { tareGrams: 0.5 },
    ])
      expect((await weigh(order, over)).problem).toMatchObject({ status: 422, code: 'invalid' });
  });

  it('does not let two packers put more on a line than it has', async () => {
    const order = await orderOf('Test pub');
    const both = await Promise.all([weigh(order), weigh(order)]);
    expect(both.map(({ status }) => status).sort()).toEqual([201, 422]);
    expect(lineOf(await orderOf('Test pub'), 'BF-901').packedPieces).toBe(6);
  });
});

describe('finishing an order', () => {
  it('is refused while a line waits, naming it', async () => {
    const order = await orderOf('Test pub');
    const refused = await plant.house.call(plant.packer, finishOrder, { params: { orderId: order.id } });
    expect(refused.status).toBe(409);
    expect(refused.problem.code).toBe('line-not-finished');
  });

  it('is possible once what could not be sent is marked short, with a reason', async () => {
    const order = await orderOf('Test pub');
    const params = { orderId: order.id, lineId: lineOf(order, 'LM-901').id };
    const bare = await plant.house.call(plant.packer, markShort, { params, body: { shortPieces: 1, reason: ' ' } });
    expect(bare.problem).toMatchObject({ status: 422, code: 'reason-missing' });
    const tooMany = await plant.house.call(plant.packer, markShort, { params, body: { shortPieces: 2, reason: 'x' } });
    expect(tooMany.problem).toMatchObject({ status: 422, code: 'short-too-many' });
    const short = await plant.house.call(plant.packer, markShort, {
      params,
      body: { shortPieces: 1, reason: 'Primal was bruised' },
    });
    expect(lineOf(short.body, 'LM-901')).toMatchObject({ shortPieces: 1, shortReason: 'Primal was bruised' });
    const list = await plant.house.call(plant.planner, getCuttingList, { params: { deliveryDay: DELIVERY_DAY } });
    expect(list.body.primals.map(({ primal }) => primal.name)).toEqual(['Striploin']);

    const finished = await plant.house.call(plant.packer, finishOrder, { params: { orderId: order.id } });
    expect(finished.body.packedAt).not.toBeNull();
  });

  it('ends the packing: nothing is added, taken back or marked afterwards', async () => {
    const order = await orderOf('Test pub');
    const line = lineOf(order, 'BF-901');
    expect((await weigh(order)).problem.code).toBe('order-packed-already');
    const params = { orderId: order.id, packId: line.packs[0]?.id ?? '' };
    expect((await plant.house.call(plant.packer, voidPack, { params })).status).toBe(409);
    const lineParams = { orderId: order.id, lineId: line.id };
    const body = { shortPieces: 1, reason: 'late' };
    expect((await plant.house.call(plant.packer, markShort, { params: lineParams, body })).status).toBe(409);
    expect((await plant.house.call(plant.packer, finishOrder, { params: { orderId: order.id } })).status).toBe(409);
  });

  it('is told to whoever listens', async () => {
    await plant.house.drain();
    const order = await orderOf('Test pub');
    const told = seen.filter(({ subjectId }) => subjectId === order.id).map(({ type }) => type);
    expect(told.filter((type) => type === 'order-packed')).toHaveLength(1);
    expect(
      told.filter((type) => type === 'pack-added').length - told.filter((type) => type === 'pack-voided').length,
    ).toBe(3);
  });

  it('lets the day be finished, after which nothing is packed', async () => {
    const hotel = await orderOf('Test hotel');
    expect((await moveDay(finishCuttingDay)).problem.code).toBe('day-not-packed');
    await weigh(hotel);
    await plant.house.call(plant.packer, finishOrder, { params: { orderId: hotel.id } });
    expect((await moveDay(finishCuttingDay)).body).toMatchObject({ state: 'finished', packedOrders: 2 });
    expect((await weigh(hotel)).problem.code).toBe('day-not-on-floor');
  });
});

it('is for the floor and the planner only', async () => {
  const { house, market } = plant;
  const query = { deliveryDay: DELIVERY_DAY };
  for (const caller of [market.rep, market.pubBuyer])
    expect((await house.call(caller, listPackingOrders, { query })).status).toBe(403);
  expect((await house.call(plant.planner, listPackingOrders, { query })).status).toBe(200);
  expect((await house.call(plant.packer, listPackingOrders, { query: { deliveryDay: '2027-01-04' } })).status).toBe(
    404,
  );
});
