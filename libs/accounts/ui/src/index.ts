// The money seam stands apart, in `accounts/ui/money-seam`.
export { CardPayment, type ShownCardPayment } from './card-payment';
export { cardName, CardPicker, type ShownCard } from './card-picker';
export { DemoCardPicker } from './demo-card-picker';
export { causeWords, exceptionWords, legWords } from './exception-words';
export { instantWords } from './instant-words';
export { InvoiceLines, type ShownInvoiceLine } from './invoice-lines';
export { InvoiceStandingChip } from './invoice-standing';
export { InvoiceSum, type ShownSum } from './invoice-sum';
export { standingWords } from './invoice-words';
export { LedgerEntries, type ShownEntry } from './ledger-entries';
export { accountWords, entryWord } from './ledger-words';
export { OrderCard } from './order-card';
export { PaymentSeam, paymentStages, type PaymentLife } from './payment-seam';
export { PaymentStateChip } from './payment-state';
export { declineWords, paymentStateWords } from './payment-words';
