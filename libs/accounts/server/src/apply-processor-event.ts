import { inTransaction, system, type JobContext } from '@seamwright/shared/server';
import { RefusalError } from '@seamwright/shared/util';
import * as z from 'zod';
import type { AccountsParts } from './parts';
import { paymentBehind } from './payments.repository';
import { eventById, markApplied, type KeptEvent } from './processor-events.repository';
import { storeAnswer } from './store-answer';
import { syncProcessor } from './sync-processor';

type Parts = Pick<AccountsParts, 'processor' | 'timeZone'>;

const charge = z.object({ data: z.object({ object: z.object({ payment_intent: z.string().nullish() }) }) });

/** The intent that an event speaks of, if it does. */
function intentIn({ type, objectId, payload }: KeptEvent): string | null {
  if (type.startsWith('payment_intent.')) return objectId;
  if (!type.startsWith('charge.')) return null;
  const read = charge.safeParse(payload);
  return read.success ? (read.data.data.object.payment_intent ?? null) : null;
}

const movesMoney = (type: string): boolean => /^(payout|refund)\.|^charge\.refunded$/.test(type);

/**
 * Applies a kept event. An event only says that something became of an object: the object is read again, so that
 * repeats, old news and any order of arrival come to the same.
 */
export async function applyProcessorEvent(context: JobContext, parts: Parts, eventId: string): Promise<void> {
  const { database, clock, log } = context;
  const event = await inTransaction(database, system('job'), (tx) => eventById(tx, eventId));
  if (!event || event.appliedAt) return;
  const intentId = intentIn(event);
  if (intentId) await heedIntent(context, parts, intentId);
  if (movesMoney(event.type)) await syncProcessor(context, parts);
  const now = await clock.now();
  await inTransaction(database, system('job'), (tx) => markApplied(tx, now, eventId));
  log.debug({ event: eventId, type: event.type }, 'applied what the card processor told');
}

async function heedIntent({ database, clock, log }: JobContext, parts: Parts, intentId: string): Promise<void> {
  const intent = await parts.processor.retrieve(intentId);
  const now = await clock.now();
  await inTransaction(database, system('job'), async (tx) => {
    const payment = await paymentBehind(tx, { paymentId: intent.paymentId, intentId });
    if (!payment) return log.warn({ intent: intentId }, 'the card processor told of a payment that is not ours');
    await storeAnswer(tx, { now, timeZone: parts.timeZone }, payment.id, intent);
  }).catch((error: unknown) => {
    if (!(error instanceof RefusalError) || error.refusal.code !== 'intent-not-ours') throw error;
    log.error({ intent: intentId }, 'a payment at the card processor is not the one that was asked for');
  });
}
