import { addCard, getInvoice, listCards, listInvoices, listPayments, removeCard } from '@seamwright/accounts/contracts';
import { cancelOrder } from '@seamwright/ordering/contracts';
import { inTransaction, system } from '@seamwright/shared/server';
import { FakeProcessor, openAccountsHouse, type AccountsHouse } from '@seamwright/accounts/server/testing';

let house: AccountsHouse;
let processor: FakeProcessor;

beforeAll(async () => {
  let now = new Date('2026-12-01T12:00:00Z');
  processor = new FakeProcessor(() => now);
  house = await openAccountsHouse(processor);
  const set = house.clock.set.bind(house.clock);
  house.clock.set = (instant) => {
    now = instant;
    set(instant);
  };
});
afterAll(() => house.close());

const paymentOf = async (orderId: string) => {
  const { body } = await house.call(house.accountant, listPayments, { query: { orderId } });
  return body.items[0];
};
const invoiceOf = async (orderNumber: number) => {
  const { body } = await house.call(house.accountant, listInvoices, { query: {} });
  const item = body.items.find(({ order }) => order.number === orderNumber);
  if (!item) return null;
  return (await house.call(house.accountant, getInvoice, { params: { invoiceId: item.id } })).body;
};

describe('cards', () => {
  it('keeps a card, shows it to its customer only, and forgets it', async () => {
    const card = await house.keepCard(house.heron.buyer);
    expect(card).toMatchObject({ brand: 'visa', last4: '4242', expires: '12/27' });
    const others = await house.call(house.quayside.buyer, listCards, {});
    expect(others.body.items).toEqual([]);
    const stranger = await house.call(house.quayside.buyer, removeCard, { params: { cardId: card.id } });
    expect(stranger.status).toBe(404);

    const gone = await house.call(house.heron.buyer, removeCard, { params: { cardId: card.id } });
    expect(gone.status).toBe(204);
    expect((await house.call(house.heron.buyer, listCards, {})).body.items).toEqual([]);
    expect(processor.kept.size).toBe(0);
  });

  it('says why a card can not be kept, again on a repeat', async () => {
    const body = { methodId: 'pm_card_visa_chargeDeclinedInsufficientFunds' };
    const first = await house.call(house.heron.buyer, addCard, { body, idempotencyKey: 'refused-card' });
    const again = await house.call(house.heron.buyer, addCard, { body, idempotencyKey: 'refused-card' });
    expect(first.problem).toMatchObject({ status: 422, code: 'card-refused' });
    expect(first.problem.detail).toContain('not enough money');
    expect(again.problem.code).toBe('card-refused');
  });

  it('keeps a card whose answer was lost, when it comes round', async () => {
    processor.breakNext('saveCard', 'lost');
    const body = { methodId: 'pm_card_visa' };
    const lost = await house.call(house.quayside.buyer, addCard, { body });
    expect(lost.problem).toMatchObject({ status: 409, code: 'card-not-added-yet' });
    house.clock.set(new Date('2026-12-01T12:01:00Z'));
    await house.comeRound();
    expect((await house.call(house.quayside.buyer, listCards, {})).body.items).toHaveLength(1);
  });
});

