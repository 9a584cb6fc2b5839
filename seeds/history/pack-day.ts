import { addPack, finishOrder, listPackingOrders, markShort, type PackingLineWire } from '@seamwright/plant/contracts';
import type { Caller } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import type { Chance } from '../chance';
import type { Desk } from '../desk';

/** Big orders go out in few packs: the demo needs weights, not thousands of rows. */
const MOST_PACKS_A_LINE = 2;

interface Packing {
  readonly deliveryDay: PlantDate;
  /** Orders that are left on the floor. */
  readonly leave?: number;
}

/** Packs the orders of a day as a packer does: most packs near their weight, a few outside with a reason, a few shorts. */
export async function packDay(
  desk: Desk,
  packer: Caller,
  chance: Chance,
  { deliveryDay, leave = 0 }: Packing,
): Promise<void> {
  const { orders } = await desk.call(packer, listPackingOrders, { query: { deliveryDay } });
  for (const order of orders.slice(0, Math.max(0, orders.length - leave))) {
    for (const line of order.lines) await packLine(desk, packer, chance, order.id, line);
    await desk.call(packer, finishOrder, { params: { orderId: order.id } });
  }
}

async function packLine(
  desk: Desk,
  packer: Caller,
  chance: Chance,
  orderId: string,
  line: PackingLineWire,
): Promise<void> {
  const lot = line.lots[0];
  const short = lot === undefined ? line.pieces : chance.happens(4) ? 1 : 0;
  const perPack = Math.max(line.piecesPerPack, Math.ceil(line.pieces / MOST_PACKS_A_LINE));
  let left = line.pieces - short;
  while (lot !== undefined && left > 0) {
    const pieces = Math.min(perPack, left);
    const { net, reason } = weigh(chance, line, pieces);
    await desk.call(packer, addPack, {
      params: { orderId },
      body: {
        orderLineId: line.id,
        lotId: lot.id,
        pieces,
        grossGrams: net + line.tareGrams,
        tareGrams: line.tareGrams,
        reason,
      },
    });
    left -= pieces;
  }
  if (short > 0) {
    const reason = lot === undefined ? 'No stock of the primal' : 'One piece spoilt in trimming';
    await desk.call(packer, markShort, { params: { orderId, lineId: line.id }, body: { shortPieces: short, reason } });
  }
}

function weigh(chance: Chance, { piece }: PackingLineWire, pieces: number): { net: number; reason: string | null } {
  if (chance.happens(3)) return { net: pieces * piece.maxGrams + 20, reason: 'Agreed with the customer by phone' };
  const half = Math.floor(((piece.maxGrams - piece.minGrams) * pieces) / 3);
  return { net: pieces * piece.nominalGrams + chance.whole(-half, half), reason: null };
}
