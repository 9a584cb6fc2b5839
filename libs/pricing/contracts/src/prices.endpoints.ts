import * as z from 'zod';
import { currency, defineEndpoint, id, line, ownCustomer, plantDay } from '@seamwright/shared/contracts';
import { chosenValues, lineAmountsWire, lineWeights, priceAnswer, quantityWire } from './price-wire';

const MOST_LINES = 500;

export const priceCheckLine = z
  .strictObject({
    specificationId: id.optional(),
    code: line(40).optional(),
    chosen: chosenValues.default({}),
    quantity: quantityWire,
  })
  .refine((asked) => (asked.specificationId === undefined) !== (asked.code === undefined), {
    message: 'Name the specification by its id or by its code.',
  });

export const pricedLine = z.discriminatedUnion('ok', [
  z.strictObject({
    ok: z.literal(true),
    specificationId: id,
    code: line(40),
    name: line(),
    /** The choices, those left out at their default. */
    chosen: chosenValues,
    choiceKey: z.string(),
    summary: z.string(),
    weights: lineWeights,
    price: priceAnswer,
    amounts: lineAmountsWire,
    leadDays: z.int().nonnegative(),
  }),
  z.strictObject({ ok: z.literal(false), code: z.string(), message: z.string() }),
]);
export type PricedLine = z.infer<typeof pricedLine>;

/** The price, weight and reasons of many lines at once; each answers for itself, in the order asked. */
export const checkPrices = defineEndpoint({
  id: 'prices.check',
  summary: 'Prices of many lines for one customer and delivery day, each with its reasons',
  method: 'POST',
  path: '/price-checks',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'planner', 'accounts', 'admin'),
  body: z.strictObject({
    /** Staff say for whom; a buyer asks for her own. */
    customerId: id.optional(),
    siteId: id.optional(),
    deliveryDay: plantDay,
    lines: z.array(priceCheckLine).min(1).max(MOST_LINES),
  }),
  response: z.strictObject({ customerId: id, currency, deliveryDay: plantDay, lines: z.array(pricedLine) }),
});
