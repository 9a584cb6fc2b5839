import type { OrderWithLines } from '@seamwright/ordering/domain';
import { orderById, placeOrder, type CardPort } from '@seamwright/ordering/server';
import { addTestMarket, type TestMarket } from '@seamwright/pricing/server/testing';
import { inTransaction, ProblemError, system, type Caller, type Subscriber } from '@seamwright/shared/server';
import { openTestHouse, TEST_NOW, type TestHouse } from '@seamwright/shared/server/testing';
import { newId, ok, RefusalError, type Result } from '@seamwright/shared/util';
import { cuttingDayPort, plantImplementations, plantSubscribers } from '../../src/index';

export interface TestPlant {
  readonly house: TestHouse;
  readonly market: TestMarket;
  readonly planner: Caller;
  readonly packer: Caller;
  readonly hotelSiteId: string;
  readonly pubSiteId: string;
  /** Ten shoulders of 5 kg, use by 10 December. */
  readonly shoulderLotId: string;
  /** Four striploins of 6 kg, use by 5 December, and eight more, use by 12 December. */
  readonly striploinLotId: string;
  readonly laterStriploinLotId: string;
  /** Places an order for the pub (or the hotel) by its own buyer: on account, or with a card whose payment it waits for. */
  place(
    lines: readonly { code: string; count: number; unit?: 'piece' | 'case'; chosen?: Record<string, string> }[],
    over?: { by?: 'hotel' | 'pub'; deliveryDay?: string; cardId?: string },
  ): Promise<Result<OrderWithLines>>;
}

/** Thursday: cut on Wednesday 2 December. */
export const DELIVERY_DAY = '2026-12-03';
export const TIME_ZONE = 'Europe/London';

/** Cards that are written down and never held: an order with one waits for its payment. */
const noCards: CardPort = {
  start: async () => undefined,
  hold: async () => undefined,
  stateOf: async () => new Map(),
};

/** The storeys up to the plant over a fresh database, with a market, a zone that is delivered to every working day, and lots. */
export async function openTestPlant(more: { readonly subscribers?: readonly Subscriber[] } = {}): Promise<TestPlant> {
  const house = await openTestHouse({
    implementations: () => plantImplementations({ timeZone: TIME_ZONE }),
    subscribers: [...plantSubscribers, ...(more.subscribers ?? [])],
  });
  const market = await addTestMarket(house.database, TEST_NOW);
  const sites = await addSites(house, market);
  return {
    house,
    market,
    ...sites,
    ...(await addStaff(house)),
    ...(await addLots(house, market)),
    place: (lines, { by = 'pub', deliveryDay = DELIVERY_DAY, cardId } = {}) => {
      const caller = by === 'pub' ? market.pubBuyer : market.hotelBuyer;
      const wanted = {
        siteId: by === 'pub' ? sites.pubSiteId : sites.hotelSiteId,
        deliveryDay,
        settlement: cardId ? ('card' as const) : ('account' as const),
        cardId,
        customerReference: '',
        note: '',
        lines: lines.map(({ code, count, unit = 'piece', chosen = {} }) => ({
          code,
          chosen,
          quantity: { unit, count },
          whenShort: 'send-what-there-is' as const,
          note: '',
        })),
      };
      const parts = { timeZone: TIME_ZONE, cards: noCards, days: cuttingDayPort };
      return placed(() =>
        inTransaction(house.database, caller, async (tx) =>
          orderById(tx, await placeOrder(tx, { now: TEST_NOW, caller }, parts, wanted)),
        ),
      );
    },
  };
}

async function placed(placing: () => Promise<OrderWithLines>): Promise<Result<OrderWithLines>> {
  try {
    return ok(await placing());
  } catch (error) {
    if (error instanceof ProblemError || error instanceof RefusalError) return { ok: false, refusal: error.refusal };
    throw error;
  }
}

async function addStaff({ database }: TestHouse): Promise<{ planner: Caller; packer: Caller }> {
  const [plannerId, packerId] = [newId(), newId()];
  await inTransaction(database, system('seed'), (tx) =>
    tx
      .insertInto('people')
      .values([
        { id: plannerId, name: 'Pia Planner', email: 'pia@example.test', roles: ['planner'], createdAt: TEST_NOW },
        { id: packerId, name: 'Per Packer', email: 'per@example.test', roles: ['floor'], createdAt: TEST_NOW },
      ])
      .execute(),
  );
  return {
    planner: { kind: 'staff', personId: plannerId, roles: ['planner'], customers: '*' },
    packer: { kind: 'staff', personId: packerId, roles: ['floor'], customers: '*' },
  };
}

async function addSites({ database }: TestHouse, { hotelId, pubId }: TestMarket) {
  const [hotelSiteId, pubSiteId, zoneId] = [newId(), newId(), newId()];
  await inTransaction(database, system('seed'), async (tx) => {
    const site = { address: '1 Test Street', postcode: 'TS1 1AA' };
    await tx
      .insertInto('sites')
      .values([
        { id: hotelSiteId, customerId: hotelId, name: 'Hotel kitchen', ...site },
        { id: pubSiteId, customerId: pubId, name: 'Pub kitchen', ...site },
      ])
      .execute();
    await tx
      .insertInto('deliveryZones')
      .values({
        id: zoneId,
        name: 'Test zone',
        weekdays: [1, 2, 3, 4, 5],
        cutOffTime: '16:00',
        leadDays: 1,
        deliveryChargeMinor: 500,
      })
      .execute();
    await tx
      .insertInto('siteZones')
      .values([
        { siteId: hotelSiteId, customerId: hotelId, zoneId },
        { siteId: pubSiteId, customerId: pubId, zoneId },
      ])
      .execute();
  });
  return { hotelSiteId, pubSiteId };
}

async function addLots({ database }: TestHouse, { shoulder, steak }: TestMarket) {
  const [shoulderLotId, striploinLotId, laterStriploinLotId] = [newId(), newId(), newId()];
  const lot = (id: string, code: string, nodeId: string, useBy: string, pieces: number, each: number) => ({
    id,
    code,
    nodeId,
    useBy,
    supplier: 'Test Farms',
    killDate: '2026-11-24',
    receivedOn: '2026-11-30',
    receivedPieces: pieces,
    receivedGrams: pieces * each,
    state: 'released',
    origin: JSON.stringify({ bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse: 'UK 9999' }),
  });
  await inTransaction(database, system('seed'), (tx) =>
    tx
      .insertInto('lots')
      .values([
        lot(shoulderLotId, 'L-1', shoulder.sourceNodeId, '2026-12-10', 10, 5_000),
        lot(striploinLotId, 'B-1', steak.sourceNodeId, '2026-12-05', 4, 6_000),
        lot(laterStriploinLotId, 'B-2', steak.sourceNodeId, '2026-12-12', 8, 6_000),
      ])
      .execute(),
  );
  return { shoulderLotId, striploinLotId, laterStriploinLotId };
}
