import { getPriceList, listPriceLines, listPriceLists, setPriceLine } from '@seamwright/pricing/contracts';
import { pricingImplementations } from './index';
import { addTestMarket, type TestMarket } from '@seamwright/pricing/server/testing';
import { inTransaction, type Caller } from '@seamwright/shared/server';
import { openTestHouse, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';

describe('price lists', () => {
  let house: TestHouse;
  let market: TestMarket;
  beforeAll(async () => {
    house = await openTestHouse({
      implementations: () => pricingImplementations({ timeZone: 'Europe/London', publicOrigin: 'http://desk.test' }),
    });
    market = await addTestMarket(house.database, await house.clock.now());
  });
  afterAll(() => house.close());

  const names = async (
    caller: Caller,
    query: { q?: string; level?: 'group'; limit?: number; cursor?: string } = {},
  ) => {
    const { body } = await house.call(caller, listPriceLists, { query });
    return { names: body.items.map(({ name }) => name), nextCursor: body.nextCursor };
  };
  const linesOf = async (priceListId: string, query: { q?: string; from?: string } = {}) =>
    (await house.call(market.rep, listPriceLines, { params: { priceListId }, query })).body.items;
  const steakOf = async (priceListId: string) => {
    const [line] = await linesOf(priceListId, { q: 'BF-901' });
    if (!line) throw new Error('the list has no steak');
    return line;
  };
  const set = (
    caller: Caller,
    line: { id: string; rowVersion: number },
    body: { from?: string; priceMinor?: number; breaks?: { fromQuantity: number; priceMinor: number }[] } = {},
  ) =>
    house.call(caller, setPriceLine, {
      params: { priceLineId: line.id },
      ifMatch: line.rowVersion,
      body: { from: '2026-12-01', priceMinor: 2_100, breaks: [], ...body },
    });

  it('are found by level and words, base first, a page at a time', async () => {
    expect((await names(market.rep)).names).toEqual(['Base list', 'Inns list', 'Hotel list']);
    expect((await names(market.rep, { level: 'group' })).names).toEqual(['Inns list']);
    expect((await names(market.rep, { q: 'test hotel' })).names).toEqual(['Hotel list']);
    expect((await names(market.rep, { q: '%' })).names).toEqual([]);
    const first = await names(market.rep, { limit: 2 });
    expect(first.names).toEqual(['Base list', 'Inns list']);
    expect((await names(market.rep, { limit: 2, cursor: first.nextCursor ?? '' })).names).toEqual(['Hotel list']);
  });

  it("leave out other customers' lists for a rep who serves some only, and are closed to buyers", async () => {
    expect((await names(market.pubRep)).names).toEqual(['Base list']);
    const priceListId = market.lists.hotel;
    expect((await house.call(market.pubRep, getPriceList, { params: { priceListId } })).status).toBe(404);
    expect((await house.call(market.pubRep, listPriceLines, { params: { priceListId } })).status).toBe(404);
    expect((await house.call(market.hotelBuyer, listPriceLists, {})).status).toBe(403);
  });

  it('are kept from other customers by the database itself, and the base list from being written in', async () => {
    const seen = await inTransaction(house.database, market.pubBuyer, (tx) =>
      tx
        .selectFrom('priceLines as l')
        .innerJoin('priceLists as p', 'p.id', 'l.priceListId')
        .select('p.level')
        .execute(),
    );
    expect(new Set(seen.map(({ level }) => level))).toEqual(new Set(['base']));
    const changed = await inTransaction(house.database, market.pubBuyer, (tx) =>
      tx.updateTable('priceLines').set({ priceMinor: 1 }).executeTakeFirst(),
    );
    expect(changed.numUpdatedRows).toBe(0n);
    const broken = await inTransaction(house.database, market.pubBuyer, (tx) =>
      tx.deleteFrom('priceBreaks').executeTakeFirst(),
    );
    expect(broken.numDeletedRows).toBe(0n);
  });

  it('keep a price until the day that a new one is set from', async () => {
    const before = await steakOf(market.lists.base);
    const { status, body } = await set(market.rep, before, {
      from: '2026-12-14',
      breaks: [{ fromQuantity: 20_000, priceMinor: 1_950 }],
    });
    expect(status).toBe(200);
    expect(body).toMatchObject({ priceMinor: 2_100, validFrom: '2026-12-14', validUntil: null });
    expect(await linesOf(market.lists.base, { q: 'steak' })).toMatchObject([
      { priceMinor: 2_000, validUntil: '2026-12-14', breaks: [{ fromQuantity: 10_000, priceMinor: 1_900 }] },
      { priceMinor: 2_100, validFrom: '2026-12-14', breaks: [{ fromQuantity: 20_000, priceMinor: 1_950 }] },
    ]);
    expect(await linesOf(market.lists.base, { q: 'steak', from: '2026-12-14' })).toHaveLength(1);
    const ended = await set(market.rep, { id: before.id, rowVersion: 2 }, { from: '2026-12-14' });
    expect(ended.problem).toMatchObject({ status: 422, code: 'price-line-ended' });
    const inPlace = await set(market.rep, body, { from: '2026-12-01', priceMinor: 2_200 });
    expect(inPlace.body).toMatchObject({ id: body.id, priceMinor: 2_200, validFrom: '2026-12-14', breaks: [] });
  });

  it('are changed only as they were read', async () => {
    const line = await steakOf(market.lists.hotel);
    expect((await set(market.rep, { ...line, rowVersion: 9 }, { from: '2026-12-10' })).status).toBe(412);
    expect(await steakOf(market.lists.hotel)).toEqual(line);
  });

  it('of everybody are not changed by a rep who serves some customers only', async () => {
    const line = await steakOf(market.lists.base);
    expect((await set(market.pubRep, line)).status).toBe(403);
    expect((await set(market.pubRep, await steakOf(market.lists.hotel))).status).toBe(404);
    expect((await set(market.rep, { id: newId(), rowVersion: 1 })).status).toBe(404);
  });

  it.each([
    ['a zero price', { priceMinor: 0 }, '/priceMinor'],
    ['a day that is past', { from: '2026-11-30' }, '/from'],
    [
      'breaks that do not rise',
      {
        breaks: [
          { fromQuantity: 5_000, priceMinor: 900 },
          { fromQuantity: 5_000, priceMinor: 800 },
        ],
      },
      '/breaks/1/fromQuantity',
    ],
  ])('refuse %s and say where', async (_what, body, pointer) => {
    const { problem } = await set(market.rep, await steakOf(market.lists.hotel), body);
    expect(problem.status).toBe(422);
    expect(problem.errors.map((error) => error.pointer)).toEqual([pointer]);
  });
});
