import { sql } from 'kysely';
import { checkOtherCard, orderTotals } from '@seamwright/ordering/domain';
import { conflict, emit, stale, type Tx } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { packsOfOrders } from '@seamwright/stock/server';
import { lockOrder, orderById } from './orders.repository';
import type { OrderingParts } from './ports';
import { stageOf } from './present-order';

export interface Paying {
  readonly now: Date;
  readonly orderId: string;
  readonly rowVersion: number;
  readonly cardId: string;
}

/**
 * Writes down that another card is to be held for an order's upper bound, to be asked for after the commit. Refuses
 * what `checkOtherCard` does, and with `too-late-to-confirm` (day, number) once the day takes no more orders. Emits
 * `order-changed`.
 */
export async function payOrderWith(
  tx: Tx,
  { now, orderId, rowVersion, cardId }: Paying,
  { timeZone, days, cards }: Pick<OrderingParts, 'timeZone' | 'days' | 'cards'>,
): Promise<void> {
  const { deliveryDay } = await orderById(tx, orderId);
  // The day before the order, as whoever closes the day does.
  const isClosed = await days.isClosed(tx, deliveryDay);
  const order = await lockOrder(tx, orderId);
  if (order.rowVersion !== rowVersion) throw stale();
  const today = plantToday(now, timeZone);
  const stage = stageOf(order, await packsOfOrders(tx, [orderId]), today);
  const last = (await cards.stateOf(tx, [orderId])).get(orderId);
  const checked = checkOtherCard({ stage, waitingFor: order.waitingFor, cardState: last?.state ?? null });
  if (!checked.ok) throw conflict(checked.refusal.code, checked.refusal.params);
  if (isClosed || deliveryDay < today)
    throw conflict('too-late-to-confirm', { day: deliveryDay, number: order.number });
  const { customerId, currency, lines, deliveryChargeMinor, deliveryTaxPpm } = order;
  const holdMinor = orderTotals(lines, deliveryChargeMinor, deliveryTaxPpm).max.totalMinor;
  await cards.start(tx, { now, orderId, customerId, holdMinor, currency, cardId });
  await tx
    .updateTable('orders')
    .set({ rowVersion: sql`row_version + 1` })
    .where('id', '=', orderId)
    .execute();
  await emit(tx, now, { type: 'order-changed', subjectId: orderId, customerId });
}
