import { addTestPeople, addTestTree, type TestTree } from '@seamwright/catalogue/server/testing';
import { inTransaction, type Caller } from '@seamwright/shared/server';
import { openTestHouse, type TestHouse, TEST_NOW } from '@seamwright/shared/server/testing';
import { newId, type PlantDate } from '@seamwright/shared/util';
import { getLot, holdLot, listLotNodes, listLots, receiveLot, releaseLot } from '@seamwright/stock/contracts';
import { lotsOf, stockImplementations, stockPort } from './index';

let house: TestHouse;
let tree: TestTree;
let technical: Caller;
const floor: Caller = { kind: 'staff', personId: newId(), roles: ['floor'], customers: '*' };
const rep: Caller = { kind: 'staff', personId: newId(), roles: ['rep'], customers: '*' };
const buyer: Caller = { kind: 'user', personId: newId(), roles: ['buyer'], customerId: newId(), sites: '*' };

beforeAll(async () => {
  house = await openTestHouse({ implementations: () => stockImplementations({ timeZone: 'Europe/London' }) });
  technical = (await addTestPeople(house.database, TEST_NOW)).author;
  tree = await addTestTree(house.database);
});
afterAll(() => house.close());

const origin = { bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse: 'UK 9999' };
const aLot = (over: object = {}) => ({
  code: 'L-100',
  nodeId: tree.shoulderId,
  supplier: 'Test Farms',
  killDate: '2026-11-25',
  receivedOn: '2026-12-01',
  useBy: '2026-12-09' as string | null,
  receivedGrams: 50_000,
  receivedPieces: 10,
  origin,
  ...over,
});
const receive = (over: object = {}, idempotencyKey?: string) =>
  house.call(technical, receiveLot, { body: aLot(over), ...(idempotencyKey ? { idempotencyKey } : {}) });

describe('receiving a lot', () => {
  it('books it in, waiting for its release, once for a repeated deed', async () => {
    const key = 'receiving-lot-key-0001';
    const [first, second] = [await receive({}, key), await receive({}, key)];
    expect(first.status).toBe(201);
    expect(second.body.id).toBe(first.body.id);
    expect(first.body).toMatchObject({
      code: 'L-100',
      nodeName: 'Shoulder',
      state: 'received',
      remainingGrams: 50_000,
      holdReason: null,
      origin,
    });
  });

  it('refuses a code that is taken, pointing at it', async () => {
    const { problem } = await receive();
    expect(problem).toMatchObject({ status: 422, code: 'lot-code-taken' });
    expect(problem.errors[0]?.pointer).toBe('/code');
  });

  it.each([
    [{ killDate: '2026-12-02' }, 'lot-killed-after-arrival', '/killDate'],
    [{ receivedOn: '2026-12-02' }, 'lot-arrives-later', '/receivedOn'],
    [{ useBy: '2026-11-30' }, 'lot-expired-on-arrival', '/useBy'],
  ])('refuses dates that can not be: %j', async (over, code, pointer) => {
    const { problem } = await receive({ code: 'L-101', ...over });
    expect(problem.code).toBe(code);
    expect(problem.errors[0]?.pointer).toBe(pointer);
  });

  it('takes primals only, and names them', async () => {
    expect((await receive({ code: 'L-102', nodeId: tree.rolledShoulderId })).problem.code).toBe('lot-primal-unknown');
    const { body } = await house.call(technical, listLotNodes, {});
    expect(body.items.map(({ name }) => name)).toEqual(['Shoulder', 'Striploin']);
  });

  it('refuses weights and codes that make no sense', async () => {
    for (const over of [{ receivedGrams: 0 }, { receivedPieces: -1 }, { code: 'l 1' }, { code: '=A1' }, { extra: 1 }])
      expect((await receive({ code: 'L-103', ...over })).status).toBe(422);
  });
});

