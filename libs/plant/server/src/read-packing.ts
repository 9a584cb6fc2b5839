import type { OrderWithLines } from '@seamwright/ordering/domain';
import { ordersOfDay } from '@seamwright/ordering/server';
import type { PackingLineWire, PackingOrderWire } from '@seamwright/plant/contracts';
import type { CuttingDayState } from '@seamwright/plant/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import type { Lot, PackedLine } from '@seamwright/stock/domain';
import { lotsOf, packsOfOrders } from '@seamwright/stock/server';
import { sharedDay } from './cutting-days.repository';
import { cutsOfLines, type ResolvedCut } from './cuts';

export interface PackingDay {
  readonly deliveryDay: PlantDate;
  readonly state: CuttingDayState;
  readonly orders: PackingOrderWire[];
}

/** The released orders of a day, with what is packed so far. Throws `not-found` for a day without orders. */
export async function readPackingDay(tx: Tx, deliveryDay: PlantDate): Promise<PackingDay> {
  const day = await sharedDay(tx, deliveryDay);
  if (!day) throw notFound();
  const onFloor = day.state === 'released' || day.state === 'finished' || day.state === 'locked';
  const orders = onFloor ? (await ordersOfDay(tx, deliveryDay)).filter(({ releasedAt }) => releasedAt) : [];
  return { deliveryDay, state: day.state, orders: await presentPacking(tx, orders) };
}

/** Orders as the scale sees them: three readings for all of them. */
export async function presentPacking(tx: Tx, orders: readonly OrderWithLines[]): Promise<PackingOrderWire[]> {
  const cuts = await cutsOfLines(
    tx,
    orders.flatMap(({ lines }) => lines),
  );
  const packed = await packsOfOrders(
    tx,
    orders.map(({ id }) => id),
  );
  const primalIds = [...cuts.values()].map(({ cut }) => cut.primal.id);
  const lots = new Map<PlantDate, Lot[]>();
  for (const day of new Set(orders.map(({ deliveryDay }) => deliveryDay)))
    lots.set(day, await lotsOf(tx, primalIds, { deliveryDay: day, cuttingDay: day }));
  return orders.map((order) => ({
    id: order.id,
    number: order.number,
    customer: { id: order.customerId, name: order.customerName },
    siteName: order.siteName,
    deliveryDay: order.deliveryDay,
    note: order.note,
    packedAt: order.packedAt?.toISOString() ?? null,
    lines: order.lines.flatMap((line) => {
      const cut = cuts.get(line.id);
      return cut ? [presentLine(line, cut, packed.get(line.id), lots.get(order.deliveryDay) ?? [])] : [];
    }),
  }));
}

function presentLine(
  line: OrderWithLines['lines'][number],
  { cut, resolved }: ResolvedCut,
  packed: PackedLine | undefined,
  lots: readonly Lot[],
): PackingLineWire {
  const { version } = resolved;
  return {
    id: line.id,
    position: line.position,
    code: line.code,
    name: line.name,
    summary: line.choiceSummary,
    note: line.note,
    whenShort: line.whenShort,
    pieces: line.pieces,
    estimateGrams: line.estimateGrams,
    packedPieces: packed?.pieces ?? 0,
    packedGrams: packed?.netGrams ?? 0,
    shortPieces: line.shortPieces,
    shortReason: line.shortReason,
    piecesPerPack: resolved.piecesPerPack,
    piece: resolved.piece,
    tareGrams: version.tareGrams,
    storageMinC: version.storageMinC,
    storageMaxC: version.storageMaxC,
    allergens: [...version.allergens],
    packs: (packed?.packs ?? []).map((pack) => ({
      id: pack.id,
      serial: pack.serial,
      lotCode: pack.lotCode,
      pieces: pack.pieces,
      netGrams: pack.netGrams,
      tareGrams: pack.tareGrams,
      outOfLimits: pack.outOfLimits,
      reason: pack.reason,
      packedAt: pack.packedAt.toISOString(),
    })),
    lots: lots.filter(({ nodeId }) => nodeId === cut.primal.id).map(({ id, code, useBy }) => ({ id, code, useBy })),
  };
}
