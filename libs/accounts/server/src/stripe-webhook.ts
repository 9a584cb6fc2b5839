import express, { type RequestHandler } from 'express';
import { emit, inTransaction, system, type Clock, type Database, type Log } from '@seamwright/shared/server';
import { newId, RefusalError } from '@seamwright/shared/util';
import { keepEvent } from './processor-events.repository';
import { SignatureWrong, type Processor, type ProcessorEvent } from './processor';

export const PROCESSOR_TOLD = 'processor-told';

export interface WebhookParts {
  readonly processor: Processor;
  readonly database: Database;
  readonly clock: Clock;
  readonly log: Log;
}

/**
 * Receives what the card processor tells: checks the signature on the bytes as they came, keeps the event once, and
 * answers at once; a job applies it. Must be mounted where no other body parser has read the request.
 */
export const stripeWebhook = (parts: WebhookParts): RequestHandler[] => [
  express.raw({ type: () => true, limit: '1mb' }),
  async (request, response) => {
    const event = checked(parts.processor, request.body, request.get('stripe-signature') ?? '');
    const now = await parts.clock.now();
    await inTransaction(parts.database, system('webhook'), async (tx) => {
      if (!(await keepEvent(tx, now, event))) return;
      const payload = { eventId: event.id };
      await emit(tx, now, { type: PROCESSOR_TOLD, subjectId: newId(), customerId: null, payload });
    });
    parts.log.debug({ event: event.id, type: event.type }, 'the card processor told something');
    response.status(200).json({ received: true });
  },
];

function checked(processor: Processor, body: unknown, signature: string): ProcessorEvent {
  try {
    return processor.constructEvent(Buffer.isBuffer(body) ? body : Buffer.alloc(0), signature);
  } catch (error) {
    if (error instanceof SignatureWrong) throw new RefusalError({ code: 'signature-wrong', params: {} });
    throw error;
  }
}
