import { primalName } from '@seamwright/catalogue/domain';
import type { OrderWithLines } from '@seamwright/ordering/domain';
import { lockOrder, markPacked, markShort, orderById } from '@seamwright/ordering/server';
import { roomForPack } from '@seamwright/plant/domain';
import { conflict, notFound, type Caller, type Tx } from '@seamwright/shared/server';
import { RefusalError, unwrap } from '@seamwright/shared/util';
import { gramsIn, judgePack, lotFit, netWeight, packLimits } from '@seamwright/stock/domain';
import { addPack, lotById, packById, packsOfOrders, voidPack } from '@seamwright/stock/server';
import { sharedDay } from './cutting-days.repository';
import { cutsOfLines } from './cuts';

interface AtTheScale {
  readonly now: Date;
  readonly caller: Caller;
  readonly orderId: string;
}

/**
 * An order that may be packed: its day is on the floor and stays so until the transaction ends, and nobody else packs
 * it meanwhile. Refuses with `day-not-on-floor` (state), `order-not-released` or `order-packed-already` (number).
 */
async function orderAtTheScale(tx: Tx, orderId: string): Promise<OrderWithLines> {
  const { deliveryDay } = await orderById(tx, orderId);
  const day = await sharedDay(tx, deliveryDay);
  if (day?.state !== 'released') throw conflict('day-not-on-floor', { state: day?.state ?? 'open' });
  const order = await lockOrder(tx, orderId);
  if (!order.releasedAt || order.cancelledAt) throw conflict('order-not-released', { number: order.number });
  if (order.packedAt) throw conflict('order-packed-already', { number: order.number });
  return order;
}

export interface Weighed {
  readonly orderLineId: string;
  readonly lotId: string;
  readonly pieces: number;
  readonly grossGrams: number;
  readonly tareGrams: number;
  readonly reason: string | null;
}

/** Keeps a weighed pack for a line of an order; gives the order's id. */
export async function weighPack(tx: Tx, { now, caller, orderId }: AtTheScale, weighed: Weighed): Promise<string> {
  const order = await orderAtTheScale(tx, orderId);
  const line = order.lines.find(({ id }) => id === weighed.orderLineId);
  if (!line) throw notFound();
  const packedPieces = (await packsOfOrders(tx, [orderId])).get(line.id)?.pieces ?? 0;
  unwrap(roomForPack({ ...line, packedPieces }, weighed.pieces));
  const cut = (await cutsOfLines(tx, [line])).get(line.id);
  if (!cut) throw notFound();
  const netGrams = unwrap(netWeight(weighed.grossGrams, weighed.tareGrams));
  const judged = unwrap(judgePack(packLimits(cut.resolved, weighed.pieces), netGrams, weighed.reason));
  const lot = await lotById(tx, weighed.lotId);
  if (lot.nodeId !== cut.cut.primal.id)
    throw new RefusalError({
      code: 'lot-of-another-primal',
      params: { lot: lot.code, primal: primalName(cut.cut.primal.species, cut.cut.primal.name) },
      pointer: '/lotId',
    });
  unwrap(lotFit(lot, { deliveryDay: order.deliveryDay, cuttingDay: order.deliveryDay }));
  await addPack(
    tx,
    { now, caller },
    {
      customerId: order.customerId,
      orderId,
      orderLineId: line.id,
      versionId: line.versionId,
      lotId: lot.id,
      pieces: weighed.pieces,
      netGrams,
      tareGrams: weighed.tareGrams,
      inputGrams: gramsIn(netGrams, cut.cut.yieldPpm),
      ...judged,
    },
  );
  return orderId;
}

/** Takes a pack of the order back. */
export async function takePackBack(tx: Tx, { now, caller, orderId }: AtTheScale, packId: string): Promise<void> {
  await orderAtTheScale(tx, orderId);
  const pack = await packById(tx, packId);
  if (pack.orderId !== orderId) throw notFound();
  await voidPack(tx, { now, caller }, packId);
}

/** Says what of a line can't be sent. */
export async function markLineShort(
  tx: Tx,
  { now, caller, orderId }: AtTheScale,
  short: { readonly orderLineId: string; readonly shortPieces: number; readonly reason: string },
): Promise<void> {
  const order = await orderAtTheScale(tx, orderId);
  if (!order.lines.some(({ id }) => id === short.orderLineId)) throw notFound();
  await markShort(tx, { now, caller, ...short });
}

/** Finishes the packing of an order; refused while a line still waits for pieces. */
export async function finishPacking(tx: Tx, { now, caller, orderId }: AtTheScale): Promise<void> {
  await orderAtTheScale(tx, orderId);
  await markPacked(tx, { now, orderId, caller });
}