describe('holding and releasing', () => {
  it('moves as the table of states allows, and keeps the reason of a hold', async () => {
    const { body } = await receive({ code: 'L-200' });
    const params = { id: body.id };
    const released = await house.call(technical, releaseLot, { params, ifMatch: 1 });
    expect(released.body).toMatchObject({ state: 'released', rowVersion: 2 });
    const held = await house.call(technical, holdLot, { params, ifMatch: 2, body: { reason: 'Bag leaks' } });
    expect(held.body).toMatchObject({ state: 'on-hold', holdReason: 'Bag leaks', rowVersion: 3 });
    const twice = await house.call(technical, holdLot, { params, ifMatch: 3, body: { reason: 'again' } });
    expect(twice.problem).toMatchObject({ status: 409, code: 'move-not-allowed' });
    const again = await house.call(technical, releaseLot, { params, ifMatch: 3 });
    expect(again.body).toMatchObject({ state: 'released', holdReason: null });
  });

  it('refuses a stale edit, one without a version, and a hold without a reason', async () => {
    const { body } = await receive({ code: 'L-201' });
    const params = { id: body.id };
    await house.call(technical, releaseLot, { params, ifMatch: 1 });
    expect((await house.call(technical, holdLot, { params, ifMatch: 1, body: { reason: 'x' } })).status).toBe(412);
    expect((await house.call(technical, holdLot, { params, body: { reason: 'x' } })).status).toBe(428);
    expect((await house.call(technical, holdLot, { params, ifMatch: 2, body: { reason: ' ' } })).status).toBe(422);
  });

  it('lets one of two people who move it at once win', async () => {
    const { body } = await receive({ code: 'L-202' });
    const params = { id: body.id };
    const both = await Promise.all([1, 2].map(() => house.call(technical, releaseLot, { params, ifMatch: 1 })));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 412]);
  });
});

describe('the list of lots', () => {
  it('shows first what expires first, lots without a use-by last, page by page', async () => {
    await receive({ code: 'L-300', useBy: null });
    await receive({ code: 'L-301', useBy: '2026-12-03', nodeId: tree.striploinId });
    const codes: string[] = [];
    let cursor: string | undefined;
    do {
      const page = await house.call(technical, listLots, { query: { limit: 2, ...(cursor ? { cursor } : {}) } });
      expect(page.body.items.length).toBeLessThanOrEqual(2);
      codes.push(...page.body.items.map(({ code }) => code));
      cursor = page.body.nextCursor ?? undefined;
    } while (cursor);
    expect(codes).toEqual(['L-301', 'L-100', 'L-200', 'L-201', 'L-202', 'L-300']);
    const held = await house.call(technical, listLots, { query: { state: 'received', nodeId: tree.striploinId } });
    expect(held.body.items.map(({ code }) => code)).toEqual(['L-301']);
  });

  it('gives a day the released lots that fit it, first expired first', async () => {
    const day = { cuttingDay: '2026-12-02' as PlantDate, deliveryDay: '2026-12-03' as PlantDate };
    const fit = await inTransaction(house.database, technical, (tx) =>
      lotsOf(tx, [tree.shoulderId, tree.shoulderId, tree.striploinId], day),
    );
    expect(fit.map(({ code }) => code)).toEqual(['L-200', 'L-201', 'L-202']);
    expect(await inTransaction(house.database, technical, (tx) => lotsOf(tx, [], day))).toEqual([]);
  });

  it('tells a buyer what there is on a day, without a lot', async () => {
    const inStock = (day: string) =>
      inTransaction(house.database, buyer, (tx) => stockPort.nodesInStock(tx, day as PlantDate));
    expect(await inStock('2026-12-03')).toEqual([tree.shoulderId]);
    expect(await inStock('2026-12-10')).toEqual([]);
  });
});

it('is kept by planner and technical, read by the floor, and hidden from everybody else', async () => {
  const id = (await house.call(technical, listLots, { query: {} })).body.items[0]?.id ?? '';
  expect((await house.call(floor, getLot, { params: { id } })).status).toBe(200);
  expect((await house.call(floor, releaseLot, { params: { id }, ifMatch: 1 })).status).toBe(403);
  expect((await house.call(floor, receiveLot, { body: aLot() })).status).toBe(403);
  for (const caller of [rep, buyer]) expect((await house.call(caller, getLot, { params: { id } })).status).toBe(403);
  expect((await house.call(technical, getLot, { params: { id: newId() } })).status).toBe(404);
});
