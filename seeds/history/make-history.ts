import type { CutNode } from '@seamwright/catalogue/domain';
import { closeCuttingDay, finishCuttingDay, getCuttingDay, releaseCuttingDay } from '@seamwright/plant/contracts';
import type { Caller } from '@seamwright/shared/server';
import { addDays, weekdayOf, type PlantDate } from '@seamwright/shared/util';
import type { Chance } from '../chance';
import type { Desk } from '../desk';
import type { SeededPeople } from '../people/seed-people';
import { ZONES } from '../scenario/calendar';
import { CUSTOMERS, type DemoCustomer, type DemoSite } from '../scenario/customers';
import { receiveWeek } from '../stock/seed-lots';
import type { Till } from '../money/till';
import { EARLY_QUOTES, TODAYS_QUOTES, type DemoQuote } from '../scenario/quotes';
import { at, daysOfHistory, isWorkingDay, startOfHistory } from './history-days';
import { orderAsUsual } from './order-as-usual';
import { packDay } from './pack-day';
import { writeQuotes } from './write-quotes';

interface History {
  readonly desk: Desk;
  readonly chance: Chance;
  readonly people: SeededPeople;
  readonly callers: ReadonlyMap<string, Caller>;
  readonly nodes: ReadonlyMap<string, CutNode>;
  /** Ids by code. */
  readonly specificationIds: ReadonlyMap<string, string>;
  readonly till: Till;
  readonly anchor: PlantDate;
  /** Each step says what it did. */
  readonly say: (line: string) => void;
}

const ORDERING_PERCENT = 32;
const SATURDAY = 6;

/**
 * Plays the weeks up to the anchor day by day: stock comes in, customers order, the day is closed, cut, packed, invoiced
 * and paid. The anchor's own deliveries are on the floor with one order left to pack; the next day's are open.
 */
export async function makeHistory(history: History): Promise<void> {
  const { desk, anchor, nodes, chance } = history;
  const planner = person(history, 'petra');
  await quote(history, startOfHistory(anchor), EARLY_QUOTES);
  for (const day of daysOfHistory(anchor)) {
    await moveTo(history, day, '05:30');
    await receiveWeek(desk, planner, nodes, day, chance);
    if (day === anchor) break;
    await playDay(history, day, deliveriesCutOn(day));
    await history.till.endOfDay(day, addDays(day, 7) > anchor);
  }
  await moveTo(history, anchor, '09:00');
  await quote(history, anchor, TODAYS_QUOTES);
  for (const delivery of deliveriesCutOn(anchor)) await takeOrders(history, delivery, 3);
  await desk.comeRound();
}

/** What is cut on a day goes out on the next; on a Friday, on Saturday and Monday. Nothing is cut at the weekend. */
function deliveriesCutOn(day: PlantDate): PlantDate[] {
  if (!isWorkingDay(day)) return [];
  const next = addDays(day, 1);
  return weekdayOf(next) === SATURDAY ? [next, addDays(day, 3)] : [next];
}

/** Orders come in before noon, the days are closed at cut-off and sent to the floor, and packed by the evening. */
async function playDay(history: History, day: PlantDate, deliveries: readonly PlantDate[]): Promise<void> {
  const { desk, chance, anchor } = history;
  const planner = person(history, 'petra');
  const read = (deliveryDay: PlantDate) => desk.call(planner, getCuttingDay, { params: { deliveryDay } });
  const move = async (deliveryDay: PlantDate, endpoint: typeof closeCuttingDay) =>
    desk.call(planner, endpoint, { params: { deliveryDay }, ifMatch: (await read(deliveryDay)).rowVersion });

  await moveTo(history, day, '10:15');
  const ordered: [PlantDate, number][] = [];
  for (const delivery of deliveries) {
    const count = await takeOrders(history, delivery);
    if (count > 0) ordered.push([delivery, count]);
  }
  await moveTo(history, day, '16:05');
  for (const [delivery] of ordered) {
    await move(delivery, closeCuttingDay);
    await move(delivery, releaseCuttingDay);
  }
  await moveTo(history, day, '18:40');
  for (const [delivery, count] of ordered) {
    const onTheFloor = delivery === anchor;
    await packDay(desk, person(history, 'femi'), chance, { deliveryDay: delivery, leave: onTheFloor ? 1 : 0 });
    await desk.settle();
    if (!onTheFloor) await move(delivery, finishCuttingDay);
    history.say(`${delivery}: ${count} orders cut, packed and invoiced`);
  }
}

/** Some of the customers whose zone is delivered to order as usual, `least` of them at any rate; gives how many did. */
async function takeOrders(history: History, deliveryDay: PlantDate, least = 0): Promise<number> {
  const { desk, chance, people, till } = history;
  const able = CUSTOMERS.flatMap((customer) => {
    const [site] = customer.sites;
    return site && delivers(site, deliveryDay) ? [{ customer, site }] : [];
  });
  const ordering = able.filter(() => chance.happens(ORDERING_PERCENT));
  // The restaurant orders for the open day herself, once somebody plays her.
  const wanted = least > 0 ? able.filter(({ customer }) => customer.key !== 'ladle').slice(0, least) : ordering;
  for (const { customer, site } of wanted) {
    await orderAsUsual(desk, chance, {
      customer,
      siteId: people.sites.get(site.key) ?? '',
      buyer: person(history, buyerOf(customer)),
      cardId: customer.settlement === 'card' ? await till.cardOf(customer.key) : null,
      deliveryDay,
    });
  }
  await desk.settle();
  return wanted.length;
}

const quote = (history: History, day: PlantDate, quotes: readonly DemoQuote[]): Promise<void> =>
  writeQuotes(quotes, {
    desk: history.desk,
    day,
    person: (key) => person(history, key),
    customerId: (key) => history.people.customers.get(key) ?? '',
    buyerOf: (key) => person(history, buyerOf(CUSTOMERS.find((customer) => customer.key === key))),
    specificationId: (code) => history.specificationIds.get(code) ?? '',
  });

const delivers = (site: DemoSite, day: PlantDate): boolean =>
  (ZONES[site.zone].weekdays as readonly number[]).includes(weekdayOf(day));

const buyerOf = (customer: DemoCustomer | undefined): string => customer?.buyers[0]?.key ?? '';

function person({ callers }: History, key: string): Caller {
  const caller = callers.get(key);
  if (!caller) throw new Error(`There is nobody called "${key}" in the scenario`);
  return caller;
}

async function moveTo({ desk, till }: History, day: PlantDate, time: string): Promise<void> {
  const instant = at(day, time);
  desk.clock.set(instant);
  await till.moveTo(instant);
}
