import type { OrderDetail } from '@seamwright/ordering/contracts';
import {
  addPack,
  closeCuttingDay,
  finishOrder,
  getCuttingDay,
  listPackingOrders,
  releaseCuttingDay,
  type CuttingDayWire,
  type PackingLineWire,
} from '@seamwright/plant/contracts';
import { receiveLot, releaseLot, type LotWire } from '@seamwright/stock/contracts';
import type { Party } from './party';
import { anOrder } from './trade';
import type { World } from './world';

export const lotFacts = ({ tree, next }: World) => ({
  code: `LOT-${next()}`,
  nodeId: tree.striploinId,
  supplier: 'Test Farms',
  killDate: '2026-11-24',
  receivedOn: '2026-11-30',
  useBy: null,
  receivedGrams: 600_000,
  receivedPieces: 100,
  origin: { bornIn: 'GB', rearedIn: 'GB', slaughteredIn: 'GB', slaughterhouse: 'UK 9999' },
});

/** A lot that waits for its release. */
export const aLot = (world: World): Promise<LotWire> =>
  world.deed(world.staff.planner, receiveLot, { body: lotFacts(world) });

export async function aReleasedLot(world: World): Promise<LotWire> {
  const { id, rowVersion } = await aLot(world);
  return world.deed(world.staff.planner, releaseLot, { params: { id }, ifMatch: rowVersion });
}

/** A day with an order, open to more of them. */
export async function anOpenDay(world: World, party: Party): Promise<{ day: CuttingDayWire; order: OrderDetail }> {
  const order = await anOrder(world, party, world.nextDay());
  const day = await world.deed(world.staff.planner, getCuttingDay, { params: { deliveryDay: order.deliveryDay } });
  return { day, order };
}

const moved = (
  world: World,
  endpoint: typeof closeCuttingDay | typeof releaseCuttingDay,
  { deliveryDay, rowVersion }: CuttingDayWire,
): Promise<CuttingDayWire> =>
  world.deed(world.staff.planner, endpoint, { params: { deliveryDay }, ifMatch: rowVersion });

export async function aClosedDay(world: World, party: Party): Promise<{ day: CuttingDayWire; order: OrderDetail }> {
  const { day, order } = await anOpenDay(world, party);
  return { day: await moved(world, closeCuttingDay, day), order };
}

export async function aReleasedDay(world: World, party: Party): Promise<{ day: CuttingDayWire; order: OrderDetail }> {
  const { day, order } = await aClosedDay(world, party);
  return { day: await moved(world, releaseCuttingDay, day), order };
}

/** A day on the floor whose only order is packed. */
export async function aPackedDay(world: World, party: Party): Promise<CuttingDayWire> {
  const { order } = await aReleasedDay(world, party);
  await packLine(world, await lineAtTheScale(world, order));
  await world.deed(world.staff.floor, finishOrder, { params: { orderId: order.id } });
  return world.deed(world.staff.planner, getCuttingDay, { params: { deliveryDay: order.deliveryDay } });
}

export interface AtTheScale {
  readonly orderId: string;
  readonly line: PackingLineWire;
}

/** The only line of a released order. */
export async function lineAtTheScale(world: World, { id, deliveryDay }: OrderDetail): Promise<AtTheScale> {
  const { orders } = await world.deed(world.staff.floor, listPackingOrders, { query: { deliveryDay } });
  const line = orders.find((order) => order.id === id)?.lines[0];
  if (!line) throw new Error('The order is not at the scale');
  return { orderId: id, line };
}

/** A pack with every piece of the line, at its nominal weight. */
export async function packOf(world: World, { orderId, line }: AtTheScale) {
  const { id: lotId } = await aReleasedLot(world);
  const netGrams = line.pieces * line.piece.nominalGrams;
  const { tareGrams, pieces } = line;
  const body = { orderLineId: line.id, lotId, pieces, tareGrams, grossGrams: netGrams + tareGrams, reason: null };
  return { params: { orderId }, body };
}

/** Packs a line whole; gives the pack's id. */
export async function packLine(world: World, at: AtTheScale): Promise<string> {
  const { lines } = await world.deed(world.staff.floor, addPack, await packOf(world, at));
  const pack = lines[0]?.packs[0];
  if (!pack) throw new Error('The pack was not kept');
  return pack.id;
}

/** Closes and releases the day of a placed order, packs all of it, and finishes it. */
export async function packWholeOrder(world: World, order: OrderDetail): Promise<void> {
  const { deliveryDay } = order;
  const day = await world.deed(world.staff.planner, getCuttingDay, { params: { deliveryDay } });
  await moved(world, releaseCuttingDay, await moved(world, closeCuttingDay, day));
  await packLine(world, await lineAtTheScale(world, order));
  await world.deed(world.staff.floor, finishOrder, { params: { orderId: order.id } });
}
