import { orderById } from '@seamwright/ordering/server';
import * as packing from '@seamwright/plant/contracts';
import {
  implement,
  implementOnce,
  inTransaction,
  notFound,
  type Implementation,
  type RequestContext,
  type Tx,
} from '@seamwright/shared/server';
import { plantDate, unwrap } from '@seamwright/shared/util';
import { finishPacking, markLineShort, takePackBack, weighPack } from './pack-line';
import { presentPacking, readPackingDay } from './read-packing';

async function present(tx: Tx, orderId: string): Promise<packing.PackingOrderWire> {
  const [order] = await presentPacking(tx, [await orderById(tx, orderId)]);
  if (!order) throw notFound();
  return order;
}

/** A deed on an order, answered by the order as it is afterwards. */
const doing = (
  { database, caller }: RequestContext,
  orderId: string,
  deed: (tx: Tx) => Promise<void>,
): Promise<packing.PackingOrderWire> =>
  inTransaction(database, caller, async (tx) => {
    await deed(tx);
    return present(tx, orderId);
  });

export const packingImplementations = (): Implementation[] => [
  implement(packing.listPackingOrders, ({ database, caller }, { query }) =>
    inTransaction(database, caller, (tx) => readPackingDay(tx, unwrap(plantDate(query.deliveryDay)))),
  ),
  implementOnce(packing.addPack, {
    make: (tx, { now, caller }, { params: { orderId }, body }) => weighPack(tx, { now, caller, orderId }, body),
    present: (tx, _, orderId) => present(tx, orderId),
  }),
  implement(packing.voidPack, (context, { params: { orderId, packId } }) =>
    doing(context, orderId, (tx) => takePackBack(tx, { ...context, orderId }, packId)),
  ),
  implement(packing.markShort, (context, { params: { orderId, lineId }, body }) =>
    doing(context, orderId, (tx) => markLineShort(tx, { ...context, orderId }, { orderLineId: lineId, ...body })),
  ),
  implement(packing.finishOrder, (context, { params: { orderId } }) =>
    doing(context, orderId, (tx) => finishPacking(tx, { ...context, orderId })),
  ),
];
