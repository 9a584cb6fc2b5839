import { addCard, type CardWire } from '@seamwright/accounts/contracts';
import {
  accountsImplementations,
  accountsPeriodic,
  accountsSubscribers,
  cardPort,
  type AccountsParts,
  type Processor,
} from '../../src/index';
import { getOrder, placeOrder, type OrderDetail } from '@seamwright/ordering/contracts';
import {
  markPacked,
  orderById,
  orderingImplementations,
  orderingSubscribers,
  releaseOrdersOfDay,
} from '@seamwright/ordering/server';
import { addTestTrade, type TestTrade } from '@seamwright/ordering/server/testing';
import { inTransaction, system, type Caller, type Subscriber } from '@seamwright/shared/server';
import { openTestHouse, type TestHouse } from '@seamwright/shared/server/testing';
import { newId, type PlantDate } from '@seamwright/shared/util';
import { addPack } from '@seamwright/stock/server';
import { FAKE_TARIFF } from './fake-processor';

export interface AccountsHouse extends TestHouse, TestTrade {
  readonly parts: Omit<AccountsParts, 'clock'>;
  readonly subscribers: readonly Subscriber[];
  readonly accountant: Caller;
  /** Keeps a card for the buyer of a customer. */
  keepCard(buyer: Caller, methodId?: string): Promise<CardWire>;
  /** Orders ten steaks for the next day: held at most £77.06, packed at nominal weight £73.70. */
  place(wanted?: { readonly cardId?: string; readonly buyer?: 'heron' | 'quayside' }): Promise<OrderDetail>;
  order(orderId: string): Promise<OrderDetail>;
  /** Releases the day, packs every piece of the order at this weight, and finishes packing. */
  pack(orderId: string, netGramsPerPiece?: number): Promise<void>;
  /** Runs every periodic job once. */
  comeRound(): Promise<void>;
}

export const TEST_DELIVERY_DAY = '2026-12-02' as PlantDate;

/** A house with orders and accounts over a fresh database, and the processor that is given. */
export async function openAccountsHouse(processor: Processor): Promise<AccountsHouse> {
  const parts: AccountsHouse['parts'] = {
    processor,
    timeZone: 'Europe/London',
    publicOrigin: 'http://127.0.0.1:4300',
    publishableKey: null,
    tariff: FAKE_TARIFF,
    seller: {
      name: 'Alder Row Meats',
      address: '3 Alder Row\nZZ2 2BB',
      vatNumber: 'GB 000 0000 00',
      bankDetails: 'Harbour Bank, 00-00-00, 00000000',
    },
  };
  const cards = cardPort(parts);
  const subscribers = [...orderingSubscribers({ cards }), ...accountsSubscribers(parts)];
  const days = {
    isClosed: async () => false,
    closedDays: async () => new Set<never>(),
    calendarChanged: async () => undefined,
  };
  const house = await openTestHouse({
    implementations: ({ clock }) => [
      ...orderingImplementations({ timeZone: parts.timeZone, cards, days, clock }),
      ...accountsImplementations({ ...parts, clock }),
    ],
    subscribers,
  });
  const trade = await addTestTrade(house.database, new Date('2026-11-02T09:00:00Z'));
  const accountant = await addAccountant(house);
  return {
    ...house,
    ...trade,
    parts,
    subscribers,
    accountant,
    async keepCard(buyer, methodId = 'pm_card_visa') {
      const { status, body, problem } = await house.call(buyer, addCard, { body: { methodId } });
      if (status !== 201) throw new Error(`The card was not kept: ${problem.code}`);
      return body;
    },
    async place({ cardId, buyer = 'heron' } = {}) {
      const { siteId, buyer: caller } = trade[buyer];
      const { status, body, problem } = await house.call(caller, placeOrder, {
        body: {
          siteId,
          deliveryDay: TEST_DELIVERY_DAY,
          settlement: cardId ? 'card' : 'account',
          ...(cardId ? { cardId } : {}),
          lines: [{ specificationId: trade.steak.specificationId, quantity: { unit: 'piece', count: 10 } }],
        },
      });
      if (status !== 201) throw new Error(`The order was not placed: ${problem.code}`);
      return body;
    },
    async order(orderId) {
      return (await house.call(trade.admin, getOrder, { params: { orderId } })).body;
    },
    pack: (orderId, netGramsPerPiece = 280) => pack(house, accountant, orderId, netGramsPerPiece),
    async comeRound() {
      for (const job of accountsPeriodic(parts)) await job.run(house.jobs);
    },
  };
}

async function addAccountant({ database }: TestHouse): Promise<Caller> {
  const personId: string = newId();
  const createdAt = new Date('2026-11-02T09:00:00Z');
  const person = { id: personId, email: `${personId}@example.test`, name: 'The accountant', roles: ['accounts'] };
  await inTransaction(database, system('seed'), (tx) =>
    tx
      .insertInto('people')
      .values({ ...person, createdAt })
      .execute(),
  );
  return { kind: 'staff', personId, roles: ['accounts'], customers: '*' };
}

async function pack({ database, clock }: TestHouse, by: Caller, orderId: string, grams: number): Promise<void> {
  const now = await clock.now();
  await inTransaction(database, system('seed'), async (tx) => {
    const order = await orderById(tx, orderId);
    await releaseOrdersOfDay(tx, { now, day: order.deliveryDay });
    for (const line of order.lines) {
      const { versionId, pieces, id: orderLineId } = line;
      const sums = { netGrams: pieces * grams, tareGrams: 20, inputGrams: pieces * grams * 2 };
      const whose = { customerId: order.customerId, orderId, orderLineId, versionId, lotId: null };
      await addPack(tx, { now, caller: by }, { ...whose, ...sums, pieces, outOfLimits: false, reason: null });
    }
    await markPacked(tx, { now, orderId });
  });
}
