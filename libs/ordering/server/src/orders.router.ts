import { cancelOrder, getOrder, listOrders, placeOrder } from '@seamwright/ordering/contracts';
import {
  implement,
  implementOnce,
  inTransaction,
  notFound,
  pageFrom,
  readCursor,
  type Implementation,
} from '@seamwright/shared/server';
import { id, instant } from '@seamwright/shared/contracts';
import { RefusalError } from '@seamwright/shared/util';
import { z } from 'zod';
import { cancelOrder as cancel } from './cancel-order';
import { newestOrders } from './orders.repository';
import { placeOrder as place } from './place-order';
import type { OrderingParts } from './ports';
import { presentOrder, presentOrders } from './present-order';

export function ordersImplementations(parts: OrderingParts): Implementation[] {
  const { cards, clock, timeZone } = parts;
  return [
    implementOnce(placeOrder, {
      make: (tx, { now, caller }, { body }) => place(tx, { now, caller }, parts, body),
      afterCommit: async ({ database, log }, orderId, { body }) => {
        if (body.settlement !== 'card') return;
        // What was committed stands: a hold that failed here is asked for again, and the order shows how it stands.
        await cards
          .hold({ database, clock, log }, orderId)
          .catch((error: unknown) => log.error({ err: error, orderId }, 'the card was not held'));
      },
      present: (tx, context, id) => presentOrder(tx, context, parts, id),
    }),
    implement(listOrders, ({ database, caller, now }, { query }) =>
      inTransaction(database, caller, async (tx) => {
        const { limit, cursor, ...filters } = query;
        const orders = await newestOrders(tx, { ...filters, limit, after: cursor ? readPlace(cursor) : null });
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
  ];
}

/** A cursor of the right shape that was written for another list names no instant or no order. */
function readPlace(cursor: string): { placedAt: string; id: string } {
  const [placedAt, orderId] = readCursor(cursor, 2);
  const read = z.strictObject({ placedAt: instant, id }).safeParse({ placedAt, id: orderId });
  if (!read.success) throw new RefusalError({ code: 'invalid', params: {}, pointer: '/cursor' });
  return read.data;
}
