import type { OrderDetail, OrderListItem } from '@seamwright/ordering/contracts';
import {
  checkAmendable,
  cutOffOf,
  orderStage,
  orderTotals,
  packedAmount,
  totalOf,
  type OrderLine,
  type OrderWithLines,
  type Total,
} from '@seamwright/ordering/domain';
import type { Caller, Tx } from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import type { PackedLine } from '@seamwright/stock/domain';
import { packsOfOrders } from '@seamwright/stock/server';
import { closuresFor, sitesInZones } from './calendar.repository';
import { changesOf } from './order-changes.repository';
import { orderById } from './orders.repository';
import type { CardState, OrderingParts } from './ports';

type Packs = ReadonlyMap<string, PackedLine>;
type Asking = { readonly now: Date; readonly caller: Caller };
type PresentParts = Pick<OrderingParts, 'timeZone' | 'cards'>;

/** Orders as a list shows them: packs and cards are asked for once for all. */
export async function presentOrders(
  tx: Tx,
  { now }: Asking,
  { timeZone, cards }: PresentParts,
  orders: readonly OrderWithLines[],
): Promise<Map<string, OrderListItem>> {
  const ids = orders.map(({ id }) => id);
  const packs = await packsOfOrders(tx, ids);
  const payments = await cards.stateOf(tx, ids);
  const today = plantToday(now, timeZone);
  return new Map(
    orders.map((order) => [
      order.id,
      {
        ...head(order, stageOf(order, packs, today)),
        lines: order.lines.length,
        shortLines: order.lines.filter(({ shortPieces }) => shortPieces > 0).length,
        totals: totalsOf(order, packs),
        payment: presentPayment(payments.get(order.id)),
      },
    ]),
  );
}

/** One order in full, as the caller may see it. Throws `not-found`. */
export async function presentOrder(tx: Tx, asking: Asking, parts: PresentParts, id: string): Promise<OrderDetail> {
  const { timeZone, cards } = parts;
  const order = await orderById(tx, id);
  const packs = await packsOfOrders(tx, [id]);
  const payments = await cards.stateOf(tx, [id]);
  const stage = stageOf(order, packs, plantToday(asking.now, timeZone));
  const cutOffAt = await cutOffOfOrder(tx, order, timeZone);
  const by = asking.caller.kind === 'user' ? 'buyer' : 'desk';
  const iso = (at: Date | null) => at?.toISOString() ?? null;
  return {
    ...head(order, stage),
    waitingFor: order.waitingFor as OrderDetail['waitingFor'],
    note: order.note,
    placedBy: order.placedByName,
    cutOffAt: cutOffAt.toISOString(),
    mayCancel: checkAmendable({ stage, cutOffAt, now: asking.now, by }).ok,
    cancelledBecause: order.cancelledBecause,
    releasedAt: iso(order.releasedAt),
    packedAt: iso(order.packedAt),
    cancelledAt: iso(order.cancelledAt),
    deliveryChargeMinor: order.deliveryChargeMinor,
    deliveryTaxPpm: order.deliveryTaxPpm,
    totals: totalsOf(order, packs),
    payment: presentPayment(payments.get(id)),
    lines: order.lines.map((line) => presentLine(line, packs)),
    history: (await changesOf(tx, id)).map((change) => ({ ...change, at: change.at.toISOString() })),
  };
}

/** The last instant at which the buyer may change her order. A site that lost its zone has none left. */
export async function cutOffOfOrder(tx: Tx, order: OrderWithLines, timeZone: string): Promise<Date> {
  const site = (await sitesInZones(tx, [order.customerId])).find(({ siteId }) => siteId === order.siteId);
  if (!site?.zone) return order.placedAt;
  return cutOffOf(site.zone, order.deliveryDay, await closuresFor(tx, order.deliveryDay), timeZone);
}

export function stageOf(order: OrderWithLines, packs: Packs, today: ReturnType<typeof plantToday>) {
  const begun = order.lines.some(({ id, shortPieces }) => shortPieces > 0 || packs.has(id));
  return orderStage({ ...order, begun }, today);
}

function head(order: OrderWithLines, stage: OrderDetail['stage']) {
  const { id, rowVersion, number, deliveryDay, source, settlement, currency, customerReference } = order;
  return {
    id,
    rowVersion,
    number,
    customer: { id: order.customerId, name: order.customerName },
    site: { id: order.siteId, name: order.siteName },
    deliveryDay,
    stage,
    source,
    settlement,
    currency,
    customerReference,
    placedAt: order.placedAt.toISOString(),
  };
}

const presentTotal = ({ netMinor, taxMinor, totalMinor }: Total) => ({ netMinor, taxMinor, totalMinor });

function totalsOf(order: OrderWithLines, packs: Packs): OrderDetail['totals'] {
  const { min, estimate, max } = orderTotals(order.lines, order.deliveryChargeMinor, order.deliveryTaxPpm);
  const packed = order.packedAt
    ? totalOf([
        ...order.lines.map((line) => ({ minor: packedMinor(line, packs) ?? 0, taxPpm: line.taxPpm })),
        { minor: order.deliveryChargeMinor, taxPpm: order.deliveryTaxPpm },
      ])
    : null;
  return {
    min: presentTotal(min),
    estimate: presentTotal(estimate),
    max: presentTotal(max),
    packed: packed && presentTotal(packed),
  };
}

function packedMinor(line: OrderLine, packs: Packs): number | null {
  const packed = packs.get(line.id);
  return packed ? packedAmount(line, { pieces: packed.pieces, grams: packed.netGrams }) : null;
}

function presentLine(line: OrderLine, packs: Packs): OrderDetail['lines'][number] {
  const packed = packs.get(line.id);
  const { minMinor, estimateMinor, maxMinor, choiceSummary, choiceKey: _key, orderId: _order, ...rest } = line;
  return {
    ...rest,
    summary: choiceSummary,
    priceWhy: line.priceWhy as OrderDetail['lines'][number]['priceWhy'],
    amounts: { minMinor, estimateMinor, maxMinor },
    packedPieces: packed?.pieces ?? 0,
    packedGrams: packed?.netGrams ?? 0,
    packedMinor: packedMinor(line, packs),
  };
}

const presentPayment = (payment: CardState | undefined): OrderDetail['payment'] => payment ?? null;
