import * as z from 'zod';
import {
  currency,
  defineEndpoint,
  gramsWire,
  id,
  instant,
  line,
  minor,
  MOST_IMPORT_BYTES,
  plantDay,
  rowVersion,
  staffOnly,
  WORKBOOK_MEDIA_TYPE,
} from '@seamwright/shared/contracts';

const importFault = z.strictObject({
  row: z.int().positive(),
  /** The sheet's letter. */
  column: z.string().regex(/^[A-Z]{1,3}$/),
  code: z.string(),
  message: z.string(),
});
export type ImportFaultWire = z.infer<typeof importFault>;

const importLine = z.strictObject({
  row: z.int().positive(),
  code: line(40),
  name: line(),
  summary: z.string(),
  pieces: z.int().positive(),
  estimateGrams: gramsWire,
  estimateMinor: minor,
});

/** An order as it would be placed; once taken, with its number. */
const importOrder = z.strictObject({
  customer: line(),
  site: line(),
  deliveryDay: plantDay,
  estimateMinor: minor,
  maxMinor: minor,
  lines: z.array(importLine).min(1),
});
export type ImportOrderWire = z.infer<typeof importOrder>;

export const orderImport = z.strictObject({
  id,
  rowVersion,
  fileName: z.string(),
  uploadedAt: instant,
  currency,
  rows: z.int().nonnegative(),
  orders: z.array(importOrder),
  faults: z.array(importFault),
  /** When the very same file was taken before. */
  sameFileTakenAt: instant.nullable(),
  taken: z.enum(['good-rows', 'all-or-none']).nullable(),
  takenAt: instant.nullable(),
  placed: z.array(z.strictObject({ id, number: z.int().positive(), customer: line(), deliveryDay: plantDay })),
});
export type OrderImportWire = z.infer<typeof orderImport>;

export const getImportTemplate = defineEndpoint({
  id: 'order-imports.template',
  summary: 'An empty workbook of orders with the columns that can be read',
  method: 'GET',
  path: '/order-imports/template',
  access: staffOnly('rep', 'planner', 'admin'),
  file: WORKBOOK_MEDIA_TYPE,
});

export const uploadOrders = defineEndpoint({
  id: 'order-imports.upload',
  summary: 'Reads a workbook of orders and shows what would be placed; nothing is placed yet',
  method: 'POST',
  path: '/order-imports',
  access: staffOnly('rep', 'planner', 'admin'),
  response: orderImport,
  status: 201,
  idempotent: true,
  upload: { maxBytes: MOST_IMPORT_BYTES },
});

export const getOrderImport = defineEndpoint({
  id: 'order-imports.get',
  summary: 'A workbook that was read, as it stands now',
  method: 'GET',
  path: '/order-imports/:importId',
  access: staffOnly('rep', 'planner', 'admin'),
  params: { importId: id },
  response: orderImport,
});

export const takeOrders = defineEndpoint({
  id: 'order-imports.take',
  summary: 'Places the orders of a workbook, once: the good rows, or all or none',
  method: 'POST',
  path: '/order-imports/:importId/taking',
  access: staffOnly('rep', 'planner', 'admin'),
  params: { importId: id },
  body: z.strictObject({ how: z.enum(['good-rows', 'all-or-none']) }),
  response: orderImport,
  idempotent: true,
});
