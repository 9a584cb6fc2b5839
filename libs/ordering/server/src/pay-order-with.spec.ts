import { cancelOrder, payOrderWith, placeOrder, type OrderDetail } from '@seamwright/ordering/contracts';
import { openOrderingHouse, type FakeCard, type OrderingHouse } from '@seamwright/ordering/server/testing';
import { TEST_NOW } from '@seamwright/shared/server/testing';
import { newId } from '@seamwright/shared/util';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
afterAll(() => house.close());
beforeEach(() => {
  house.clock.set(TEST_NOW);
  house.closedDays.clear();
});

const DAY = '2026-12-03';
const card = (answer: FakeCard['answer'], customerId = house.heron.id): string => {
  const cardId: string = newId();
  house.cards.cards.set(cardId, { customerId, answer });
  return cardId;
};
const placedWith = async (cardId: string): Promise<OrderDetail> => {
  const lines = [{ code: 'BF-901', quantity: { unit: 'piece' as const, count: 10 } }];
  const body = { siteId: house.heron.siteId, deliveryDay: DAY, settlement: 'card' as const, cardId, lines };
  return (await house.call(house.heron.buyer, placeOrder, { body, idempotencyKey: newId() })).body;
};
const pay = (order: Pick<OrderDetail, 'id' | 'rowVersion'>, cardId: string, caller = house.heron.buyer) =>
  house.call(caller, payOrderWith, { params: { orderId: order.id }, ifMatch: order.rowVersion, body: { cardId } });

describe('paying an order whose card was declined with another one', () => {
  it('holds the other card for the upper bound and confirms the order', async () => {
    const waiting = await placedWith(card('declined'));
    expect(waiting).toMatchObject({ stage: 'waiting', payment: { state: 'declined' } });
    const paid = await pay(waiting, card('pre-authorised'));
    // Ten steaks at 294 g and £24.00 a kg are at most £70.56, and the delivery is £6.50.
    expect(paid.body).toMatchObject({
      stage: 'confirmed',
      waitingFor: [],
      payment: { state: 'pre-authorised', holdMinor: 7056 + 650, declineCode: null },
    });
  });

  it('leaves the order waiting when the other card is declined too, to be tried again', async () => {
    const waiting = await placedWith(card('declined'));
    const again = await pay(waiting, card('declined'));
    expect(again).toMatchObject({ status: 200, body: { stage: 'waiting', payment: { state: 'declined' } } });
    expect((await pay(again.body, card('pre-authorised'), house.rep)).body.stage).toBe('confirmed');
  });

  it('is answered with the order as it stands when the processor keeps silent', async () => {
    const waiting = await placedWith(card('declined'));
    const asked = await pay(waiting, card('lost'));
    expect(asked).toMatchObject({ status: 200, body: { stage: 'waiting', payment: { state: 'started' } } });
    expect((await pay(asked.body, card('pre-authorised'))).problem).toMatchObject({
      status: 409,
      code: 'card-still-asked',
    });
  });

  it('happens once when it is pressed twice', async () => {
    const waiting = await placedWith(card('declined'));
    const cardId = card('pre-authorised');
    const before = house.cards.holds.length;
    const answers = await Promise.all([pay(waiting, cardId), pay(waiting, cardId)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 412]);
    expect(house.cards.holds).toHaveLength(before + 1);
  });

  it('is refused for an order that waits for no card', async () => {
    const confirmed = await placedWith(card('pre-authorised'));
    expect((await pay(confirmed, card('pre-authorised'))).problem.code).toBe('order-waits-for-no-card');
    const waiting = await placedWith(card('declined'));
    const cancelled = await house.call(house.heron.buyer, cancelOrder, {
      params: { orderId: waiting.id },
      ifMatch: waiting.rowVersion,
      body: {},
    });
    expect((await pay(cancelled.body, card('pre-authorised'))).problem.code).toBe('order-waits-for-no-card');
  });

  it('is refused once the day takes no more orders', async () => {
    const waiting = await placedWith(card('declined'));
    house.closedDays.add(DAY);
    const closed = await pay(waiting, card('pre-authorised'));
    expect(closed.problem).toMatchObject({ status: 409, code: 'too-late-to-confirm' });
    expect(closed.problem.detail).toContain('Thu 3 Dec');
    house.closedDays.clear();
    house.clock.set(new Date('2026-12-04T09:00:00Z'));
    expect((await pay(waiting, card('pre-authorised'))).problem.code).toBe('too-late-to-confirm');
  });

  it('is for the customer’s own orders and own cards, at the version that was read', async () => {
    const waiting = await placedWith(card('declined'));
    expect((await pay(waiting, card('pre-authorised', house.quayside.id))).status).toBe(404);
    expect((await pay(waiting, card('pre-authorised'), house.quayside.buyer)).status).toBe(404);
    expect((await pay(waiting, card('pre-authorised'), house.heron.annexeBuyer)).status).toBe(404);
    expect((await pay({ ...waiting, rowVersion: 9 }, card('pre-authorised'))).status).toBe(412);
    const params = { orderId: waiting.id };
    const body = { cardId: card('pre-authorised') };
    expect((await house.call(house.heron.buyer, payOrderWith, { params, body })).status).toBe(428);
    expect((await pay(waiting, body.cardId)).body.stage).toBe('confirmed');
  });
});
