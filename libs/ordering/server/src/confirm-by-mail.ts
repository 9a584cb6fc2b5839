import { inTransaction, queueMail, system, type Subscriber } from '@seamwright/shared/server';
import { confirmationMail } from './confirmation-mail';
import { orderById } from './orders.repository';
import type { CardPort } from './ports';
import { confirmationRecipients } from './recipients.repository';

/** Mails the confirmation once an order waits for nothing any more. */
export const confirmByMail = (cards: CardPort): Subscriber => ({
  name: 'order-confirmation-mail',
  events: ['order-confirmed'],
  async handle({ database, clock }, event) {
    const now = await clock.now();
    await inTransaction(database, system('job'), async (tx) => {
      const order = await orderById(tx, event.subjectId);
      const card = (await cards.stateOf(tx, [order.id])).get(order.id);
      for (const recipient of await confirmationRecipients(tx, order))
        await queueMail(tx, now, {
          to: recipient.email,
          ...confirmationMail(order, recipient, card),
          customerId: order.customerId,
          dedupeKey: `order-confirmation:${order.id}:${recipient.id}`,
        });
    });
  },
});
