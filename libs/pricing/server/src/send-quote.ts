import { buyersOf, customerById } from '@seamwright/identity/server';
import type { QuoteDetail } from '@seamwright/pricing/contracts';
import { checkQuoteDates, quoteStates } from '@seamwright/pricing/domain';
import { emit, inTransaction, notFound, queueMail, stale, type RequestContext } from '@seamwright/shared/server';
import { plantToday, unwrap } from '@seamwright/shared/util';
import { quoteMail } from './quote-mail';
import { presentQuote } from './quote-presenter';
import { lockQuote, moveQuote } from './quotes.repository';

/**
 * Sends a draft: from now on the customer sees it. It is mailed to all who may accept it, and where nobody buys for the
 * customer yet, to the address for papers.
 */
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
    const { id: customerId, invoiceEmail } = await customerById(tx, quote.customerId);
    const buyers = await buyersOf(tx, customerId);
    await moveQuote(tx, quoteId, ifMatch, { state, sentAt: now });
    const sent = await presentQuote(tx, quoteId);
    const { subject, text } = quoteMail(sent, `${publicOrigin}/quotes/${quoteId}`);
    const recipients = buyers.length > 0 ? buyers : [{ id: customerId, email: invoiceEmail }];
    for (const { id, email: to } of recipients)
      await queueMail(tx, now, { to, subject, text, customerId, dedupeKey: `quote:${quoteId}:${id}` });
    await emit(tx, now, { type: 'quote-sent', subjectId: quoteId, customerId });
    return sent;
  });
}
