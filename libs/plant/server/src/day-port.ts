import type { DayPort } from '@seamwright/ordering/server';
import { isClosedToOrders } from '@seamwright/plant/domain';
import { dayForOrders, daysClosedToOrders } from './cutting-days.repository';
import { fitCalendar } from './fit-calendar';

/** Tells ordering whether a day is closed, so that no order slips in while the planner closes it. */
export const cuttingDayPort: DayPort = {
  isClosed: async (tx, day) => isClosedToOrders((await dayForOrders(tx, day)).state),
  closedDays: daysClosedToOrders,
  calendarChanged: fitCalendar,
};
