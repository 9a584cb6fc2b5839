import type { Intent, Payment } from '@seamwright/accounts/domain';
import { orderById } from '@seamwright/ordering/server';
import { inTransaction, system, type JobContext } from '@seamwright/shared/server';
import { processorCustomerOf } from './cards.repository';
import type { AccountsParts } from './parts';
import { changePayment, lockPayment } from './payments.repository';
import { ProcessorRefused } from './processor';
import { storeAnswer, tellChange } from './store-answer';

export type SettlingParts = Pick<AccountsParts, 'processor' | 'timeZone' | 'publicOrigin'>;

const HOUR_MS = 3_600_000;
/** The processor forgets keys after a day: past this, a repeat could hold a second time. */
const KEY_LIVES_MS = 23 * HOUR_MS;
/** A holder who has not confirmed by then won't. */
const HOLDER_HAS_MS = 24 * HOUR_MS;

/**
 * Brings a payment to its next resting place: asks the processor for what the row says was begun, with the key that
 * follows from the row, and stores the answer. A repeat asks the same thing again. Throws ProcessorSilent when there
 * was no answer; the row then stays as it is.
 */
export async function settlePayment(context: JobContext, parts: SettlingParts, paymentId: string): Promise<void> {
  const before = await read(context, paymentId, lockPayment);
  const intent = await ask(context, parts, before);
  if (intent === null) return;
  const now = await context.clock.now();
  await inTransaction(context.database, system('job'), (tx) =>
    storeAnswer(tx, { now, timeZone: parts.timeZone }, paymentId, intent),
  );
}

const read = <T>(
  context: JobContext,
  id: string,
  of: (tx: Parameters<typeof lockPayment>[0], id: string) => Promise<T>,
) => inTransaction(context.database, system('job'), (tx) => of(tx, id));

async function ask(context: JobContext, parts: SettlingParts, payment: Payment): Promise<Intent | null> {
  const { processor } = parts;
  const { id, processorIntentId: intentId } = payment;
  const age = (await context.clock.now()).getTime() - payment.createdAt.getTime();
  if (payment.state === 'started' && intentId === null) return askForHold(context, parts, payment, age);
  if (intentId === null) return null;
  switch (payment.state) {
    case 'capturing':
      return orAsItIs(parts, intentId, () =>
        processor.capture({ intentId, amountMinor: payment.toCaptureMinor ?? 0, key: `payment:${id}:capture` }),
      );
    case 'releasing':
      return orAsItIs(parts, intentId, () => processor.cancel({ intentId, key: `payment:${id}:release` }));
    case 'needs-action':
      if (age < HOLDER_HAS_MS) return processor.retrieve(intentId);
      return orAsItIs(parts, intentId, () => processor.cancel({ intentId, key: `payment:${id}:release` }));
    case 'started':
    case 'pre-authorised':
      return processor.retrieve(intentId);
    case 'captured':
    case 'declined':
    case 'released':
    case 'failed':
      return null;
  }
}

async function askForHold(
  context: JobContext,
  { processor, publicOrigin }: SettlingParts,
  payment: Payment,
  age: number,
): Promise<Intent | null> {
  if (age > KEY_LIVES_MS) return giveUp(context, payment, 'no-answer');
  const { id: paymentId, orderId, processorMethodId: methodId, holdMinor: amountMinor, currency } = payment;
  const { processorCustomerId, orderNumber } = await inTransaction(context.database, system('job'), async (tx) => ({
    processorCustomerId: await processorCustomerOf(tx, payment.customerId),
    orderNumber: (await orderById(tx, orderId)).number,
  }));
  if (processorCustomerId === null) return giveUp(context, payment, 'card-not-kept');
  const wanted = { paymentId, orderNumber, processorCustomerId, methodId, amountMinor, currency };
  const returnUrl = `${publicOrigin}/orders/${orderId}`;
  try {
    return await processor.hold({ ...wanted, returnUrl, key: `payment:${paymentId}:hold` });
  } catch (error) {
    if (error instanceof ProcessorRefused) return giveUp(context, payment, error.code);
    throw error;
  }
}

/** Nothing was held and nothing will be. */
async function giveUp(context: JobContext, { id }: Payment, declineCode: string): Promise<null> {
  const now = await context.clock.now();
  await inTransaction(context.database, system('job'), async (tx) => {
    const payment = await lockPayment(tx, id);
    if (payment.state !== 'started') return;
    await changePayment(tx, now, id, { state: 'failed', declineCode });
    await tellChange(tx, now, payment);
  });
  return null;
}

/** What was refused because it is done, or gone, shows in how the intent stands; anything else is thrown. */
async function orAsItIs({ processor }: SettlingParts, intentId: string, deed: () => Promise<Intent>): Promise<Intent> {
  try {
    return await deed();
  } catch (error) {
    if (!(error instanceof ProcessorRefused)) throw error;
    const intent = await processor.retrieve(intentId);
    if (intent.standing === 'held') throw error;
    return intent;
  }
}
