import { cancelOrder, getOrder, listOrders, payOrderWith, placeOrder } from '@seamwright/ordering/contracts';
import {
  customersOf,
  implement,
  implementOnce,
  inTransaction,
  notFound,
  pageFrom,
  readCursor,
  type Implementation,
  type RequestContext,
} from '@seamwright/shared/server';
import { id, instant } from '@seamwright/shared/contracts';
import * as z from 'zod';
import { cancelOrder as cancel } from './cancel-order';
import { newestOrders } from './orders.repository';
import { payOrderWith as payWith } from './pay-order-with';
import { placeOrder as place } from './place-order';
import type { OrderingParts } from './ports';
import { presentOrder, presentOrders } from './present-order';

export function ordersImplementations(parts: OrderingParts): Implementation[] {
  const { cards, clock, timeZone } = parts;
  // What was committed stands: a hold that failed here is asked for again, and the order shows how it stands.
  const hold = ({ database, log }: Pick<RequestContext, 'database' | 'log'>, orderId: string): Promise<void> =>
    cards
      .hold({ database, clock, log }, orderId)
      .catch((error: unknown) => log.error({ err: error, orderId }, 'the card was not held'));
  return [
    implementOnce(placeOrder, {
      make: (tx, { now, caller }, { body }) => place(tx, { now, caller }, parts, body),
      afterCommit: async (context, orderId, { body }) => {
        if (body.settlement === 'card') await hold(context, orderId);
      },
      present: (tx, context, id) => presentOrder(tx, context, parts, id),
    }),
    implement(listOrders, ({ database, caller, now }, { query }) =>
      inTransaction(database, caller, async (tx) => {
        const { limit, cursor, ...filters } = query;
        const after = cursor ? readPlace(cursor) : null;
        const orders = await newestOrders(tx, { ...filters, limit, after, customers: customersOf(caller) });
        const shown = await presentOrders(tx, { now, caller }, parts, orders);
        return pageFrom(
          orders,
          limit,
          (order) => [order.placedAt.toISOString(), order.id],
          (order) => {
            const item = shown.get(order.id);
            if (!item) throw notFound();
            return item;
          },
        );
      }),
    ),
    implement(getOrder, (context, { params }) =>
      inTransaction(context.database, context.caller, (tx) => presentOrder(tx, context, parts, params.orderId)),
    ),
    implement(cancelOrder, (context, { params, body }) => {
      const { database, caller, now, ifMatch: rowVersion } = context;
      return inTransaction(database, caller, async (tx) => {
        await cancel(tx, { now, caller, timeZone, orderId: params.orderId, rowVersion, reason: body.reason });
        return presentOrder(tx, context, parts, params.orderId);
      });
    }),
    implement(payOrderWith, async (context, { params: { orderId }, body: { cardId } }) => {
      const { database, caller, now, ifMatch: rowVersion } = context;
      await inTransaction(database, caller, (tx) => payWith(tx, { now, orderId, rowVersion, cardId }, parts));
      await hold(context, orderId);
      return inTransaction(database, caller, (tx) => presentOrder(tx, context, parts, orderId));
    }),
  ];
}

/** A cursor of the right shape that was written for another list names no instant or no order. */
function readPlace(cursor: string): { placedAt: string; id: string } {
  const [placedAt, orderId] = readCursor(cursor, z.tuple([instant, id]));
  return { placedAt, id: orderId };
}
