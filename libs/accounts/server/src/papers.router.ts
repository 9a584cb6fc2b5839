import { getInvoice, getInvoicePdf, listInvoices, listPayments } from '@seamwright/accounts/contracts';
import {
  documentById,
  implement,
  inTransaction,
  notFound,
  pageFrom,
  type Implementation,
} from '@seamwright/shared/server';
import { plantToday } from '@seamwright/shared/util';
import { instantPlace, numberPlace } from './cursors';
import { invoiceById, invoicesPage } from './invoices.repository';
import type { AccountsParts } from './parts';
import { paymentsPage } from './payments.repository';
import { presentInvoice, presentInvoiceInList } from './present-invoice';
import { presentPayment } from './present-payment';

/** Invoices and card payments, for buyers and staff alike. */
export const paperImplementations = ({ timeZone }: Pick<AccountsParts, 'timeZone'>): Implementation[] => [
  implement(listInvoices, ({ database, caller, now }, { query: { cursor, limit, ...filters } }) =>
    inTransaction(database, caller, async (tx) => {
      const today = plantToday(now, timeZone);
      const invoices = await invoicesPage(tx, { ...filters, limit, before: numberPlace(cursor), today });
      return pageFrom(
        invoices,
        limit,
        ({ number }) => [number],
        (invoice) => presentInvoiceInList(invoice, today),
      );
    }),
  ),
  implement(getInvoice, ({ database, caller, now }, { params }) =>
    inTransaction(database, caller, (tx) => presentInvoice(tx, params.invoiceId, plantToday(now, timeZone))),
  ),
  implement(getInvoicePdf, ({ database, caller }, { params }) =>
    inTransaction(database, caller, async (tx) => {
      const { documentId } = await invoiceById(tx, params.invoiceId);
      const paper = documentId ? await documentById(tx, documentId) : undefined;
      if (!paper) throw notFound();
      return { fileName: paper.fileName, bytes: paper.bytes };
    }),
  ),
  implement(listPayments, ({ database, caller }, { query: { cursor, limit, ...filters } }) =>
    inTransaction(database, caller, async (tx) => {
      const payments = await paymentsPage(tx, { ...filters, limit, after: instantPlace(cursor) });
      return pageFrom(payments, limit, ({ createdAt, id }) => [createdAt.toISOString(), id], presentPayment);
    }),
  ),
];
