import { sql } from 'kysely';
import { checkAmendable } from '@seamwright/ordering/domain';
import { conflict, emit, stale, type Caller, type Tx } from '@seamwright/shared/server';
import { plantToday, RefusalError } from '@seamwright/shared/util';
import { packsOfOrders } from '@seamwright/stock/server';
import { noteChanges } from './order-changes.repository';
import { lockOrder } from './orders.repository';
import { cutOffOfOrder, stageOf } from './present-order';

export interface Cancelling {
  readonly now: Date;
  readonly caller: Caller;
  readonly timeZone: string;
  readonly orderId: string;
  readonly rowVersion: number;
  readonly reason: string;
}

/**
 * Cancels an order: the buyer until cut-off, the desk until its release and with a reason. Whoever holds a card for it
 * hears of it by `order-cancelled` and lets it go.
 */
export async function cancelOrder(tx: Tx, deed: Cancelling): Promise<void> {
  const { now, caller, timeZone, orderId, reason } = deed;
  const order = await lockOrder(tx, orderId);
  if (order.rowVersion !== deed.rowVersion) throw stale();
  const by = caller.kind === 'user' ? 'buyer' : 'desk';
  const stage = stageOf(order, await packsOfOrders(tx, [orderId]), plantToday(now, timeZone));
  const amendable = checkAmendable({ stage, cutOffAt: await cutOffOfOrder(tx, order, timeZone), now, by });
  if (!amendable.ok) throw conflict(amendable.refusal.code, amendable.refusal.params);
  if (by === 'desk' && reason === '')
    throw new RefusalError({ code: 'reason-missing', params: {}, pointer: '/reason' });
  const { numUpdatedRows } = await tx
    .updateTable('orders')
    .set({ cancelledAt: now, cancelledBecause: reason || null, rowVersion: sql`row_version + 1` })
    .where('id', '=', orderId)
    .where('rowVersion', '=', deed.rowVersion)
    .executeTakeFirst();
  if (numUpdatedRows === 0n) throw stale();
  const { customerId } = order;
  await noteChanges(tx, { now, caller }, [
    { orderId, customerId, what: 'cancelled', detail: reason ? { reason } : {} },
  ]);
  await emit(tx, now, { type: 'order-cancelled', subjectId: orderId, customerId });
}
