import { mergeIntent, postCapture, type Intent, type Payment } from '@seamwright/accounts/domain';
import { clearWaiting, orderById } from '@seamwright/ordering/server';
import { emit, type Tx } from '@seamwright/shared/server';
import { unwrap } from '@seamwright/shared/util';
import { invoiceIdOfOrder } from './invoices.repository';
import { post, type Posting } from './journal.repository';
import { changePayment, lockPayment } from './payments.repository';

/**
 * Stores what the processor says of a payment. Old news and repeats change nothing, whichever way they came. A hold
 * confirms its order, or is let go at once when the order was cancelled meanwhile; what was taken is posted. Refuses
 * `intent-not-ours`. Gives the payment as it is then.
 */
export async function storeAnswer(tx: Tx, by: Posting, paymentId: string, intent: Intent): Promise<Payment> {
  const payment = await lockPayment(tx, paymentId);
  const change = unwrap(mergeIntent(payment, intent, by.now));
  if (!change) return payment;
  const order = await orderById(tx, payment.orderId);
  const held = change.state === 'pre-authorised' && payment.state !== 'pre-authorised';
  const state = held && order.cancelledAt ? 'releasing' : change.state;
  await changePayment(tx, by.now, payment.id, { ...change, state });
  if (state === 'pre-authorised' && held) {
    await clearWaiting(tx, { now: by.now, orderId: payment.orderId, what: 'payment' });
  }
  if (state === 'captured') await postTaken(tx, by, { ...payment, ...change });
  if (state !== payment.state) await tellChange(tx, by.now, payment);
  return { ...payment, ...change, state };
}

/** Posts what was taken from a card, once. */
export async function postTaken(tx: Tx, by: Posting, payment: Payment): Promise<void> {
  const { customerId, orderId, processorChargeId, capturedMinor, currency } = payment;
  if (!processorChargeId) return;
  const invoiceId = await invoiceIdOfOrder(tx, orderId);
  const entry = postCapture({
    customerId,
    invoiceId,
    chargeId: processorChargeId,
    amountMinor: capturedMinor,
    currency,
  });
  await post(tx, by, [{ ...entry, text: `Taken from a card, ${processorChargeId}` }]);
}

/** Told by order, since that is what the screens show. */
export const tellChange = (tx: Tx, now: Date, { orderId, customerId }: Payment): Promise<void> =>
  emit(tx, now, { type: 'payment-changed', subjectId: orderId, customerId });
