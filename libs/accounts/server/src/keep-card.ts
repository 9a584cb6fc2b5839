import { customerById } from '@seamwright/identity/server';
import { inTransaction, system, type JobContext } from '@seamwright/shared/server';
import { cardById, keepProcessorCustomer, moveCard, processorCustomerOf, type CardRecord } from './cards.repository';
import type { AccountsParts } from './parts';
import { CardRefused, ProcessorRefused, type SavedCard } from './processor';

type Parts = Pick<AccountsParts, 'processor'>;

/**
 * Brings a card to where its row says it goes: kept by the processor, or forgotten. A repeat asks the same thing again.
 * Throws ProcessorSilent when there was no answer; the row then stays as it is.
 */
export async function settleCard(context: JobContext, parts: Parts, cardId: string): Promise<void> {
  const card = await inTransaction(context.database, system('job'), (tx) => cardById(tx, cardId));
  if (card.state === 'adding') await keep(context, parts, card);
  if (card.state === 'removing') await forget(context, parts, card);
}

async function keep(context: JobContext, parts: Parts, card: CardRecord): Promise<void> {
  const answer = await ask(context, parts, card);
  const now = await context.clock.now();
  await inTransaction(context.database, system('job'), (tx) =>
    typeof answer === 'string'
      ? moveCard(tx, now, card.id, 'adding', { state: 'refused', declineCode: answer })
      : moveCard(tx, now, card.id, 'adding', { state: 'kept', saved: answer }),
  );
}

/** The card as it is kept, or why it was refused. */
async function ask(context: JobContext, parts: Parts, card: CardRecord): Promise<SavedCard | string> {
  const processorCustomerId = await processorCustomer(context, parts, card.customerId);
  try {
    const key = `card:${card.id}:keep`;
    return await parts.processor.saveCard({ processorCustomerId, methodId: card.processorMethodId, key });
  } catch (error) {
    if (error instanceof CardRefused) return error.declineCode;
    if (error instanceof ProcessorRefused) return 'method-unknown';
    throw error;
  }
}

async function processorCustomer(context: JobContext, { processor }: Parts, customerId: string): Promise<string> {
  const known = await inTransaction(context.database, system('job'), async (tx) => ({
    id: await processorCustomerOf(tx, customerId),
    customer: await customerById(tx, customerId),
  }));
  if (known.id !== null) return known.id;
  const { name, invoiceEmail: email } = known.customer;
  const made = await processor.createCustomer({ customerId, name, email, key: `customer:${customerId}` });
  return inTransaction(context.database, system('job'), async (tx) => {
    await keepProcessorCustomer(tx, customerId, made);
    return (await processorCustomerOf(tx, customerId)) ?? made;
  });
}

async function forget(context: JobContext, { processor }: Parts, card: CardRecord): Promise<void> {
  await processor.removeCard(card.processorMethodId);
  const now = await context.clock.now();
  await inTransaction(context.database, system('job'), (tx) =>
    moveCard(tx, now, card.id, 'removing', { state: 'removed' }),
  );
}
