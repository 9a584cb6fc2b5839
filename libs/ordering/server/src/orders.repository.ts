import { sql } from 'kysely';
import type { Order, OrderLine, OrderSource, OrderWithLines, Settlement, WhenShort } from '@seamwright/ordering/domain';
import type { PriceAnswer, PriceBasis } from '@seamwright/pricing/domain';
import { notFound, type Tx } from '@seamwright/shared/server';
import { grams, type PlantDate, type Quantity } from '@seamwright/shared/util';

const orderRows = (tx: Tx) =>
  tx
    .selectFrom('orders as o')
    .innerJoin('customers as c', 'c.id', 'o.customerId')
    .innerJoin('sites as s', 's.id', 'o.siteId')
    // A buyer does not see the people of the desk: the name is missing then.
    .leftJoin('people as p', 'p.id', 'o.placedBy')
    .selectAll('o')
    .select(['c.name as customerName', 's.name as siteName', 'p.name as placedByName']);

type OrderRow = Awaited<ReturnType<ReturnType<typeof orderRows>['executeTakeFirstOrThrow']>>;

const orderOf = (row: OrderRow): Order => ({
  ...row,
  deliveryDay: row.deliveryDay as PlantDate,
  source: row.source as OrderSource,
  settlement: row.settlement as Settlement,
  customerReference: row.customerReference ?? '',
  note: row.note ?? '',
});

const lineRows = (tx: Tx) =>
  tx
    .selectFrom('orderLines as l')
    .innerJoin('specificationVersions as v', 'v.id', 'l.versionId')
    .innerJoin('specifications as s', 's.id', 'l.specificationId')
    .selectAll('l')
    .select(['v.name', 'v.version', 's.code'])
    .orderBy('l.orderId')
    .orderBy('l.position');

type LineRow = Awaited<ReturnType<ReturnType<typeof lineRows>['executeTakeFirstOrThrow']>>;

const quantityOf = (row: LineRow): Quantity =>
  row.quantityUnit === 'kg'
    ? { unit: 'kg', grams: grams(row.quantityGrams ?? 0), notLess: row.notLess }
    : { unit: row.quantityUnit as 'piece' | 'case', count: row.quantityCount ?? 0 };

const lineOf = (row: LineRow): OrderLine => ({
  id: row.id,
  orderId: row.orderId,
  position: row.position,
  specificationId: row.specificationId,
  versionId: row.versionId,
  code: row.code,
  name: row.name,
  version: row.version,
  chosen: row.choices as OrderLine['chosen'],
  choiceKey: row.choiceKey,
  choiceSummary: row.choiceSummary,
  quantity: quantityOf(row),
  pieces: row.pieces,
  minGrams: grams(row.minGrams),
  estimateGrams: grams(row.estimateGrams),
  maxGrams: grams(row.maxGrams),
  basis: row.basis as PriceBasis,
  priceMinor: row.priceMinor,
  priceWhy: row.priceWhy as PriceAnswer,
  taxPpm: row.taxPpm,
  minMinor: row.minMinor,
  estimateMinor: row.estimateMinor,
  maxMinor: row.maxMinor,
  whenShort: row.whenShort as WhenShort,
  note: row.note ?? '',
  shortPieces: row.shortPieces,
  shortReason: row.shortReason,
});

/** Joins the lines of these orders to them, in one query. */
export async function withLines(tx: Tx, orders: readonly Order[]): Promise<OrderWithLines[]> {
  if (orders.length === 0) return [];
  const ids = orders.map(({ id }) => id);
  const rows = await lineRows(tx)
    .where('l.orderId', '=', sql<string>`any(${ids}::uuid[])`)
    .execute();
  const lines = rows.map(lineOf);
  return orders.map((order) => ({ ...order, lines: lines.filter(({ orderId }) => orderId === order.id) }));
}

/** Throws `not-found`, also for an order that the caller may not see. */
export async function orderById(tx: Tx, id: string): Promise<OrderWithLines> {
  const row = await orderRows(tx).where('o.id', '=', id).executeTakeFirst();
  const [order] = row ? await withLines(tx, [orderOf(row)]) : [];
  if (!order) throw notFound();
  return order;
}

export async function ordersByIds(tx: Tx, ids: readonly string[]): Promise<OrderWithLines[]> {
  if (ids.length === 0) return [];
  const rows = await orderRows(tx)
    .where('o.id', '=', sql<string>`any(${[...ids]}::uuid[])`)
    .orderBy('o.number')
    .execute();
  return withLines(tx, rows.map(orderOf));
}

