import type { InvoiceDetail, InvoiceListItem } from '@seamwright/accounts/contracts';
import { invoiceStanding, invoiceTotal } from '@seamwright/accounts/domain';
import type { Tx } from '@seamwright/shared/server';
import type { PlantDate } from '@seamwright/shared/util';
import { invoiceById, invoiceLines, type InvoiceRecord } from './invoices.repository';
import { paymentsPage } from './payments.repository';
import { presentPayment } from './present-payment';

export function presentInvoiceInList(invoice: InvoiceRecord, today: PlantDate): InvoiceListItem {
  const paidMinor = invoice.totalMinor - invoice.dueMinor;
  const { id, number, deliveryDay, issuedOn, dueOn, currency, netMinor, taxMinor, totalMinor } = invoice;
  return {
    id,
    number,
    customer: { id: invoice.customerId, name: invoice.customerName },
    order: { id: invoice.orderId, number: invoice.orderNumber },
    deliveryDay,
    issuedOn,
    dueOn,
    standing: invoiceStanding({ totalMinor, paidMinor, dueOn }, today),
    currency,
    netMinor,
    taxMinor,
    totalMinor,
    paidMinor,
  };
}

/** Throws `not-found`. */
export async function presentInvoice(tx: Tx, id: string, today: PlantDate): Promise<InvoiceDetail> {
  const invoice = await invoiceById(tx, id);
  const lines = await invoiceLines(tx, id);
  const [payment] = await paymentsPage(tx, { orderId: invoice.orderId, limit: 1, after: null });
  return {
    ...presentInvoiceInList(invoice, today),
    reference: invoice.reference,
    billingAddress: invoice.billingAddress,
    lines: lines.map(({ orderLineId: _orderLineId, ...line }) => line),
    taxes: invoiceTotal(lines).taxes.map((tax) => ({ ...tax })),
    payment: payment ? presentPayment(payment) : null,
  };
}
