import { inTransaction, system, type Subscriber } from '@seamwright/shared/server';
import { applyProcessorEvent } from './apply-processor-event';
import { letGo, makeInvoice } from './make-invoice';
import type { AccountsParts } from './parts';
import { lockPayment, newestPayments } from './payments.repository';
import { settlePayment } from './settle-payment';
import { PROCESSOR_TOLD } from './stripe-webhook';

type Parts = Omit<AccountsParts, 'clock'>;

/** What was packed is invoiced, then taken from the card that is held for it; the rest of the hold goes. */
const invoiceWhatWasPacked = (parts: Parts): Subscriber => ({
  name: 'invoice-what-was-packed',
  events: ['order-packed'],
  async handle(context, { subjectId: orderId }) {
    const now = await context.clock.now();
    const payment = await inTransaction(context.database, system('job'), async (tx) => {
      await makeInvoice(tx, parts, now, orderId);
      const [newest] = await newestPayments(tx, [orderId]);
      return newest;
    });
    if (payment?.state === 'capturing' || payment?.state === 'releasing')
      await settlePayment(context, parts, payment.id);
  },
});

/** A cancelled order's hold is let go. One that is not answered yet is let go when the answer comes. */
const letGoOfCancelled = (parts: Parts): Subscriber => ({
  name: 'let-go-of-cancelled',
  events: ['order-cancelled'],
  async handle(context, { subjectId: orderId }) {
    const now = await context.clock.now();
    const payment = await inTransaction(context.database, system('job'), async (tx) => {
      const [newest] = await newestPayments(tx, [orderId]);
      if (!newest) return null;
      await letGo(tx, now, await lockPayment(tx, newest.id));
      return lockPayment(tx, newest.id);
    });
    if (payment?.state === 'releasing') await settlePayment(context, parts, payment.id);
  },
});

/** Applies what the processor told by webhook. */
const heedProcessor = (parts: Parts): Subscriber => ({
  name: 'heed-card-processor',
  events: [PROCESSOR_TOLD],
  handle: (context, event) => applyProcessorEvent(context, parts, String(event.payload['eventId'])),
});

export const accountsSubscribers = (parts: Parts): Subscriber[] => [
  invoiceWhatWasPacked(parts),
  letGoOfCancelled(parts),
  heedProcessor(parts),
];
