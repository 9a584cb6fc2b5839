import { unfinishedLines, type OrderWithLines } from '@seamwright/ordering/domain';
import { conflict, emit, type Caller, type Tx } from '@seamwright/shared/server';
import { RefusalError, type PlantDate } from '@seamwright/shared/util';
import { packsOfOrders } from '@seamwright/stock/server';
import { sql } from 'kysely';
import { noteChanges } from './order-changes.repository';
import { lockOrder, lockOrderOfLine } from './orders.repository';

const event = (type: string, { id, customerId }: { readonly id: string; readonly customerId: string }) => ({
  type,
  subjectId: id,
  customerId,
});

/**
 * Strikes one thing that an order waits for. When nothing is left it is confirmed: emits `order-confirmed`. Does
 * nothing when the order does not wait for it (any more), or was cancelled.
 */
export async function clearWaiting(
  tx: Tx,
  { now, orderId, what }: { readonly now: Date; readonly orderId: string; readonly what: 'payment' },
): Promise<void> {
  const order = await lockOrder(tx, orderId);
  if (order.cancelledAt || !order.waitingFor.includes(what)) return;
  const waitingFor = order.waitingFor.filter((each) => each !== what);
  await tx
    .updateTable('orders')
    .set({ waitingFor, rowVersion: sql`row_version + 1` })
    .where('id', '=', orderId)
    .execute();
  if (waitingFor.length > 0) return emit(tx, now, event('order-changed', order));
  await noteChanges(tx, { now, caller: null }, [{ orderId, customerId: order.customerId, what: 'confirmed' }]);
  await emit(tx, now, event('order-confirmed', order));
}

/**
 * Lets every confirmed order of a day go to the floor; those that still wait for something stay behind. Gives the ids
 * of the orders released, and is safe to repeat.
 */
export async function releaseOrdersOfDay(
  tx: Tx,
  { now, day, caller = null }: { readonly now: Date; readonly day: PlantDate; readonly caller?: Caller | null },
): Promise<string[]> {
  const released = await tx
    .updateTable('orders')
    .set({ releasedAt: now, rowVersion: sql`row_version + 1` })
    .where('deliveryDay', '=', day)
    .where('cancelledAt', 'is', null)
    .where('releasedAt', 'is', null)
    .where(sql<boolean>`cardinality(waiting_for) = 0`)
    .returning(['id', 'customerId'])
    .execute();
  await noteChanges(
    tx,
    { now, caller },
    released.map(({ id, customerId }) => ({ orderId: id, customerId, what: 'released' as const })),
  );
  await emit(tx, now, ...released.map((order) => event('order-changed', order)));
  return released.map(({ id }) => id);
}

function refuseUnlessOnFloor(order: OrderWithLines): void {
  if (!order.releasedAt || order.cancelledAt) throw conflict('order-not-released', { number: order.number });
  if (order.packedAt) throw conflict('order-packed-already', { number: order.number });
}

export interface ShortDeed {
  readonly now: Date;
  readonly caller: Caller;
  readonly orderLineId: string;
  /** Pieces that can't be sent; 0 takes an earlier word back. */
  readonly shortPieces: number;
  readonly reason: string;
}

/**
 * Marks what of a line can't be sent. Refuses `order-not-released`, `order-packed-already`, `short-too-many` (most) and
 * `reason-missing`. Emits `order-changed`.
 */
export async function markShort(tx: Tx, deed: ShortDeed): Promise<void> {
  const { now, caller, orderLineId, shortPieces } = deed;
  const order = await lockOrderOfLine(tx, orderLineId);
  refuseUnlessOnFloor(order);
  const line = order.lines.find(({ id }) => id === orderLineId);
  if (!line) return;
  const packed = (await packsOfOrders(tx, [order.id])).get(orderLineId)?.pieces ?? 0;
  const most = Math.max(0, line.pieces - packed);
  if (shortPieces < 0 || shortPieces > most)
    throw new RefusalError({ code: 'short-too-many', params: { most }, pointer: '/shortPieces' });
  const reason = deed.reason.trim();
  if (shortPieces > 0 && reason === '')
    throw new RefusalError({ code: 'reason-missing', params: {}, pointer: '/reason' });
  await tx
    .updateTable('orderLines')
    .set({ shortPieces, shortReason: shortPieces > 0 ? reason : null })
    .where('id', '=', orderLineId)
    .execute();
  await tx
    .updateTable('orders')
    .set({ rowVersion: sql`row_version + 1` })
    .where('id', '=', order.id)
    .execute();
  const { code, name } = line;
  await noteChanges(tx, { now, caller }, [
    {
      orderId: order.id,
      customerId: order.customerId,
      what: 'short',
      detail: { code, name, pieces: shortPieces, reason },
    },
  ]);
  await emit(tx, now, event('order-changed', order));
}

/**
 * Packing of an order is finished: every piece is in a pack or marked short. Refuses `order-not-released` and
 * `line-not-finished` (code); a repeat does nothing. Emits `order-packed`.
 */
export async function markPacked(
  tx: Tx,
  { now, orderId, caller = null }: { readonly now: Date; readonly orderId: string; readonly caller?: Caller | null },
): Promise<void> {
  const order = await lockOrder(tx, orderId);
  if (order.packedAt) return;
  refuseUnlessOnFloor(order);
  const [unfinished] = unfinishedLines(order.lines, await packsOfOrders(tx, [orderId]));
  if (unfinished) throw conflict('line-not-finished', { code: unfinished.code, name: unfinished.name });
  await tx
    .updateTable('orders')
    .set({ packedAt: now, rowVersion: sql`row_version + 1` })
    .where('id', '=', orderId)
    .execute();
  await noteChanges(tx, { now, caller }, [{ orderId, customerId: order.customerId, what: 'packed' }]);
  await emit(tx, now, event('order-packed', order));
}