describe('an order by card', () => {
  it('is confirmed when the card is held, and charged for what was packed', async () => {
    const card = await house.keepCard(house.heron.buyer);
    const placed = await house.place({ cardId: card.id });
    expect(placed).toMatchObject({ stage: 'confirmed', payment: { state: 'pre-authorised', holdMinor: 7706 } });
    await house.pack(placed.id);
    await house.drain();
    // 2.800 kg × £24.00 = £67.20, delivery £6.50, no tax on raw meat.
    expect(await paymentOf(placed.id)).toMatchObject({ state: 'captured', capturedMinor: 7370, letGoMinor: 336 });
    expect(await invoiceOf(placed.number)).toMatchObject({ totalMinor: 7370, paidMinor: 7370, standing: 'paid' });
    await house.drain();
    expect(processor.calls.filter(({ deed }) => deed === 'capture')).toHaveLength(1);
  });

  it('stays waiting with the reason when the card is declined', async () => {
    const card = await house.keepCard(house.heron.buyer, 'pm_card_chargeCustomerFail');
    const placed = await house.place({ cardId: card.id });
    expect(placed).toMatchObject({
      stage: 'waiting',
      waitingFor: ['payment'],
      payment: { state: 'declined', declineCode: 'generic_decline' },
    });
  });

  it('waits for the bank, and is confirmed once its holder has confirmed, though no webhook came', async () => {
    const card = await house.keepCard(house.heron.buyer, 'pm_card_authenticationRequired');
    const placed = await house.place({ cardId: card.id });
    const waiting = await paymentOf(placed.id);
    expect(waiting).toMatchObject({ state: 'needs-action', actionUrl: 'https://bank.example.test/confirm' });
    processor.turn(waiting?.processorIntentId ?? '', 'held');
    house.clock.set(new Date('2026-12-01T12:03:00Z'));
    await house.comeRound();
    expect(await house.order(placed.id)).toMatchObject({ stage: 'confirmed', payment: { state: 'pre-authorised' } });
    expect(await paymentOf(placed.id)).toMatchObject({ actionUrl: null });
  });

  it.each(['lost', 'silent'] as const)('is held once when the answer to the hold was %s', async (fault) => {
    const card = await house.keepCard(house.heron.buyer);
    const before = processor.intents.size;
    processor.breakNext('hold', fault);
    const placed = await house.place({ cardId: card.id });
    expect(placed).toMatchObject({ stage: 'waiting', payment: { state: 'started' } });
    house.clock.set(new Date((await house.clock.now()).getTime() + 60_000));
    await house.comeRound();
    await house.comeRound();
    expect(await house.order(placed.id)).toMatchObject({ stage: 'confirmed' });
    expect(processor.intents.size).toBe(before + 1);
  });

  it('is given up when no answer came for a day, since the key would not hold any more', async () => {
    const card = await house.keepCard(house.heron.buyer);
    processor.breakNext('hold', 'silent');
    const placed = await house.place({ cardId: card.id });
    const placedAt = await house.clock.now();
    house.clock.set(new Date(placedAt.getTime() + 24 * 3_600_000));
    await house.comeRound();
    house.clock.set(placedAt);
    expect(await paymentOf(placed.id)).toMatchObject({ state: 'failed', declineCode: 'no-answer' });
  });

  it('leaves a balance due when packing comes to more than is held', async () => {
    const card = await house.keepCard(house.heron.buyer);
    const placed = await house.place({ cardId: card.id });
    await house.pack(placed.id, 300);
    await house.drain();
    // 3.000 kg × £24.00 + £6.50 = £78.50; £77.06 was held.
    expect(await paymentOf(placed.id)).toMatchObject({ state: 'captured', capturedMinor: 7706, letGoMinor: 0 });
    expect(await invoiceOf(placed.number)).toMatchObject({ totalMinor: 7850, paidMinor: 7706, standing: 'part-paid' });
  });

  it('lets the hold go when it is cancelled', async () => {
    const card = await house.keepCard(house.heron.buyer);
    const placed = await house.place({ cardId: card.id });
    const params = { orderId: placed.id };
    await house.call(house.heron.buyer, cancelOrder, { params, body: {}, ifMatch: placed.rowVersion });
    await house.drain();
    expect(await paymentOf(placed.id)).toMatchObject({ state: 'released', letGoMinor: 7706, capturedMinor: 0 });
  });

  it('lets a hold go at once whose answer came after the order was cancelled', async () => {
    const card = await house.keepCard(house.heron.buyer);
    processor.breakNext('hold', 'lost');
    const placed = await house.place({ cardId: card.id });
    const params = { orderId: placed.id };
    await house.call(house.heron.buyer, cancelOrder, { params, body: {}, ifMatch: placed.rowVersion });
    await house.drain();
    for (let round = 0; round < 2; round++) {
      house.clock.set(new Date((await house.clock.now()).getTime() + 60_000));
      await house.comeRound();
    }
    expect(await paymentOf(placed.id)).toMatchObject({ state: 'released' });
    expect((await house.order(placed.id)).stage).toBe('cancelled');
  });

  it('is invoiced in full when its hold ran out before packing', async () => {
    const card = await house.keepCard(house.heron.buyer);
    const placed = await house.place({ cardId: card.id });
    const payment = await paymentOf(placed.id);
    processor.turn(payment?.processorIntentId ?? '', 'canceled');
    await house.pack(placed.id);
    await house.drain();
    expect(await paymentOf(placed.id)).toMatchObject({ state: 'failed', declineCode: 'hold-ended' });
    expect(await invoiceOf(placed.number)).toMatchObject({ totalMinor: 7370, paidMinor: 0, standing: 'open' });
  });

  it("refuses another customer's card", async () => {
    const card = await house.keepCard(house.quayside.buyer);
    await expect(house.place({ cardId: card.id })).rejects.toThrow('not-found');
  });
});

describe('an order on account', () => {
  it('is invoiced with nothing taken, and mailed with its paper', async () => {
    const placed = await house.place();
    await house.pack(placed.id);
    await house.drain();
    const invoice = await invoiceOf(placed.number);
    expect(invoice).toMatchObject({ totalMinor: 7370, paidMinor: 0, payment: null });
    const mails = await inTransaction(house.database, system('job'), (tx) =>
      tx.selectFrom('mails').selectAll().where('dedupeKey', '=', `invoice:${invoice?.id}`).execute(),
    );
    expect(mails).toHaveLength(1);
    expect(mails[0]?.documentId).not.toBeNull();
    expect(mails[0]?.bodyText).toContain('£73.70');
  });
});
