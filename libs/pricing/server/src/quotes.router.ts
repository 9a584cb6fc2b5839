import { acceptQuote, createQuote, declineQuote, getQuote, listQuotes, sendQuote } from '@seamwright/pricing/contracts';
import { implement, implementOnce, inTransaction, pageFrom, type Implementation } from '@seamwright/shared/server';
import { takeAnswer } from './answer-quote';
import { writeQuote } from './create-quote';
import { readQuotePlace } from './cursor-values';
import { presentQuote, presentQuoteInList } from './quote-presenter';
import { quotesNewestFirst } from './quotes.repository';
import { sendQuoteToCustomer } from './send-quote';

export interface QuoteParts {
  readonly timeZone: string;
  /** Where the storefront is reached from outside: mails link to it. */
  readonly publicOrigin: string;
}

export const quoteImplementations = (parts: QuoteParts): Implementation[] => [
  implement(listQuotes, ({ database, caller }, { query: { cursor, limit, state, customerId } }) =>
    inTransaction(database, caller, async (tx) => {
      const [before] = readQuotePlace(cursor) ?? [];
      const quotes = await quotesNewestFirst(tx, { state, customerId, before, limit });
      return pageFrom(quotes, limit, ({ number }) => [number], presentQuoteInList);
    }),
  ),
  implement(getQuote, ({ database, caller }, { params }) =>
    inTransaction(database, caller, (tx) => presentQuote(tx, params.quoteId)),
  ),
  implementOnce(createQuote, {
    make: (tx, { now, caller }, { body }) => writeQuote(tx, { now, caller, timeZone: parts.timeZone }, body),
    present: (tx, _context, id) => presentQuote(tx, id),
  }),
  implement(sendQuote, (context, { params }) => sendQuoteToCustomer(context, parts, params.quoteId)),
  implement(acceptQuote, (context, { params }) => takeAnswer(context, parts, params.quoteId, 'accept')),
  implement(declineQuote, (context, { params }) => takeAnswer(context, parts, params.quoteId, 'decline')),
];
