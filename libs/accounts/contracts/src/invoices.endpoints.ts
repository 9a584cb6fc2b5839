import * as z from 'zod';
import { INVOICE_BASES, INVOICE_STANDINGS } from '@seamwright/accounts/domain';
import {
  currency,
  defineEndpoint,
  gramsWire,
  id,
  line,
  minor,
  ownCustomer,
  pageOf,
  pageQuery,
  plantDay,
  ppmWire,
} from '@seamwright/shared/contracts';
import { paymentWire } from './payments.endpoints';

const readers = ownCustomer('buyer', 'buyer_owner', 'rep', 'accounts', 'admin');

const invoiceHead = {
  id,
  number: z.int().positive(),
  customer: z.strictObject({ id, name: line() }),
  order: z.strictObject({ id, number: z.int().positive() }),
  deliveryDay: plantDay,
  issuedOn: plantDay,
  dueOn: plantDay,
  standing: z.enum(INVOICE_STANDINGS),
  currency,
  netMinor: minor,
  taxMinor: minor,
  totalMinor: minor,
  paidMinor: minor,
};

export const invoiceListItem = z.strictObject(invoiceHead);
export type InvoiceListItem = z.infer<typeof invoiceListItem>;

const invoiceLine = z.strictObject({
  position: z.int().positive(),
  description: z.string(),
  packs: z.int().nonnegative(),
  pieces: z.int().nonnegative(),
  netGrams: gramsWire,
  basis: z.enum(INVOICE_BASES),
  /** Grams when sold by weight, pieces when sold by piece or case, 1 for a delivery. */
  quantity: z.int().positive(),
  priceMinor: minor,
  taxPpm: ppmWire,
  netMinor: minor,
});
export type InvoiceLineWire = z.infer<typeof invoiceLine>;

export const invoiceDetail = z.strictObject({
  ...invoiceHead,
  /** ISO 11649 creditor reference, without spaces. */
  reference: z.string(),
  billingAddress: z.string(),
  lines: z.array(invoiceLine),
  taxes: z.array(z.strictObject({ taxPpm: ppmWire, netMinor: minor, taxMinor: minor })),
  payment: paymentWire.nullable(),
});
export type InvoiceDetail = z.infer<typeof invoiceDetail>;

export const listInvoices = defineEndpoint({
  id: 'invoices.list',
  summary: 'Invoices, newest first',
  method: 'GET',
  path: '/invoices',
  access: readers,
  query: { ...pageQuery, customerId: id.optional(), standing: z.enum(INVOICE_STANDINGS).optional() },
  response: pageOf(invoiceListItem),
});

export const getInvoice = defineEndpoint({
  id: 'invoices.get',
  summary: 'One invoice with its lines, tax and card payment',
  method: 'GET',
  path: '/invoices/:invoiceId',
  access: readers,
  params: { invoiceId: id },
  response: invoiceDetail,
});

export const getInvoicePdf = defineEndpoint({
  id: 'invoices.pdf',
  summary: 'An invoice as the paper that was mailed',
  method: 'GET',
  path: '/invoices/:invoiceId/paper',
  access: readers,
  params: { invoiceId: id },
  file: 'application/pdf',
});
