import type { PlantDate } from '@seamwright/shared/util';

export const INVOICE_STANDINGS = ['open', 'part-paid', 'paid', 'overdue'] as const;
export type InvoiceStanding = (typeof INVOICE_STANDINGS)[number];

/** How an invoice stands on `today`; amounts in minor units. It is overdue from the day after its due date. */
export function invoiceStanding(
  invoice: { readonly totalMinor: number; readonly paidMinor: number; readonly dueOn: string },
  today: PlantDate,
): InvoiceStanding {
  if (invoice.paidMinor >= invoice.totalMinor) return 'paid';
  if (today > invoice.dueOn) return 'overdue';
  return invoice.paidMinor > 0 ? 'part-paid' : 'open';
}
