import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { agreementValidity, answerQuote } from '@seamwright/pricing/domain';
import {
  conflict,
  emit,
  inTransaction,
  notFound,
  stale,
  type RequestContext,
  type Tx,
} from '@seamwright/shared/server';
import { plantToday, RefusalError } from '@seamwright/shared/util';
import { agreePrices, lockAgreementList } from './agreements.repository';
import { presentQuote } from './quote-presenter';
import { linesOfQuote, lockQuote, moveQuote, type Quote } from './quotes.repository';

/**
 * The customer's answer. Accepting puts the quoted prices in force as their agreement, in the same transaction. A quote
 * that can't be answered any more is a conflict that says why, whatever row version was read.
 */
export async function takeAnswer(
  { caller, now, database, ifMatch }: RequestContext,
  { timeZone }: { readonly timeZone: string },
  quoteId: string,
  answer: 'accept' | 'decline',
): Promise<QuoteDetail> {
  if (caller.kind !== 'user') throw new RefusalError({ code: 'not-allowed', params: {} });
  return inTransaction(database, caller, async (tx) => {
    const quote = await lockQuote(tx, quoteId);
    if (!quote) throw notFound();
    const answered = answerQuote(quote, answer, plantToday(now, timeZone));
    if (!answered.ok) throw conflict(answered.refusal.code, answered.refusal.params);
    const state = answered.value;
    if (quote.rowVersion !== ifMatch) throw stale();
    await moveQuote(tx, quoteId, ifMatch, { state, decidedAt: now, decidedBy: caller.personId });
    if (state === 'accepted') await agree(tx, quote);
    await emit(tx, now, { type: `quote-${state}`, subjectId: quoteId, customerId: quote.customerId });
    return presentQuote(tx, quoteId);
  });
}

async function agree(tx: Tx, quote: Quote): Promise<void> {
  const { customerId } = quote;
  const lines = await linesOfQuote(tx, quote.id);
  const listId = await lockAgreementList(tx, customerId);
  await agreePrices(
    tx,
    { listId, customerId },
    agreementValidity(quote),
    lines.map(({ id: quoteLineId, specificationId, choiceKey, basis, priceMinor }) => ({
      quoteLineId,
      specificationId,
      choiceKey,
      basis,
      priceMinor,
    })),
  );
}
