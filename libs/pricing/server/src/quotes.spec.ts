import {
  acceptQuote,
  checkPrices,
  createQuote,
  declineQuote,
  getQuote,
  listQuotes,
  sendQuote,
  type NewQuoteWire,
} from '@seamwright/pricing/contracts';
import { pricingImplementations, pricingPeriodic } from './index';
import { addTestMarket, type TestMarket } from '@seamwright/pricing/server/testing';
import { inTransaction, personOf, system, type Caller } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';

const parts = { timeZone: 'Europe/London', publicOrigin: 'http://desk.test' };

describe('quotes', () => {
  let house: TestHouse;
  let market: TestMarket;
  beforeAll(async () => {
    house = await openTestHouse({ implementations: () => pricingImplementations(parts) });
    market = await addTestMarket(house.database, TEST_NOW);
  });
  beforeEach(() => house.clock.set(TEST_NOW));
  afterAll(() => house.close());

  const written = (of: Partial<NewQuoteWire> = {}): NewQuoteWire => ({
    customerId: market.pubId,
    pricesFrom: '2026-12-02',
    pricesUntil: '2026-12-31',
    answerBy: '2026-12-11',
    notes: '',
    lines: [
      { specificationId: market.shoulder.specificationId, chosen: { trim: '3' }, basis: 'case', priceMinor: 7_400 },
    ],
    ...of,
  });
  const create = (caller: Caller, of: Partial<NewQuoteWire> = {}) =>
    house.call(caller, createQuote, { body: written(of) });
  const sent = async (of: Partial<NewQuoteWire> = {}) => {
    const draft = await create(market.rep, of);
    return send(draft.body.id, draft.body.rowVersion);
  };
  const send = (quoteId: string, ifMatch: number) =>
    house.call(market.rep, sendQuote, { params: { quoteId }, ifMatch });
  const accept = (caller: Caller, quoteId: string, ifMatch: number) =>
    house.call(caller, acceptQuote, { params: { quoteId }, ifMatch });
  const shoulderPrice = async (caller: Caller, deliveryDay: string, trim = '3') => {
    const { body } = await house.call(caller, checkPrices, {
      body: { deliveryDay, lines: [{ code: 'LM-901', chosen: { trim }, quantity: { unit: 'case', count: 2 } }] },
    });
    const [line] = body.lines;
    return line?.ok ? `${line.price.level} ${line.price.priceMinor}/${line.price.basis}` : line?.code;
  };
  const agreedDays = () =>
    inTransaction(house.database, system('seed'), (tx) =>
      tx
        .selectFrom('priceLines')
        .innerJoin('priceLists', 'priceLists.id', 'priceLines.priceListId')
        .select(['priceLines.valid', 'priceLines.priceMinor'])
        .where('level', '=', 'agreement')
        .where('priceLists.customerId', '=', market.pubId)
        .orderBy('priceLines.valid')
        .execute(),
    );

  it('start as a draft of the rep, with what a case will weigh and cost', async () => {
    const { status, body } = await create(market.rep);
    expect(status).toBe(201);
    expect(body).toMatchObject({ state: 'draft', rowVersion: 1, writtenBy: 'Rae Rep', customerName: 'Test pub' });
    expect(body.lines).toMatchObject([
      {
        code: 'LM-901',
        summary: '3 mm fat',
        choiceKey: 'trim=3',
        caseWeights: { pieces: 4, cases: 1, minGrams: 7_600, estimateGrams: 8_000, maxGrams: 8_400 },
        caseAmounts: { minMinor: 7_400, estimateMinor: 7_400, maxMinor: 7_400 },
      },
    ]);
  });

  it('are written once for a repeated request', async () => {
    const idempotencyKey = newId();
    const first = await house.call(market.rep, createQuote, { body: written(), idempotencyKey });
    const again = await house.call(market.rep, createQuote, { body: written(), idempotencyKey });
    expect(again.body.id).toBe(first.body.id);
  });

  it("are no one else's business: drafts are hidden from the customer, everything from other customers", async () => {
    const draft = await create(market.rep);
    const of = (caller: Caller, quoteId: string) => house.call(caller, getQuote, { params: { quoteId } });
    expect((await of(market.pubBuyer, draft.body.id)).status).toBe(404);
    const { body } = await send(draft.body.id, draft.body.rowVersion);
    expect((await of(market.pubBuyer, body.id)).body).toMatchObject({ state: 'sent', writtenBy: 'Rae Rep' });
    expect((await of(market.hotelBuyer, body.id)).status).toBe(404);
    expect((await accept(market.hotelBuyer, body.id, body.rowVersion)).status).toBe(404);
    const list = await house.call(market.hotelBuyer, listQuotes, {});
    expect(list.body.items).toEqual([]);
    expect((await create(market.pubRep, { customerId: market.hotelId })).status).toBe(404);
  });

  const mailsOf = (quoteId: string) =>
    inTransaction(house.database, system('seed'), (tx) =>
      tx.selectFrom('mails').selectAll().where('dedupeKey', 'like', `quote:${quoteId}:%`).execute(),
    );
  const pubBuyers = (change: { active: boolean }) =>
    inTransaction(house.database, system('seed'), (tx) =>
      tx.updateTable('people').set(change).where('customerId', '=', market.pubId).execute(),
    );

  it('are mailed to those who may accept them, with prices in words and a link', async () => {
    const { body } = await sent({ notes: 'As spoken on the phone.' });
    const [mail, ...others] = await mailsOf(body.id);
    expect(others).toEqual([]);
    expect(mail).toMatchObject({ toAddress: `${personOf(market.pubBuyer)}@example.test`, customerId: market.pubId });
    expect(mail?.subject).toBe(`Quote ${body.number} for Test pub`);
    expect(mail?.bodyText).toContain('Boneless shoulder (LM-901), 3 mm fat: £74.00 per case');
    expect(mail?.bodyText).toContain('As spoken on the phone.');
    expect(mail?.bodyText).toContain(`http://desk.test/quotes/${body.id}`);
  });

  it('go to the address for papers while nobody buys for the customer', async () => {
    await pubBuyers({ active: false });
    const { body } = await sent();
    await pubBuyers({ active: true });
    expect((await mailsOf(body.id)).map(({ toAddress }) => toAddress)).toEqual(['test.pub@example.test']);
  });

  it('are sent once, and only as they were read', async () => {
    const draft = await create(market.rep);
    expect((await send(draft.body.id, 9)).status).toBe(412);
    expect((await send(draft.body.id, 1)).body).toMatchObject({ state: 'sent', rowVersion: 2 });
    expect((await send(draft.body.id, 2)).problem).toMatchObject({ status: 409, code: 'move-not-allowed' });
  });

  it("give the buyer's next price check their price once accepted, on their days and for their choices only", async () => {
    const { body } = await sent();
    expect(await shoulderPrice(market.pubBuyer, '2026-12-04')).toBe('base 1045/kg');
    const accepted = await accept(market.pubBuyer, body.id, body.rowVersion);
    expect(accepted.body).toMatchObject({ state: 'accepted', decidedBy: 'Paul Pub' });
    expect(await shoulderPrice(market.pubBuyer, '2026-12-01')).toBe('base 1045/kg');
    expect(await shoulderPrice(market.pubBuyer, '2026-12-02')).toBe('agreement 7400/case');
    expect(await shoulderPrice(market.pubBuyer, '2026-12-31')).toBe('agreement 7400/case');
    expect(await shoulderPrice(market.pubBuyer, '2027-01-01')).toBe('base 1045/kg');
    expect(await shoulderPrice(market.pubBuyer, '2026-12-04', '6')).toBe('base 1000/kg');
    expect(await shoulderPrice(market.hotelBuyer, '2026-12-04')).toBe('group 995/kg');
  });

  it('cut an older agreement to the days before and after', async () => {
    const { body } = await sent({
      pricesFrom: '2026-12-10',
      pricesUntil: '2026-12-19',
      answerBy: '2026-12-11',
      lines: [
        { specificationId: market.shoulder.specificationId, chosen: { trim: '3' }, basis: 'case', priceMinor: 7_200 },
      ],
    });
    await accept(market.pubBuyer, body.id, body.rowVersion);
    expect(await agreedDays()).toEqual([
      { valid: '[2026-12-02,2026-12-10)', priceMinor: 7_400 },
      { valid: '[2026-12-10,2026-12-20)', priceMinor: 7_200 },
      { valid: '[2026-12-20,2027-01-01)', priceMinor: 7_400 },
    ]);
  });

  it('are answered once: a second answer is a conflict that says so, and changes nothing', async () => {
    const { body } = await sent();
    const both = await Promise.all([1, 2].map(() => accept(market.pubBuyer, body.id, body.rowVersion)));
    expect(both.map(({ status }) => status).sort()).toEqual([200, 409]);
    const late = await house.call(market.pubBuyer, declineQuote, { params: { quoteId: body.id }, ifMatch: 3 });
    expect(late.problem).toMatchObject({ status: 409, code: 'quote-answered' });
    expect(late.problem.detail).toContain('accepted');
  });

  it('can be declined, and then agree nothing', async () => {
    const before = await agreedDays();
    const { body } = await sent();
    const declined = await house.call(market.pubBuyer, declineQuote, {
      params: { quoteId: body.id },
      ifMatch: body.rowVersion,
    });
    expect(declined.body.state).toBe('declined');
    expect((await accept(market.pubBuyer, body.id, declined.body.rowVersion)).problem.code).toBe('quote-answered');
    expect(await agreedDays()).toEqual(before);
  });

  it('expire on the day after the last one for an answer, by the clock and by the job', async () => {
    const { body } = await sent();
    house.clock.set(new Date('2026-12-12T00:30:00Z'));
    const late = await accept(market.pubBuyer, body.id, body.rowVersion);
    expect(late.problem).toMatchObject({ status: 409, code: 'quote-expired' });
    await Promise.all(pricingPeriodic(parts).map((job) => job.run(house.jobs)));
    const now = await house.call(market.pubBuyer, getQuote, { params: { quoteId: body.id } });
    expect(now.body).toMatchObject({ state: 'expired', rowVersion: 3 });
    expect((await accept(market.pubBuyer, body.id, 3)).problem.code).toBe('quote-expired');
  });

  it('are answered by buyers, written by reps', async () => {
    const { body } = await sent();
    expect((await accept(market.rep, body.id, body.rowVersion)).status).toBe(403);
    expect((await create(market.pubBuyer)).status).toBe(403);
  });

  it.each([
    ['a negative price', { basis: 'kg', priceMinor: -1 }, '/lines/0/priceMinor'],
    ['a zero price', { basis: 'kg', priceMinor: 0 }, '/lines/0/priceMinor'],
    ['a choice that is none', { basis: 'kg', priceMinor: 900, chosen: { trim: '99' } }, '/lines/0/chosen/trim'],
  ] as const)('refuse %s and say where', async (_what, line, pointer) => {
    const { specificationId } = market.shoulder;
    const { problem } = await create(market.rep, { lines: [{ specificationId, ...line }] });
    expect(problem.status).toBe(422);
    expect(problem.errors.map((error) => error.pointer)).toEqual([pointer]);
  });

  it('refuse the same choices twice, also when one is the default left out', async () => {
    const line = { specificationId: market.shoulder.specificationId, basis: 'kg', priceMinor: 900 } as const;
    const { problem } = await create(market.rep, { lines: [line, { ...line, chosen: { trim: '6' } }] });
    expect(problem).toMatchObject({ status: 422, code: 'quote-line-twice', errors: [{ pointer: '/lines/1' }] });
  });

  it('are listed newest first, a page at a time, by state', async () => {
    const first = await house.call(market.rep, listQuotes, { query: { limit: 3 } });
    const numbers = first.body.items.map(({ number }) => number);
    expect(numbers).toEqual([...numbers].sort((one, other) => other - one));
    const cursor = first.body.nextCursor ?? '';
    const second = await house.call(market.rep, listQuotes, { query: { limit: 3, cursor } });
    expect(second.body.items[0]?.number).toBeLessThan(numbers[2] ?? 0);
    const accepted = await house.call(market.rep, listQuotes, { query: { state: 'accepted' } });
    expect(new Set(accepted.body.items.map(({ state }) => state))).toEqual(new Set(['accepted']));
    const forged = Buffer.from('["x"]').toString('base64url');
    expect((await house.call(market.rep, listQuotes, { query: { cursor: forged } })).status).toBe(422);
  });
});
