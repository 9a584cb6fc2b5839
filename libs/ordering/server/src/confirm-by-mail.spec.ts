import { placeOrder, type NewOrderWire } from '@seamwright/ordering/contracts';
import { openOrderingHouse, type OrderingHouse } from '@seamwright/ordering/server/testing';
import { inTransaction, personOf, system, type Caller } from '@seamwright/shared/server';

let house: OrderingHouse;
beforeAll(async () => {
  house = await openOrderingHouse();
}, 60_000);
beforeEach(() => house.clock.set(new Date('2026-12-01T12:00:00Z')));
afterAll(() => house.close());

const addressOf = (caller: Caller) => `${personOf(caller)}@example.test`;

/** Places an order and gives the addresses that its confirmation went to, with the first mail's greeting. */
async function told(by: Caller, where: Pick<NewOrderWire, 'customerId' | 'siteId'>) {
  const { body } = await house.call(by, placeOrder, {
    body: {
      ...where,
      deliveryDay: '2026-12-02',
      settlement: 'account',
      lines: [{ code: 'BF-901', quantity: { unit: 'piece', count: 10 } }],
    },
  });
  await house.drain();
  const mails = await inTransaction(house.database, system('job'), (tx) =>
    tx
      .selectFrom('mails')
      .select(['toAddress', 'bodyText', 'customerId'])
      .where('dedupeKey', 'like', `order-confirmation:${body.id}:%`)
      .orderBy('toAddress')
      .execute(),
  );
  expect(mails.every(({ customerId }) => customerId === body.customer.id)).toBe(true);
  return { to: mails.map(({ toAddress }) => toAddress), greeting: mails[0]?.bodyText.split('\n')[0] };
}

describe('the confirmation of an order', () => {
  it('goes to the buyer who placed it, and to nobody else of her house', async () => {
    const { annexeBuyer, annexeId } = house.heron;
    expect((await told(annexeBuyer, { siteId: annexeId })).to).toEqual([addressOf(annexeBuyer)]);
  });

  it('of one that the desk took goes to everybody who orders for its site', async () => {
    const { id: customerId, siteId, annexeId, buyer, annexeBuyer } = house.heron;
    expect(await told(house.rep, { customerId, siteId })).toEqual({
      to: [addressOf(buyer)],
      greeting: 'Hello Buyer of The Heron Rooms,',
    });
    expect((await told(house.rep, { customerId, siteId: annexeId })).to).toEqual(
      [buyer, annexeBuyer].map(addressOf).sort(),
    );
  });

  it('goes to the address for papers where nobody orders for the customer', async () => {
    const { id: customerId, siteId } = house.quayside;
    await inTransaction(house.database, system('seed'), (tx) =>
      tx.updateTable('people').set({ active: false }).where('customerId', '=', customerId).execute(),
    );
    expect(await told(house.rep, { customerId, siteId })).toEqual({
      to: ['papers@example.test'],
      greeting: 'Hello Quayside Canteen,',
    });
  });
});
