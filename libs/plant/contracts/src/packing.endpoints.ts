import * as z from 'zod';
import { WHEN_SHORT } from '@seamwright/ordering/domain';
import { CUTTING_DAY_STATES } from '@seamwright/plant/domain';
import { defineEndpoint, gramsWire, id, instant, line, plantDay, staffOnly } from '@seamwright/shared/contracts';

const count = z.int().nonnegative();
const pieces = z.int().min(1).max(10_000);
const scaleGrams = z.int().min(0).max(1_000_000);
const packers = staffOnly('floor', 'planner');

const pack = z.strictObject({
  id,
  serial: z.int().positive(),
  lotCode: z.string().nullable(),
  pieces,
  netGrams: gramsWire,
  tareGrams: gramsWire,
  outOfLimits: z.boolean(),
  reason: z.string().nullable(),
  packedAt: instant,
});

const packingLine = z.strictObject({
  id,
  position: z.int().positive(),
  code: z.string(),
  name: z.string(),
  summary: z.string(),
  note: z.string(),
  whenShort: z.enum(WHEN_SHORT),
  pieces,
  estimateGrams: gramsWire,
  packedPieces: count,
  packedGrams: gramsWire,
  shortPieces: count,
  shortReason: z.string().nullable(),
  piecesPerPack: pieces,
  piece: z.strictObject({ nominalGrams: gramsWire, minGrams: gramsWire, maxGrams: gramsWire }),
  tareGrams: gramsWire,
  storageMinC: z.int(),
  storageMaxC: z.int(),
  allergens: z.array(z.string()),
  packs: z.array(pack),
  lots: z
    .array(z.strictObject({ id, code: z.string(), useBy: plantDay.nullable() }))
    .meta({ description: 'Lots that it may be packed from, first expired first' }),
});
export type PackingLineWire = z.infer<typeof packingLine>;

const packingOrder = z.strictObject({
  id,
  number: z.int().positive(),
  customer: z.strictObject({ id, name: z.string() }),
  siteName: z.string(),
  deliveryDay: plantDay,
  note: z.string(),
  packedAt: instant.nullable(),
  lines: z.array(packingLine),
});
export type PackingOrderWire = z.infer<typeof packingOrder>;

export const listPackingOrders = defineEndpoint({
  id: 'packing.orders',
  summary: 'The released orders of a day with what is packed so far; none before the day is on the floor',
  method: 'GET',
  path: '/packing-orders',
  access: packers,
  query: { deliveryDay: plantDay },
  response: z.strictObject({
    deliveryDay: plantDay,
    state: z.enum(CUTTING_DAY_STATES),
    orders: z.array(packingOrder),
  }),
});

export const addPack = defineEndpoint({
  id: 'packing.add-pack',
  summary: 'Weighs a pack for an order line; outside its limits it needs a reason',
  method: 'POST',
  path: '/packing-orders/:orderId/packs',
  access: packers,
  idempotent: true,
  status: 201,
  params: { orderId: id },
  body: z.strictObject({
    orderLineId: id,
    lotId: id,
    pieces,
    grossGrams: scaleGrams,
    tareGrams: scaleGrams,
    reason: line(200).nullable(),
  }),
  response: packingOrder,
});

export const voidPack = defineEndpoint({
  id: 'packing.void-pack',
  summary: 'Takes a pack back while its order is still being packed',
  method: 'POST',
  path: '/packing-orders/:orderId/packs/:packId/void',
  access: packers,
  params: { orderId: id, packId: id },
  response: packingOrder,
});

export const markShort = defineEndpoint({
  id: 'packing.mark-short',
  summary: 'Says how many pieces of a line can not be sent, and why; 0 takes it back',
  method: 'POST',
  path: '/packing-orders/:orderId/lines/:lineId/short',
  access: packers,
  params: { orderId: id, lineId: id },
  body: z.strictObject({ shortPieces: z.int().min(0).max(100_000), reason: z.string().trim().max(200) }),
  response: packingOrder,
});

export const finishOrder = defineEndpoint({
  id: 'packing.finish-order',
  summary: 'Finishes the packing of an order: every line fully packed or marked short',
  method: 'POST',
  path: '/packing-orders/:orderId/finish',
  access: packers,
  params: { orderId: id },
  response: packingOrder,
});
