import type { placeOrder as endpoint } from '@seamwright/ordering/contracts';
import { HOUSE_CURRENCY } from '@seamwright/pricing/domain';
import type { CheckedInput } from '@seamwright/shared/contracts';
import { sayRefusal } from '@seamwright/shared/contracts';
import { conflict, ProblemError, type Caller, type Tx } from '@seamwright/shared/server';
import { RefusalError, type PlantDate, type Refusal } from '@seamwright/shared/util';
import { customerSpokenFor } from './list-delivery-days';
import type { OrderingParts } from './ports';
import { prepareOrders, type OrderFault } from './prepare-orders';
import { storeOrders } from './store-orders';

export type OrderWanted = CheckedInput<typeof endpoint>['body'];

/**
 * Places an order. Prices and weights are looked up here and fixed on its lines; with a card, the hold for the upper
 * bound is written down as started, to be asked for after the commit. Gives the order's id.
 */
export async function placeOrder(
  tx: Tx,
  by: { readonly now: Date; readonly caller: Caller },
  parts: Pick<OrderingParts, 'timeZone' | 'days' | 'cards'>,
  wanted: OrderWanted,
): Promise<string> {
  const customerId = customerSpokenFor(by.caller, wanted.customerId);
  checkSettlement(wanted);
  const { siteId, settlement, cardId, customerReference, note, lines } = wanted;
  const order = { customerId, siteId, deliveryDay: wanted.deliveryDay as PlantDate, lines };
  const [prepared] = await prepareOrders(tx, by, parts, [order]);
  if (!prepared) throw new Error('An order that was asked for was not looked at');
  if (prepared.faults.length > 0) throw problemOfFaults(prepared.faults);
  const { totalMinor } = prepared.totals.max;
  if (wanted.agreedMaxMinor !== undefined && totalMinor > wanted.agreedMaxMinor)
    throw conflict('price-moved', { shown: wanted.agreedMaxMinor, now: totalMinor });
  const source = by.caller.kind === 'user' ? 'storefront' : 'desk';
  const [orderId = ''] = await storeOrders(tx, by, [
    { ...order, source, settlement, customerReference, note, prepared },
  ]);
  if (cardId)
    await parts.cards.start(tx, {
      now: by.now,
      orderId,
      customerId,
      holdMinor: totalMinor,
      currency: HOUSE_CURRENCY,
      cardId,
    });
  return orderId;
}

function checkSettlement({ settlement, cardId }: OrderWanted): void {
  if (settlement === 'card' && !cardId)
    throw new RefusalError({ code: 'card-missing', params: {}, pointer: '/cardId' });
  if (settlement === 'account' && cardId)
    throw new RefusalError({ code: 'card-not-wanted', params: {}, pointer: '/cardId' });
}

/** Every fault of an order at once; the document is named after the first. */
function problemOfFaults(faults: readonly OrderFault[]): ProblemError {
  const errors = faults.map(({ line, refusal }) => ({
    pointer: line === null ? (refusal.pointer ?? '') : `/lines/${line}${refusal.pointer ?? ''}`,
    message: sayRefusal(refusal),
  }));
  const first = faults[0]?.refusal as Refusal;
  return new ProblemError(422, { code: first.code, params: first.params }, errors);
}
