import { dueDate, invoiceFromPacks, postInvoice, type Payment } from '@seamwright/accounts/domain';
import { customerById } from '@seamwright/identity/server';
import { orderById } from '@seamwright/ordering/server';
import { emit, queueMail, storeDocument, type Tx } from '@seamwright/shared/server';
import { creditorReference, newId, plantToday } from '@seamwright/shared/util';
import { packsOfOrders } from '@seamwright/stock/server';
import { invoiceMail } from './invoice-mail';
import { invoicePdf } from './invoice-pdf';
import { insertInvoice, invoiceIdOfOrder, nextInvoiceNumber, oneAtATime } from './invoices.repository';
import { post } from './journal.repository';
import type { AccountsParts } from './parts';
import { changePayment, lockPayment, newestPayments } from './payments.repository';
import { tellChange } from './store-answer';

type Parts = Pick<AccountsParts, 'timeZone' | 'seller'>;

/**
 * Makes the invoice of a packed order with its lines, journal entry, paper and mail, and writes down what is to be
 * taken from the card that is held for it: the total, or the whole hold when the total is more. An order of which
 * nothing was packed has no invoice: its hold is to be let go. A repeat changes nothing. Calls nobody.
 */
export async function makeInvoice(tx: Tx, parts: Parts, now: Date, orderId: string): Promise<void> {
  await oneAtATime(tx, orderId);
  const order = await orderById(tx, orderId);
  if (!order.packedAt || order.cancelledAt || (await invoiceIdOfOrder(tx, orderId))) return;
  const [newest] = await newestPayments(tx, [orderId]);
  const payment = newest ? await lockPayment(tx, newest.id) : null;
  const draft = invoiceFromPacks(
    order,
    await packsOfOrders(tx, [orderId]),
    $localize`Delivery to ${order.siteName}:site:`,
  );
  if (!draft) return letGo(tx, now, payment);

  const customer = await customerById(tx, order.customerId);
  const issuedOn = plantToday(now, parts.timeZone);
  const dueOn = dueDate(issuedOn, { days: customer.termsDays, from: customer.termsFrom });
  const fromCardMinor = await toTake(tx, now, payment, draft.total.totalMinor);
  const { netMinor, taxMinor, totalMinor } = draft.total;
  const number = await nextInvoiceNumber(tx);
  const reference = creditorReference(String(number));
  const { customerId, deliveryDay, currency } = order;
  const head = { number, deliveryDay, issuedOn, dueOn, currency, reference };
  const paper = { ...head, customer, order, seller: parts.seller, ...draft, fromCardMinor };
  const documentId = await storeDocument(tx, now, {
    customerId,
    kind: 'invoice',
    fileName: `invoice-${number}.pdf`,
    mediaType: 'application/pdf',
    bytes: await invoicePdf(paper),
  });
  const id = newId<'Invoice'>();
  const amounts = { netMinor, taxMinor, totalMinor };
  await insertInvoice(tx, now, { id, customerId, orderId, documentId, ...head, ...amounts }, draft.lines);
  const entry = postInvoice({ customerId, invoiceId: id, netMinor, taxMinor, currency });
  await post(tx, { now, timeZone: parts.timeZone }, [{ ...entry, text: $localize`Invoice ${number}:number:` }]);
  await queueMail(tx, now, {
    to: customer.invoiceEmail,
    ...invoiceMail(paper),
    customerId,
    documentId,
    dedupeKey: `invoice:${id}`,
  });
  await emit(tx, now, { type: 'invoice-made', subjectId: id, customerId });
}

/** What a held card is to be charged of the total; 0 when nothing is held. */
async function toTake(tx: Tx, now: Date, payment: Payment | null, totalMinor: number): Promise<number> {
  if (payment?.state !== 'pre-authorised') return 0;
  const toCaptureMinor = Math.min(totalMinor, payment.holdMinor);
  await changePayment(tx, now, payment.id, { state: 'capturing', toCaptureMinor });
  await tellChange(tx, now, payment);
  return toCaptureMinor;
}

/** Writes down that a hold is not wanted any more. */
export async function letGo(tx: Tx, now: Date, payment: Payment | null): Promise<void> {
  if (payment?.state !== 'pre-authorised' && payment?.state !== 'needs-action') return;
  await changePayment(tx, now, payment.id, { state: 'releasing' });
  await tellChange(tx, now, payment);
}
