import { conflict } from '@seamwright/shared/server';
import { openTestHouse, type TestHouse } from '@seamwright/shared/server/testing';
import { orderingImplementations, orderingSubscribers, type DayPort, type OrderingParts } from '../../src';
import { FakeCards } from './fake-cards';
import { addTestTrade, type TestTrade } from './test-trade';

export interface OrderingHouse extends TestHouse, TestTrade {
  readonly parts: Omit<OrderingParts, 'clock'>;
  readonly cards: FakeCards;
  /** Days that take no more orders. */
  readonly closedDays: Set<string>;
  /** Days on which a list is cut that is fixed. */
  readonly cutDays: Set<string>;
}

/** A test house with customers, specifications, prices and a card keeper that stands in for the real one. */
export async function openOrderingHouse(): Promise<OrderingHouse> {
  const [closedDays, cutDays] = [new Set<string>(), new Set<string>()];
  const days: DayPort = {
    isClosed: async (_tx, day) => closedDays.has(day),
    closedDays: async (_tx, asked) => new Set(asked.filter((day) => closedDays.has(day))),
    calendarChanged: async (_tx, day) => {
      if (cutDays.has(day)) throw conflict('day-being-cut', { day, delivery: day });
    },
  };
  const cards = new FakeCards();
  const parts = { timeZone: 'Europe/London', cards, days };
  const house = await openTestHouse({
    implementations: ({ clock }) => orderingImplementations({ ...parts, clock }),
    subscribers: orderingSubscribers({ cards }),
  });
  const trade = await addTestTrade(house.database, new Date('2026-11-02T09:00:00Z'));
  return { ...house, ...trade, parts, cards, closedDays, cutDays };
}