/** Every order of a delivery day that was not cancelled, also those that still wait for something, by number. */
export async function ordersOfDay(tx: Tx, day: PlantDate): Promise<OrderWithLines[]> {
  const rows = await orderRows(tx)
    .where('o.deliveryDay', '=', day)
    .where('o.cancelledAt', 'is', null)
    .orderBy('o.number')
    .execute();
  return withLines(tx, rows.map(orderOf));
}

/** Locks an order until the transaction ends, so that only one deed at a time changes it; throws `not-found`. */
export async function lockOrder(tx: Tx, id: string): Promise<OrderWithLines> {
  const locked = await tx.selectFrom('orders').select('id').where('id', '=', id).forUpdate().executeTakeFirst();
  if (!locked) throw notFound();
  return orderById(tx, id);
}

/** The order that a line belongs to, locked; throws `not-found`. */
export async function lockOrderOfLine(tx: Tx, orderLineId: string): Promise<OrderWithLines> {
  const line = await tx.selectFrom('orderLines').select('orderId').where('id', '=', orderLineId).executeTakeFirst();
  if (!line) throw notFound();
  return lockOrder(tx, line.orderId);
}

export interface ListWanted {
  readonly limit: number;
  readonly after: { readonly placedAt: string; readonly id: string } | null;
  readonly deliveryDay?: string | undefined;
  readonly state?: 'waiting' | 'confirmed' | 'released' | 'packed' | 'cancelled' | undefined;
  readonly customerId?: string | undefined;
  /** Whose orders the caller may see. The policies see to that anyhow; said here, an index leads to them. */
  readonly customers: '*' | readonly string[];
}

/** Orders newest first, one more than the limit when there are more. */
export async function newestOrders(tx: Tx, wanted: ListWanted): Promise<OrderWithLines[]> {
  let query = orderRows(tx)
    .orderBy('o.placedAt', 'desc')
    .orderBy('o.id', 'desc')
    .limit(wanted.limit + 1);
  if (wanted.deliveryDay) query = query.where('o.deliveryDay', '=', wanted.deliveryDay);
  if (wanted.customerId) query = query.where('o.customerId', '=', wanted.customerId);
  else if (wanted.customers !== '*')
    query = query.where('o.customerId', '=', sql<string>`any(${[...wanted.customers]}::uuid[])`);
  if (wanted.state) query = query.where(inState(wanted.state));
  if (wanted.after) {
    const { placedAt, id } = wanted.after;
    query = query.where(sql<boolean>`(o.placed_at, o.id) < (${placedAt}::timestamptz, ${id}::uuid)`);
  }
  return withLines(tx, (await query.execute()).map(orderOf));
}

/** The same stages as `orderStage`, as far as a list tells them apart. */
function inState(state: NonNullable<ListWanted['state']>) {
  switch (state) {
    case 'cancelled':
      return sql<boolean>`o.cancelled_at is not null`;
    case 'packed':
      return sql<boolean>`o.cancelled_at is null and o.packed_at is not null`;
    case 'waiting':
      return sql<boolean>`o.cancelled_at is null and o.packed_at is null and cardinality(o.waiting_for) > 0`;
    case 'confirmed':
      return sql<boolean>`o.cancelled_at is null and o.packed_at is null and cardinality(o.waiting_for) = 0
        and o.released_at is null`;
    case 'released':
      return sql<boolean>`o.cancelled_at is null and o.packed_at is null and cardinality(o.waiting_for) = 0
        and o.released_at is not null`;
  }
}

/** How many orders, not cancelled, stand on a day. */
export async function countOrdersOfDay(tx: Tx, day: PlantDate): Promise<number> {
  const { count } = await tx
    .selectFrom('orders')
    .select(sql<number>`count(*)`.as('count'))
    .where('deliveryDay', '=', day)
    .where('cancelledAt', 'is', null)
    .executeTakeFirstOrThrow();
  return count;
}

/** How many released orders of a day are not packed yet. */
export async function countUnpackedOfDay(tx: Tx, day: PlantDate): Promise<number> {
  const { count } = await tx
    .selectFrom('orders')
    .select(sql<number>`count(*)`.as('count'))
    .where('deliveryDay', '=', day)
    .where('cancelledAt', 'is', null)
    .where('releasedAt', 'is not', null)
    .where('packedAt', 'is', null)
    .executeTakeFirstOrThrow();
  return count;
}
