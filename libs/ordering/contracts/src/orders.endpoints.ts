import * as z from 'zod';
import { MOST_LINES, ORDER_STAGES, WHEN_SHORT } from '@seamwright/ordering/domain';
import { chosenValues, lineAmountsWire, priceAnswer, priceBasis, quantityWire } from '@seamwright/pricing/contracts';
import {
  currency,
  defineEndpoint,
  gramsWire,
  id,
  instant,
  line,
  minor,
  note,
  ownCustomer,
  pageOf,
  pageQuery,
  plantDay,
  ppmWire,
  rowVersion,
} from '@seamwright/shared/contracts';

const whenShort = z.enum(WHEN_SHORT);
const settlement = z.enum(['card', 'account']);
const stage = z.enum(ORDER_STAGES);

const newOrderLine = z
  .strictObject({
    specificationId: id.optional(),
    code: line(40).optional(),
    chosen: chosenValues.default({}),
    quantity: quantityWire,
    whenShort: whenShort.default('send-what-there-is'),
    note: note(500).default(''),
  })
  .refine((asked) => (asked.specificationId === undefined) !== (asked.code === undefined), {
    message: 'Name the specification by its id or by its code.',
  });

export const newOrder = z.strictObject({
  /** Staff say for whom; a buyer orders for her own customer. */
  customerId: id.optional(),
  siteId: id,
  deliveryDay: plantDay,
  settlement,
  /** The kept card that is held for the upper bound; only with `card`. */
  cardId: id.optional(),
  /** The buyer's own purchase order number or name. */
  customerReference: note(60).default(''),
  note: note(1000).default(''),
  /** The upper bound that the buyer was shown: an order that would come to more is refused. */
  agreedMaxMinor: minor.nonnegative().optional(),
  lines: z.array(newOrderLine).min(1).max(MOST_LINES),
});
export type NewOrderWire = z.input<typeof newOrder>;

const total = z.strictObject({ netMinor: minor, taxMinor: minor, totalMinor: minor });

export const orderTotalsWire = z.strictObject({
  min: total,
  estimate: total,
  max: total,
  /** From the packs, once packing is finished. */
  packed: total.nullable(),
});

/** How the card stands, beside the order; null when it is on account. */
export const orderPayment = z
  .strictObject({ state: z.string(), holdMinor: minor, capturedMinor: minor, declineCode: z.string().nullable() })
  .nullable();

export const orderLine = z.strictObject({
  id,
  position: z.int().positive(),
  specificationId: id,
  versionId: id,
  code: line(40),
  name: line(),
  version: z.int().positive(),
  chosen: chosenValues,
  summary: z.string(),
  quantity: quantityWire,
  pieces: z.int().positive(),
  minGrams: gramsWire,
  estimateGrams: gramsWire,
  maxGrams: gramsWire,
  basis: priceBasis,
  priceMinor: minor,
  priceWhy: priceAnswer,
  taxPpm: ppmWire,
  amounts: lineAmountsWire,
  whenShort,
  note: z.string(),
  shortPieces: z.int().nonnegative(),
  shortReason: z.string().nullable(),
  packedPieces: z.int().nonnegative(),
  packedGrams: gramsWire,
  /** What the packs come to; null while nothing is packed. */
  packedMinor: minor.nullable(),
});
export type OrderLineWire = z.infer<typeof orderLine>;

const orderHead = {
  id,
  rowVersion,
  number: z.int().positive(),
  customer: z.strictObject({ id, name: line() }),
  site: z.strictObject({ id, name: line() }),
  deliveryDay: plantDay,
  stage,
  source: z.enum(['storefront', 'desk', 'import']),
  settlement,
  currency,
  customerReference: z.string(),
  placedAt: instant,
};

export const orderListItem = z.strictObject({
  ...orderHead,
  lines: z.int().positive(),
  shortLines: z.int().nonnegative(),
  totals: orderTotalsWire,
  payment: orderPayment,
});
export type OrderListItem = z.infer<typeof orderListItem>;

export const orderDetail = z.strictObject({
  ...orderHead,
  waitingFor: z.array(z.enum(['payment', 'promise', 'credit'])),
  note: z.string(),
  placedBy: z.string().nullable(),
  cutOffAt: instant,
  /** Whether the caller may still cancel it. */
  mayCancel: z.boolean(),
  cancelledBecause: z.string().nullable(),
  releasedAt: instant.nullable(),
  packedAt: instant.nullable(),
  cancelledAt: instant.nullable(),
  deliveryChargeMinor: minor,
  deliveryTaxPpm: ppmWire,
  totals: orderTotalsWire,
  payment: orderPayment,
  lines: z.array(orderLine).min(1),
  history: z.array(
    z.strictObject({
      at: instant,
      what: z.enum(['placed', 'confirmed', 'released', 'short', 'packed', 'cancelled']),
      by: z.string().nullable(),
      detail: z.record(z.string(), z.union([z.string(), z.number()])),
    }),
  ),
});
export type OrderDetail = z.infer<typeof orderDetail>;

export const ORDER_FILTERS = ['waiting', 'confirmed', 'released', 'packed', 'cancelled'] as const;

export const placeOrder = defineEndpoint({
  id: 'orders.place',
  summary: 'Places an order; with a card, its upper bound is held and the order waits until it is',
  method: 'POST',
  path: '/orders',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'admin'),
  body: newOrder,
  response: orderDetail,
  status: 201,
  idempotent: true,
});

export const listOrders = defineEndpoint({
  id: 'orders.list',
  summary: 'Orders, newest first',
  method: 'GET',
  path: '/orders',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'planner', 'floor', 'accounts', 'admin'),
  query: {
    ...pageQuery,
    deliveryDay: plantDay.optional(),
    /** `released` includes what is in work, `packed` what is done. */
    state: z.enum(ORDER_FILTERS).optional(),
    customerId: id.optional(),
  },
  response: pageOf(orderListItem),
});

export const getOrder = defineEndpoint({
  id: 'orders.get',
  summary: 'One order with its lines, prices, weights and history',
  method: 'GET',
  path: '/orders/:orderId',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'planner', 'floor', 'accounts', 'admin'),
  params: { orderId: id },
  response: orderDetail,
});

export const cancelOrder = defineEndpoint({
  id: 'orders.cancel',
  summary: 'Cancels an order: a buyer until cut-off, the desk until its release and with a reason',
  method: 'POST',
  path: '/orders/:orderId/cancellation',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'planner', 'admin'),
  params: { orderId: id },
  body: z.strictObject({ reason: note(300).default('') }),
  response: orderDetail,
  guarded: true,
});

export const payOrderWith = defineEndpoint({
  id: 'orders.pay-with',
  summary: 'Has another card held for an order that still waits for payment, after the last one was declined',
  method: 'POST',
  path: '/orders/:orderId/card',
  access: ownCustomer('buyer', 'buyer_owner', 'rep', 'admin'),
  params: { orderId: id },
  body: z.strictObject({ cardId: id }),
  response: orderDetail,
  guarded: true,
});
