import type { CardPort, CardState } from '@seamwright/ordering/server';
import { inTransaction, notFound, system } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { cardById } from './cards.repository';
import { insertPayment, newestPayments } from './payments.repository';
import { settlePayment, type SettlingParts } from './settle-payment';

/** Keeps the cards for ordering: writes the wish down in the order's transaction, and asks the processor after it. */
export const cardPort = (parts: SettlingParts): CardPort => ({
  async start(tx, { now, orderId, customerId, holdMinor, currency, cardId }) {
    const card = await cardById(tx, cardId);
    if (card.customerId !== customerId) throw notFound();
    if (card.state !== 'kept') throw new RefusalError({ code: 'card-not-kept', params: {}, pointer: '/cardId' });
    await insertPayment(tx, now, {
      id: newId(),
      customerId,
      orderId,
      processorMethodId: card.processorMethodId,
      currency,
      holdMinor,
    });
  },

  async hold(context, orderId) {
    const [payment] = await inTransaction(context.database, system('job'), (tx) => newestPayments(tx, [orderId]));
    if (payment?.state === 'started') await settlePayment(context, parts, payment.id);
  },

  async stateOf(tx, orderIds) {
    const payments = await newestPayments(tx, orderIds);
    return new Map<string, CardState>(
      payments.map(({ orderId, state, holdMinor, capturedMinor, declineCode }) => [
        orderId,
        { state, holdMinor, capturedMinor, declineCode },
      ]),
    );
  },
});
