import { checkPrices } from '@seamwright/pricing/contracts';
import { pricePort, pricingImplementations } from './index';
import { addTestMarket, type TestMarket } from '@seamwright/pricing/server/testing';
import { inTransaction, system, type Caller } from '@seamwright/shared/server';
import { openTestHouse, type TestHouse } from '@seamwright/shared/server/testing';
import { newId, type PlantDate } from '@seamwright/shared/util';

describe('price check', () => {
  let house: TestHouse;
  let market: TestMarket;
  beforeAll(async () => {
    house = await openTestHouse({
      implementations: () => pricingImplementations({ timeZone: 'Europe/London', publicOrigin: 'http://desk.test' }),
    });
    market = await addTestMarket(house.database, await house.clock.now());
  });
  afterAll(() => house.close());

  const deliveryDay = '2026-12-04';
  const check = (caller: Caller, body: Partial<Parameters<typeof house.call<typeof checkPrices>>[2]['body']>) =>
    house.call(caller, checkPrices, {
      body: { deliveryDay, lines: [{ code: 'BF-901', quantity: { unit: 'piece', count: 10 } }], ...body },
    });

  it("answers each line with the buyer's own price, weights, amounts and reasons", async () => {
    const { status, body } = await check(market.hotelBuyer, {
      lines: [
        { code: 'BF-901', quantity: { unit: 'piece', count: 24 } },
        {
          specificationId: market.shoulder.specificationId,
          chosen: { trim: '3' },
          quantity: { unit: 'case', count: 2 },
        },
      ],
    });
    expect(status).toBe(200);
    expect(body).toMatchObject({ customerId: market.hotelId, currency: 'GBP', deliveryDay });
    // 24 × 280 g = 6.720 kg at £18.50: £124.32; 6.384 kg: £118.104 → £118.10; 7.056 kg: £130.536 → £130.54.
    expect(body.lines[0]).toMatchObject({
      ok: true,
      code: 'BF-901',
      weights: { pieces: 24, cases: 2, minGrams: 6_384, estimateGrams: 6_720, maxGrams: 7_056 },
      price: { basis: 'kg', priceMinor: 1_850, level: 'customer', listName: 'Hotel list' },
      amounts: { minMinor: 11_810, estimateMinor: 12_432, maxMinor: 13_054 },
    });
    // 8 × 2 kg at £9.50 + £0.45.
    expect(body.lines[1]).toMatchObject({
      ok: true,
      choiceKey: 'trim=3',
      summary: '3 mm fat',
      leadDays: 1,
      price: {
        priceMinor: 995,
        level: 'group',
        parts: [
          { code: 'list-price', params: { level: 'group', list: 'Inns list' }, minor: 950 },
          { code: 'choices', params: { basis: 'kg', perKg: 45 }, minor: 45 },
        ],
        candidates: [
          { level: 'group', outcome: 'won' },
          { level: 'base', outcome: 'lost-to-more-specific' },
        ],
      },
      amounts: { estimateMinor: 15_920 },
    });
  });

  it("never shows another customer's or group's prices", async () => {
    const { body } = await check(market.pubBuyer, {
      lines: [
        { code: 'BF-901', quantity: { unit: 'piece', count: 1 } },
        { code: 'LM-901', quantity: { unit: 'piece', count: 1 } },
      ],
    });
    expect(body.lines.map((line) => line.ok && line.price.candidates.map(({ listName }) => listName))).toEqual([
      ['Base list'],
      ['Base list'],
    ]);
  });

  it('reaches a break by the ordered quantity', async () => {
    const { body } = await check(market.pubBuyer, {
      lines: [{ code: 'BF-901', quantity: { unit: 'kg', grams: 10_000 } }],
    });
    expect(body.lines[0]).toMatchObject({ ok: true, weights: { pieces: 36 }, price: { priceMinor: 1_900 } });
  });

  it('lets staff ask for a customer that they serve, and for no other', async () => {
    const asked = await check(market.rep, { customerId: market.hotelId });
    expect(asked.body.lines[0]).toMatchObject({ ok: true, price: { level: 'customer' } });
    expect((await check(market.rep, {})).problem).toMatchObject({ status: 422, code: 'price-customer-missing' });
    expect((await check(market.pubRep, { customerId: market.hotelId })).status).toBe(404);
    expect((await check(market.rep, { customerId: newId() })).status).toBe(404);
  });

  it('gives 404 to a buyer who names another customer or a site that is not hers', async () => {
    expect((await check(market.pubBuyer, { customerId: market.hotelId })).status).toBe(404);
    expect((await check(market.pubBuyer, { customerId: market.pubId })).status).toBe(200);
    expect((await check(market.pubBuyer, { siteId: newId() })).status).toBe(404);
  });

  it('refuses a line in words and still prices the others', async () => {
    const { body } = await check(market.pubBuyer, {
      lines: [
        { code: 'NO-000', quantity: { unit: 'piece', count: 1 } },
        { code: 'LM-901', chosen: { trim: '99' }, quantity: { unit: 'piece', count: 1 } },
        { code: 'LM-901', quantity: { unit: 'piece', count: 1 } },
      ],
    });
    expect(body.lines.map((line) => (line.ok ? 'priced' : line.code))).toEqual([
      'specification-not-offered',
      'choice-value-unknown',
      'priced',
    ]);
    expect(body.lines.every((line) => line.ok || line.message.length > 10)).toBe(true);
  });

  it.each([
    ['a day that is past', { deliveryDay: '2026-11-30' }, '/deliveryDay'],
    ['a day that is none', { deliveryDay: '2026-02-30' }, '/deliveryDay'],
    ['no lines', { lines: [] }, '/lines'],
    [
      'a quantity below zero',
      { lines: [{ code: 'LM-901', quantity: { unit: 'piece', count: -1 } }] },
      '/lines/0/quantity/count',
    ],
    [
      'an absurd quantity',
      { lines: [{ code: 'LM-901', quantity: { unit: 'kg', grams: 1e12 } }] },
      '/lines/0/quantity/grams',
    ],
    [
      'id and code at once',
      { lines: [{ code: 'LM-901', specificationId: newId(), quantity: { unit: 'piece', count: 1 } }] },
      '/lines/0',
    ],
  ] as const)('refuses %s with 422 and says where', async (_what, body, pointer) => {
    const { problem } = await check(market.pubBuyer, body as object);
    expect(problem.status).toBe(422);
    expect(problem.errors.map((error) => error.pointer)).toContain(pointer);
  });

  it('does not price a specification that was withdrawn', async () => {
    await inTransaction(house.database, system('seed'), (tx) =>
      tx
        .updateTable('specificationStandings')
        .set({ standing: 'withdrawn' })
        .where('specificationId', '=', market.steak.specificationId)
        .execute(),
    );
    const { body } = await check(market.pubBuyer, {});
    expect(body.lines).toEqual([
      { ok: false, code: 'specification-not-offered', message: expect.stringContaining('not offered') },
    ]);
  });

  it('gives the catalogue a customer’s prices per kg, of what is not on request', async () => {
    const { hotelId, pubId, hotelBuyer, pubBuyer, shoulder, steak } = market;
    const offers = [shoulder, steak].map(({ specificationId }) => ({
      specificationId,
      usualChoiceKey: '',
      usualPriceChangeMinorPerKg: 0,
      pieceGrams: 280,
      piecesPerCase: 12,
    }));
    const prices = async (caller: Caller, customerId: string, day: string) => {
      const found = await inTransaction(house.database, caller, (tx) =>
        pricePort.pricesPerKg(tx, customerId, day as PlantDate, offers),
      );
      return [shoulder, steak].map(({ specificationId }) => found.get(specificationId));
    };
    expect(await prices(hotelBuyer, hotelId, deliveryDay)).toEqual([950, 1_850]);
    expect(await prices(pubBuyer, pubId, deliveryDay)).toEqual([1_000, 2_000]);
    expect(await prices(pubBuyer, pubId, '2025-12-31')).toEqual([undefined, undefined]);
  });
});
