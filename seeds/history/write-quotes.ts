import { acceptQuote, createQuote, sendQuote } from '@seamwright/pricing/contracts';
import type { Caller } from '@seamwright/shared/server';
import { addDays, type PlantDate } from '@seamwright/shared/util';
import type { Desk } from '../desk';
import type { DemoQuote } from '../scenario/quotes';

interface Writing {
  readonly desk: Desk;
  readonly day: PlantDate;
  person(key: string): Caller;
  customerId(key: string): string;
  buyerOf(key: string): Caller;
  specificationId(code: string): string;
}

/** Writes quotes on a day, and sends and accepts what the scenario says of them. */
export async function writeQuotes(quotes: readonly DemoQuote[], writing: Writing): Promise<void> {
  for (const quote of quotes) await writeQuote(quote, writing);
  await writing.desk.settle();
}

async function writeQuote(quote: DemoQuote, { desk, day, ...writing }: Writing): Promise<void> {
  const rep = writing.person(quote.writtenBy);
  const written = await desk.call(rep, createQuote, {
    body: {
      customerId: writing.customerId(quote.customer),
      pricesFrom: day,
      pricesUntil: addDays(day, quote.pricesForDays),
      answerBy: addDays(day, quote.answerWithinDays),
      notes: quote.notes,
      lines: Object.entries(quote.prices).map(([code, priceMinor]) => ({
        specificationId: writing.specificationId(code),
        basis: 'kg' as const,
        priceMinor,
      })),
    },
  });
  if (quote.then === 'kept as a draft') return;
  const params = { quoteId: written.id };
  const sent = await desk.call(rep, sendQuote, { params, ifMatch: written.rowVersion });
  if (quote.then === 'sent') return;
  await desk.call(writing.buyerOf(quote.customer), acceptQuote, { params, ifMatch: sent.rowVersion });
}
