import type { OrderSource, Settlement } from '@seamwright/ordering/domain';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import { emit, personOf, type Caller, type Tx } from '@seamwright/shared/server';
import { newId, type PlantDate } from '@seamwright/shared/util';
import { noteChanges } from './order-changes.repository';
import type { PreparedOrder, ReadyLine } from './prepare-orders';

/** An order that can be placed as it is. */
export interface OrderToStore {
  readonly customerId: string;
  readonly siteId: string;
  readonly deliveryDay: PlantDate;
  readonly source: OrderSource;
  readonly settlement: Settlement;
  readonly customerReference: string;
  readonly note: string;
  readonly prepared: PreparedOrder;
}

/** Stores orders with their lines and says so; with a card an order waits for payment. Gives the ids in the order given. */
export async function storeOrders(
  tx: Tx,
  by: { readonly now: Date; readonly caller: Caller },
  orders: readonly OrderToStore[],
): Promise<string[]> {
  const { now, caller } = by;
  const made = orders.map((order) => ({ ...order, id: newId<'Order'>() }));
  if (made.length === 0) return [];
  await tx
    .insertInto('orders')
    .values(
      made.map(({ id, customerId, siteId, deliveryDay, source, settlement, customerReference, note, prepared }) => ({
        id,
        customerId,
        siteId,
        deliveryDay,
        source,
        settlement,
        waitingFor: settlement === 'card' ? ['payment'] : [],
        currency: HOUSE_CURRENCY,
        customerReference: customerReference || null,
        note: note || null,
        deliveryChargeMinor: prepared.deliveryChargeMinor,
        deliveryTaxPpm: prepared.deliveryTaxPpm,
        placedAt: now,
        placedBy: personOf(caller),
      })),
    )
    .execute();
  const rows = made.flatMap(({ id, customerId, prepared }) =>
    prepared.lines.map((line, at) => lineRow(id, customerId, at + 1, line)),
  );
  // One statement takes at most 65,535 parameters.
  for (let at = 0; at < rows.length; at += 1000)
    await tx
      .insertInto('orderLines')
      .values(rows.slice(at, at + 1000))
      .execute();
  const confirmed = made.filter(({ settlement }) => settlement === 'account');
  await noteChanges(tx, by, [
    ...made.map(({ id, customerId }) => ({ orderId: id, customerId, what: 'placed' as const })),
    ...confirmed.map(({ id, customerId }) => ({ orderId: id, customerId, what: 'confirmed' as const })),
  ]);
  const event = (type: string) => (order: { readonly id: string; readonly customerId: string }) => ({
    type,
    subjectId: order.id,
    customerId: order.customerId,
  });
  await emit(tx, now, ...made.map(event('order-placed')), ...confirmed.map(event('order-confirmed')));
  return made.map(({ id }) => id);
}

function lineRow(orderId: string, customerId: string, position: number, line: ReadyLine) {
  const { resolved, quantity, weights, price } = line;
  return {
    id: newId(),
    orderId,
    customerId,
    position,
    specificationId: line.specificationId,
    versionId: resolved.version.id,
    choices: JSON.stringify(resolved.chosen),
    choiceKey: resolved.choiceKey,
    choiceSummary: resolved.summary,
    quantityUnit: quantity.unit,
    quantityCount: quantity.unit === 'kg' ? null : quantity.count,
    quantityGrams: quantity.unit === 'kg' ? quantity.grams : null,
    notLess: quantity.unit === 'kg' && quantity.notLess,
    pieces: weights.pieces,
    minGrams: weights.minGrams,
    estimateGrams: weights.estimateGrams,
    maxGrams: weights.maxGrams,
    basis: price.basis,
    priceMinor: price.priceMinor,
    priceWhy: JSON.stringify(price),
    taxPpm: line.taxPpm,
    minMinor: line.minMinor,
    estimateMinor: line.estimateMinor,
    maxMinor: line.maxMinor,
    whenShort: line.whenShort,
    note: line.note || null,
  };
}
