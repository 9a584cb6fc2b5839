import { placeOrder } from '@seamwright/ordering/contracts';
import type { Caller } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import type { Chance } from '../chance';
import type { Desk } from '../desk';
import type { DemoCustomer } from '../scenario/customers';
import { USUALS, type Usual } from '../scenario/usuals';

const GRAMS_PER_KG = 1000;

const quantityOf = ({ unit, least, most }: Usual, chance: Chance) => {
  const amount = chance.whole(least, most);
  return unit === 'kg' ? { unit, grams: amount * GRAMS_PER_KG, notLess: false } : { unit, count: amount };
};

interface Ordering {
  readonly customer: DemoCustomer;
  readonly siteId: string;
  readonly buyer: Caller;
  readonly cardId: string | null;
  readonly deliveryDay: PlantDate;
}

/** Places an order as the customer usually does; gives its id. */
export async function orderAsUsual(desk: Desk, chance: Chance, ordering: Ordering): Promise<string> {
  const { customer, siteId, buyer, cardId, deliveryDay } = ordering;
  const usuals = USUALS[customer.key] ?? [];
  const lines = chance.some(usuals, chance.whole(2, 3)).map((usual) => ({
    code: usual.code,
    chosen: { ...usual.chosen },
    quantity: quantityOf(usual, chance),
  }));
  const body = { siteId, deliveryDay, lines };
  const order = await desk.call(buyer, placeOrder, {
    body: cardId ? { ...body, settlement: 'card', cardId } : { ...body, settlement: 'account' },
  });
  return order.id;
}
