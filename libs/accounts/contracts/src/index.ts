export {
  bankStatement,
  importBankStatement,
  MOST_STATEMENT_BYTES,
  type BankStatement,
} from './bank-statements.endpoints';
export { addCard, cardSettings, cardWire, listCards, removeCard, type CardWire } from './cards.endpoints';
export {
  getInvoice,
  getInvoicePdf,
  invoiceDetail,
  invoiceListItem,
  listInvoices,
  type InvoiceDetail,
  type InvoiceLineWire,
  type InvoiceListItem,
} from './invoices.endpoints';
export {
  accountBalance,
  ledgerBalances,
  ledgerEntries,
  ledgerEntry,
  type AccountBalance,
  type LedgerEntry,
} from './ledger.endpoints';
export { listPayments, paymentWire, type PaymentWire } from './payments.endpoints';
export {
  getReconciliation,
  reconciliation,
  refreshReconciliation,
  type ExceptionWire,
  type LegWire,
  type PayoutWire,
  type ReconciliationWire,
} from './reconciliation.endpoints';
