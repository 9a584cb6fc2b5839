import { orderById, releaseOrdersOfDay } from '@seamwright/ordering/server';
import { inTransaction, system, type Subscriber } from '@seamwright/shared/server';
import { sharedDay } from './cutting-days.repository';

const STILL_CUTTING = ['closed', 'planned', 'released'];

/** An order that is confirmed only after its day was closed (its bank took its time) is released as soon as it is. */
export const releaseLateOrders: Subscriber = {
  name: 'plant-release-late-orders',
  events: ['order-confirmed'],
  handle: ({ database, clock }, { subjectId }) =>
    inTransaction(database, system('job'), async (tx) => {
      const { deliveryDay, cancelledAt } = await orderById(tx, subjectId);
      const day = await sharedDay(tx, deliveryDay);
      if (!day || cancelledAt || !STILL_CUTTING.includes(day.state)) return;
      await releaseOrdersOfDay(tx, { now: await clock.now(), day: deliveryDay });
    }),
};
