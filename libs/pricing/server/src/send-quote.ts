import { customerById } from '@seamwright/identity/server';
import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { checkQuoteDates, quoteStates } from '@seamwright/pricing/domain';
import { emit, inTransaction, notFound, queueMail, stale, type RequestContext } from '@seamwright/shared/server';
import { plantToday, unwrap } from '@seamwright/shared/util';
import { quoteMail } from './quote-mail';
import { presentQuote } from './quote-presenter';
import { lockQuote, moveQuote } from './quotes.repository';

/** Sends a draft: from now on the customer sees it, and is told by mail. */
export async function sendQuoteToCustomer(
  { caller, now, database, ifMatch }: RequestContext,
  { timeZone, publicOrigin }: { readonly timeZone: string; readonly publicOrigin: string },
  quoteId: string,
): Promise<QuoteDetail> {
  return inTransaction(database, caller, async (tx) => {
    const quote = await lockQuote(tx, quoteId);
    if (!quote) throw notFound();
    const state = unwrap(quoteStates.next(quote.state, 'send'));
    if (quote.rowVersion !== ifMatch) throw stale();
    unwrap(checkQuoteDates(quote, plantToday(now, timeZone)));
    const { invoiceEmail, id: customerId } = await customerById(tx, quote.customerId);
    await moveQuote(tx, quoteId, ifMatch, { state, sentAt: now });
    const sent = await presentQuote(tx, quoteId);
    const { subject, text } = quoteMail(sent, `${publicOrigin}/quotes/${quoteId}`);
    await queueMail(tx, now, { to: invoiceEmail, subject, text, customerId, dedupeKey: `quote:${quoteId}` });
    await emit(tx, now, { type: 'quote-sent', subjectId: quoteId, customerId });
    return sent;
  });
}
