export { PAYMENT_STATES, paymentStates, type PaymentMove, type PaymentState } from './payment.states';
export { letGoMinor, type Payment } from './payment';
export { mergeIntent, type Intent, type PaymentChange } from './merge-intent';
export { dueDate } from './due-date';
export {
  INVOICE_BASES,
  invoiceFromPacks,
  invoiceTotal,
  type InvoiceBasis,
  type InvoiceDraft,
  type InvoiceLine,
} from './invoice';
export { INVOICE_STANDINGS, invoiceStanding, type InvoiceStanding } from './invoice-standing';
export { ACCOUNTS, type Account } from './chart-of-accounts';
export {
  balances,
  ENTRY_KINDS,
  postAdjustment,
  postCapture,
  postFee,
  postInvoice,
  postPayout,
  postPayoutFailed,
  postPayoutReceived,
  postRefund,
  type EntryKind,
  type JournalEntry,
  type JournalLine,
} from './posting';
export { cardFee, type FeeSchedule } from './card-fee';
export {
  clearingBalance,
  clearingParts,
  PAYOUT_STATES,
  transactionKind,
  type ClearingParts,
  type Payout,
  type PayoutState,
  type ProcessorTransaction,
  type TransactionKind,
} from './processor-money';
export { workingDaysBetween } from './working-days';
export { matchPayouts, namesPayout, type BankLineToMatch, type PayoutMatch, type PayoutToMatch } from './match-payouts';
export {
  EXCEPTION_ACTS,
  EXCEPTION_CAUSES,
  EXCEPTION_KINDS,
  LEGS,
  reconcile,
  type ExceptionAct,
  type ExceptionCause,
  type ExceptionKind,
  type Leg,
  type LegResult,
  type PaymentToReconcile,
  type ReconciliationException,
  type ReconciliationInput,
} from './reconcile';
export {
  MOST_STATEMENT_LINES,
  parseBankCsv,
  type Statement,
  type StatementFault,
  type StatementLine,
} from './bank-csv';
